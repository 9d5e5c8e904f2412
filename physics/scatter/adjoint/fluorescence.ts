import {
  elementByZ,
  kShell,
  type Material,
  materialFromFractions,
  partialCoefficientsOn,
} from '../../../materials/index.js';
import { kept } from '../../../materials/kept.js';

/** K photons that one energy node gives, per cm of path: `per_cm` of energy node `node`. */
export interface FluorescenceTerm {
  readonly node: number;
  readonly per_cm: number;
}

const elements = new Map<number, Material>();

/** An element by itself at 1 g/cm³, for its own photoelectric coefficient. */
const element = (z: number): Material =>
  kept(elements, z, () => {
    const { name, symbol } = elementByZ(z);
    return materialFromFractions({ name, density_g_per_cm3: 1, massFractions: { [symbol]: 1 } });
  });

/**
 * K fluorescence of a material per energy node: μ_pe(1 − 1/J) ω_K p_l of every line, shared between
 * the two nodes around the line's energy so that number and energy are kept. Lines below the first
 * node are absorbed where they arise. L and outer lines are neglected.
 */
export function fluorescenceTerms(
  material: Material,
  energies_keV: Float64Array,
): readonly (readonly FluorescenceTerm[])[] {
  const terms = Array.from(energies_keV, () => new Float64Array(energies_keV.length));
  for (const { z, massFraction } of material.massFractions) {
    const shell = kShell(z);
    if (!shell || shell.edge_keV < energies_keV[0]) continue;
    const photoelectric = partialCoefficientsOn(element(z), energies_keV).photoelectric;
    const perPhotoelectric = massFraction * material.density_g_per_cm3;
    // A line may lie above the edge by the difference between the two tables' binding energies.
    const belowEdge = energies_keV.findLastIndex((energy) => energy < shell.edge_keV);
    energies_keV.forEach((energy, i) => {
      if (energy < shell.edge_keV) return;
      const vacancies =
        perPhotoelectric * photoelectric[i] * (1 - 1 / shell.jumpRatio) * shell.yield;
      for (const line of shell.lines) {
        const line_keV = Math.min(line.energy_keV, energies_keV[belowEdge]);
        addLine(terms[i], energies_keV, line_keV, vacancies * line.share);
      }
    });
  }
  return terms.map((perNode) =>
    Array.from(perNode, (per_cm, node) => ({ node, per_cm })).filter(({ per_cm }) => per_cm > 0),
  );
}

function addLine(
  perNode: Float64Array,
  energies_keV: Float64Array,
  line_keV: number,
  per_cm: number,
): void {
  if (line_keV < energies_keV[0]) return;
  const above = Math.max(
    1,
    energies_keV.findIndex((energy) => energy >= line_keV),
  );
  const low = energies_keV[above - 1];
  const share = (line_keV - low) / (energies_keV[above] - low);
  perNode[above - 1] += per_cm * (1 - share);
  perNode[above] += per_cm * share;
}
