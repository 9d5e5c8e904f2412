import { elementTableOf } from './element-tables.js';
import type { Material } from './material.js';
import { shellNames } from './shells.js';

/** An absorption edge of one element of a material. */
export interface AbsorptionEdge {
  readonly z: number;
  readonly shell: string;
  readonly energy_keV: number;
}

/** Edges of a material's elements with from ≤ energy ≤ to, ascending in energy; from the XCOM tables. */
export function absorptionEdges(
  material: Material,
  from_keV: number,
  to_keV: number,
): AbsorptionEdge[] {
  return material.massFractions
    .flatMap(({ z }) =>
      elementTableOf(z).edges.map(({ shell, energy_keV }) => ({
        z,
        shell: shellNames[shell],
        energy_keV,
      })),
    )
    .filter(({ energy_keV }) => energy_keV >= from_keV && energy_keV <= to_keV)
    .sort((a, b) => a.energy_keV - b.energy_keV);
}
