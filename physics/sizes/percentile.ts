import type { Size } from '../case/schema.js';

/** Percentiles every size mix is shown at. */
export const shownPercentiles: readonly number[] = [5, 50, 95];

/**
 * Thickness at a percentile of a weighted mix: each size stands at the middle of its own share of
 * the patients, and the percentile is interpolated between those middles; the ends hold.
 */
export const percentileThickness_mm = (sizes: readonly Size[], percentile: number): number => {
  const sorted = [...sizes].sort((a, b) => a.thickness_mm - b.thickness_mm);
  const total = sorted.reduce((sum, { weight }) => sum + weight, 0);
  if (!(total > 0)) return sorted[Math.floor(sorted.length / 2)].thickness_mm;
  let before = 0;
  const places = sorted.map(({ weight, thickness_mm }) => {
    const at = (before + weight / 2) / total;
    before += weight;
    return { at, thickness_mm };
  });
  const wanted = percentile / 100;
  const after = places.findIndex(({ at }) => at >= wanted);
  if (after <= 0) return places[after < 0 ? places.length - 1 : 0].thickness_mm;
  const low = places[after - 1];
  const high = places[after];
  const share = (wanted - low.at) / (high.at - low.at);
  return low.thickness_mm + share * (high.thickness_mm - low.thickness_mm);
};
