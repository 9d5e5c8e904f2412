import {
  absorptionEdges,
  type Material,
  massAttenuation,
  massEnergyAbsorption,
} from '../../materials/index.js';
import { type CheckRow, checkRow, type Tolerance } from './check-row.js';
import { materialOf } from './material-of.js';
import { numberAfter, type ReferenceRow, referenceRows } from './reference-rows.js';

/** μ/ρ and μen/ρ against Hubbell & Seltzer, NISTIR 5632. */
export const attenuationChecks = (): CheckRow[] =>
  referenceRows('mu_nist').map((row) => {
    const material = materialOf(row.set);
    const energy_keV = energyOf(row, material);
    const isAttenuation = row.item === 'mu_over_rho';
    const computed = isAttenuation
      ? massAttenuation(material, energy_keV)
      : massEnergyAbsorption(material, energy_keV);
    const tolerance = isAttenuation
      ? attenuationTolerance(row)
      : absorptionTolerance(row, material, energy_keV);
    return checkRow(row, computed, { rounding: true, ...tolerance });
  });

/** Edges are printed with four digits; the table's own edge stands for them. */
const energyOf = (row: ReferenceRow, material: Material): number => {
  const printed_keV = numberAfter(row.conditions, 'E=');
  const side = /just (below|above) edge/.exec(row.conditions)?.[1];
  if (side === undefined) return printed_keV;
  const [edge] = absorptionEdges(material, 0.999 * printed_keV, 1.001 * printed_keV);
  return side === 'below' ? edge.energy_keV * (1 - 1e-9) : edge.energy_keV;
};

/** W at 11.82 and Au at 14.04 keV: the printed rows do not fit their neighbours at the edges. */
const isOddRow = ({ tolerance }: ReferenceRow): boolean => tolerance.startsWith('6%');
const oddRow: Tolerance = {
  relative: 0.06,
  note: 'between two L edges the printed row does not fit its neighbours; a power law through them does',
};

const attenuationTolerance = (row: ReferenceRow): Tolerance => {
  if (isOddRow(row)) return oddRow;
  return row.known.startsWith('derived')
    ? { relative: 0.005, note: 'expected value interpolated along a straight line in log-log' }
    : { relative: 0.003 };
};

const absorptionTolerance = (
  row: ReferenceRow,
  material: Material,
  energy_keV: number,
): Tolerance => {
  if (isOddRow(row)) return oddRow;
  const heaviest = material.massFractions.at(-1)?.z ?? 0;
  const isMetal = ['aluminium', 'copper'].includes(material.name);
  if (energy_keV <= 150) return { relative: isMetal ? 0.011 : heaviest > 29 ? 0.025 : 0.003 };
  const note = 'bremsstrahlung losses are neglected, so the computed value is the higher';
  return { relative: isMetal || heaviest > 29 ? 0.085 : 0.007, note };
};
