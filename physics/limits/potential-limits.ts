import type { Finding } from '../results.js';
import type { LimitInputs } from './limit-inputs.js';

/** The step of the room's potential selector nearest to a value inside its range. */
export const nearestPotential_kV = (
  range: { min: number; max: number; step: number },
  potential_kV: number,
): number => {
  const steps = Math.floor((range.max - range.min) / range.step + 1e-9);
  const inside = Math.min(range.max, Math.max(range.min, potential_kV));
  const step = Math.min(steps, Math.round((inside - range.min) / range.step));
  return Number((range.min + step * range.step).toFixed(6));
};

/** The generator offers potentials from min to max in steps. */
export const potentialLimits = ({ case: c, setting, path }: LimitInputs): Finding[] => {
  if (c.room.source) return [];
  const range = c.room.tube.potential_kV;
  const { potential_kV } = setting;
  const nearest_kV = nearestPotential_kV(range, potential_kV);
  const where = {
    severity: 'limit',
    path: `${path}.potential_kV`,
    value: potential_kV,
    nearest: `${nearest_kV} kV`,
  } as const;
  if (potential_kV < range.min || potential_kV > range.max) {
    return [
      {
        code: 'potentialRange',
        message: `${potential_kV} kV lies outside the room's ${range.min} to ${range.max} kV.`,
        bound: potential_kV < range.min ? range.min : range.max,
        ...where,
      },
    ];
  }
  if (Math.abs(nearest_kV - potential_kV) > 1e-6) {
    return [
      {
        code: 'potentialStep',
        message: `${potential_kV} kV is not one of the room's steps of ${range.step} kV from ${range.min} kV.`,
        bound: range.step,
        ...where,
      },
    ];
  }
  return [];
};
