import type { Control, Tube } from './case/schema.js';
import { nearestPotential_kV } from './limits/potential-limits.js';
import type { Setting } from './setting.js';

/** A row of a control curve in force at a size. */
export interface CurvePoint {
  readonly setting: Pick<Setting, 'potential_kV' | 'filter'>;
  readonly tubeCurrent_mA: number;
  readonly exposureTime_ms: number;
}

type Curve = Extract<Control, { curve: string }>;

export const isCurve = (control: Control): control is Curve => 'curve' in control;

/**
 * Where a control curve leads at a thickness. Potential, current and time are interpolated between
 * the two rows around it when both use the same filter, potential to the nearest step of the room;
 * where the filter changes between rows, the thinner row's setting holds up to the thicker row, so a
 * withdrawn filter shows as a jump. Outside the curve its end rows hold.
 *
 * @param steps the room's potentials; rows themselves are taken as they are written.
 */
export const curvePointAt = (
  curve: Curve,
  thickness_mm: number,
  steps: Tube['potential_kV'],
): CurvePoint | null => {
  const rows = [...(curve.rows ?? [])].sort((a, b) => a.thickness_mm - b.thickness_mm);
  if (rows.length === 0) return null;
  const after = rows.findIndex((row) => row.thickness_mm > thickness_mm);
  const low = rows[after < 0 ? rows.length - 1 : Math.max(0, after - 1)];
  const high = rows[after < 0 ? rows.length - 1 : after];
  const isBetween = low !== high && low.filter === high.filter && thickness_mm > low.thickness_mm;
  const share = isBetween
    ? (thickness_mm - low.thickness_mm) / (high.thickness_mm - low.thickness_mm)
    : 0;
  const between = (a: number, b: number): number => a + share * (b - a);
  const potential_kV = between(low.potential_kV, high.potential_kV);
  const isStepped = isBetween && potential_kV >= steps.min && potential_kV <= steps.max;
  return {
    setting: {
      potential_kV: isStepped ? nearestPotential_kV(steps, potential_kV) : potential_kV,
      filter: low.filter,
    },
    tubeCurrent_mA: between(low.tubeCurrent_mA, high.tubeCurrent_mA),
    exposureTime_ms: between(low.exposureTime_ms, high.exposureTime_ms),
  };
};
