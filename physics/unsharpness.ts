import type { Case } from './case/schema.js';
import { numberText } from './number-text.js';
import type { Finding, Unsharpness } from './results.js';
import type { PlacedDetail } from './stack/place-detail.js';

/** Blur beyond this share of the detail's smallest side is said to matter (assumed). */
const share = 1 / 3;

/**
 * Unsharpness in the plane of the detail: focal spot f(M − 1)/M, pixel p/M, motion v·t, and their
 * root sum square (common practice, no source). Shown beside SdNR, which does not yet include it.
 *
 * @param exposureTime_ms null for a source without a tube: motion is then left out.
 */
export const unsharpnessOf = (
  c: Case,
  { magnification }: Pick<PlacedDetail, 'magnification'>,
  exposureTime_ms: number | null,
): Unsharpness => {
  const { tube, detector } = c.room;
  const focalSpot_mm = (tube.focalSpot_mm * (magnification - 1)) / magnification;
  const pixel_mm = detector.pixel_mm / magnification;
  const motion_mm = (c.task.motion_mm_per_s * (exposureTime_ms ?? 0)) / 1000;
  return {
    focalSpot_mm,
    pixel_mm,
    motion_mm,
    total_mm: Math.hypot(focalSpot_mm, pixel_mm, motion_mm),
  };
};

/** The smallest side of the detail across the beam, which blur must stay below. */
export const smallestSide_mm = ({ task: { detail } }: Pick<Case, 'task'>): number =>
  detail.shape === 'vessel'
    ? Math.min(detail.size_mm, detail.length_mm)
    : Math.min(detail.length_mm, detail.width_mm ?? detail.length_mm);

/** Said where blur is no longer small against the detail: SdNR then flatters it. */
export const unsharpnessFindings = (c: Case, { total_mm }: Unsharpness): Finding[] => {
  const side_mm = smallestSide_mm(c);
  if (total_mm <= share * side_mm) return [];
  return [
    {
      code: 'blurNotInSdnr',
      severity: 'caution',
      message: `Focal spot, pixel and motion blur ${numberText(total_mm)} mm in the plane of the detail, against its smallest side of ${numberText(side_mm)} mm; SdNR is given without blur and flatters it.`,
      path: 'task.detail',
      value: total_mm,
      bound: share * side_mm,
    },
  ];
};
