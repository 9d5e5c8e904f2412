import type { Case } from './case/schema.js';

/** Potentials the room offers, thinned evenly to at most `most` of them, both ends kept. */
export const roomPotentials_kV = (c: Case, most = Number.POSITIVE_INFINITY): number[] => {
  const { min, max, step } = c.room.tube.potential_kV;
  const count = Math.floor((max - min) / step + 1e-9) + 1;
  const stride = Math.max(1, Math.ceil((count - 1) / Math.max(1, most - 1)));
  const potentials: number[] = [];
  for (let i = 0; i < count; i += stride) potentials.push(Number((min + i * step).toFixed(6)));
  const last = Number((min + (count - 1) * step).toFixed(6));
  if (potentials[potentials.length - 1] !== last) potentials.push(last);
  return potentials;
};
