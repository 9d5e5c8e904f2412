import type { AlongBeam } from '../../physics/along-beam.js';
import type { SpineLayout } from './spine-layout.js';

/** Decades of photons per mm² between full ink and bare paper. */
const decades = 4;
const darkest = 0.62;

/** Where a distance from the focal spot is drawn: to scale in the patient, shortened outside it. */
export function drawnAt(
  distance_mm: number,
  layout: SpineLayout,
  {
    sourceToSkin_mm,
    thickness_mm,
    sourceToDetector_mm,
  }: { sourceToSkin_mm: number; thickness_mm: number; sourceToDetector_mm: number },
): number {
  const exit_mm = sourceToSkin_mm + thickness_mm;
  const between = (from_mm: number, to_mm: number, top: number, bottom: number) =>
    to_mm > from_mm ? top + ((distance_mm - from_mm) / (to_mm - from_mm)) * (bottom - top) : bottom;
  if (distance_mm <= sourceToSkin_mm)
    return between(0, sourceToSkin_mm, layout.tube, layout.patient.top);
  if (distance_mm <= exit_mm)
    return between(sourceToSkin_mm, exit_mm, layout.patient.top, layout.patient.bottom);
  return between(exit_mm, sourceToDetector_mm, layout.patient.bottom, layout.detector.top);
}

/** The most photons per mm² of any of the beams: what full ink stands for. */
export const mostPhotons = (beams: readonly AlongBeam[]): number =>
  Math.max(0, ...beams.flatMap((beam) => beam.primaryFluence_per_mm2));

/**
 * Ink density by the logarithm of photons per mm²: `most` is the fluence of full ink, and every
 * factor of ten below it takes the same step toward bare paper.
 */
export const inkDensity = (fluence_per_mm2: number, most: number): number => {
  if (!(fluence_per_mm2 > 0) || !(most > 0)) return 0;
  return darkest * Math.max(0.04, 1 + Math.log10(fluence_per_mm2 / most) / decades);
};
