import type { Geometry } from '../case/schema.js';

/** Where the patient stands between focal spot and detector. */
export interface Distances {
  readonly sourceToSkin_mm: number;
  readonly exitToDetector_mm: number;
}

/**
 * Distances at patient thickness T when the distance from source to detector is fixed: anchor
 * `detector` keeps the exit gap, `table` the source–skin distance, `isocentre` moves both by half
 * the change. As drawn, the exit gap is the entered one.
 *
 * @returns mm; a negative value means that the patient does not fit.
 */
export const anchoredDistances = (
  geometry: Geometry,
  drawnThickness_mm: number,
  thickness_mm: number,
): Distances => {
  const growth_mm = thickness_mm - drawnThickness_mm;
  const towardsDetector = { detector: 0, table: 1, isocentre: 0.5 }[geometry.anchor];
  const exitToDetector_mm = geometry.exitToDetector_mm - towardsDetector * growth_mm;
  return {
    exitToDetector_mm,
    sourceToSkin_mm: geometry.sourceToDetector_mm - exitToDetector_mm - thickness_mm,
  };
};
