import { absorptionEdges, type Material } from '../../materials/index.js';

const lowest_keV = 5;
const highest_keV = 150;

/** K edges between 5 and 150 keV of the materials, ascending, each once: what `energyGrid` needs. */
export function kEdges_keV(materials: Iterable<Material>): number[] {
  const edges = new Set<number>();
  for (const material of materials) {
    for (const edge of absorptionEdges(material, lowest_keV, highest_keV)) {
      if (edge.shell === 'K') edges.add(edge.energy_keV);
    }
  }
  return [...edges].sort((a, b) => a - b);
}
