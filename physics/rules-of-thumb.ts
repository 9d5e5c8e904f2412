import type { Case, Size } from './case/schema.js';
import { operatingPoint } from './operating-point.js';
import { roomPotentials_kV } from './room-potentials.js';
import { deliver } from './yield.js';

/** One rule of thumb at one potential: the factor it promises and the factor the model finds. */
export interface RuleDeparture {
  readonly rule: '15 % rule' | '10 kV rule' | 'tissue half-value layer';
  readonly potential_kV: number;
  /** Promised by the rule: detector air kerma per mAs doubles, or halves. */
  readonly promised: number;
  readonly computed: number;
  /** Computed over promised, less one. */
  readonly departure: number;
  /** True where the rule is more than 20 % off. */
  readonly isOff: boolean;
}

/** Beyond this a rule of thumb is called off at that potential. */
export const departureAllowed = 0.2;

/** Thickness that the tissue rule takes for one half-value layer (common practice, no source). */
const tissueHalfValueLayer_mm = 30;

/**
 * Three rules of thumb (common practice, no source) against the model at one size, with Current's
 * filter and grid, by detector air kerma per mAs:
 * raising potential by 15 % doubles it; raising it by 10 kV doubles it; 3 cm more patient halves it.
 * Potentials whose changed partner lies outside the tube's 20–150 kV are left out; a source without
 * a tube has no potential to raise.
 */
export const rulesOfThumb = (c: Case, size: Size): RuleDeparture[] => {
  if (c.room.source) return [];
  const technique = c.techniques[0];
  const kermaPerLoad = (potential_kV: number, at: Size): number | null => {
    const point = operatingPoint(c, technique, at);
    if (!('made' in point)) return null;
    const setting = { potential_kV, filter: technique.filter, grid: technique.grid };
    const { made } = deliver(c, point.made.placement, setting, technique.acquisition);
    return made?.readout.detectorAirKerma_uGy_per_mAs ?? null;
  };
  const thicker: Size = {
    name: `${size.name} + 30 mm`,
    thickness_mm: size.thickness_mm + tissueHalfValueLayer_mm,
    weight: 0,
  };
  return roomPotentials_kV(c, 16).flatMap((potential_kV) => {
    const base = kermaPerLoad(potential_kV, size);
    const at = (raised_kV: number): number | null =>
      raised_kV <= 150 ? kermaPerLoad(raised_kV, size) : null;
    return [
      departureOf('15 % rule', potential_kV, 2, base, at(1.15 * potential_kV)),
      departureOf('10 kV rule', potential_kV, 2, base, at(potential_kV + 10)),
      departureOf(
        'tissue half-value layer',
        potential_kV,
        0.5,
        base,
        kermaPerLoad(potential_kV, thicker),
      ),
    ].filter((departure) => departure !== null);
  });
};

const departureOf = (
  rule: RuleDeparture['rule'],
  potential_kV: number,
  promised: number,
  base: number | null,
  changed: number | null,
): RuleDeparture | null => {
  if (base === null || changed === null || !(base > 0)) return null;
  const computed = changed / base;
  const departure = computed / promised - 1;
  return {
    rule,
    potential_kV,
    promised,
    computed,
    departure,
    isOff: Math.abs(departure) > departureAllowed,
  };
};
