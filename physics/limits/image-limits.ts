import { numberText } from '../number-text.js';
import type { Finding } from '../results.js';
import type { LimitInputs } from './limit-inputs.js';

/** Share of the detail's size that motion may blur before a caution is raised (assumed). */
const motionShare = 0.5;

/** Detector floor and ceiling, source-to-skin distance and motion. */
export const imageLimits = (inputs: LimitInputs): Finding[] => {
  const { case: c, detectorAirKerma_uGy: kerma, sourceToSkin_mm, exposure, path } = inputs;
  const findings: Finding[] = [];
  const { min, max } = c.room.detector.airKerma_uGy;
  if (kerma < min || kerma > max) {
    const low = kerma < min;
    findings.push({
      code: low ? 'detectorFloor' : 'detectorCeiling',
      severity: 'limit',
      message: `Detector air kerma ${numberText(kerma)} µGy is ${low ? 'below the detector floor' : 'above the detector ceiling'} of ${low ? min : max} µGy.`,
      path,
      value: kerma,
      bound: low ? min : max,
    });
  }
  const { minSourceToSkin_mm } = c.room.geometry;
  if (c.room.geometry.beam === 'point' && sourceToSkin_mm < minSourceToSkin_mm) {
    findings.push({
      code: 'sourceToSkin',
      severity: 'limit',
      message: `The skin is ${numberText(sourceToSkin_mm)} mm from the focal spot; the room's least is ${minSourceToSkin_mm} mm.`,
      path: 'room.geometry.minSourceToSkin_mm',
      value: sourceToSkin_mm,
      bound: minSourceToSkin_mm,
    });
  }
  const { motion_mm_per_s, detail } = c.task;
  if (exposure.exposureTime_ms !== null && motion_mm_per_s > 0) {
    const blur_mm = (motion_mm_per_s * exposure.exposureTime_ms) / 1000;
    const bound_mm = motionShare * detail.size_mm;
    if (blur_mm > bound_mm) {
      findings.push({
        code: 'motion',
        severity: 'limit',
        message: `Motion of ${motion_mm_per_s} mm/s blurs ${numberText(blur_mm)} mm in ${numberText(exposure.exposureTime_ms)} ms, more than half the detail's ${detail.size_mm} mm; the time must not exceed ${numberText((bound_mm / motion_mm_per_s) * 1000)} ms.`,
        path: 'task.motion_mm_per_s',
        value: exposure.exposureTime_ms,
        bound: (bound_mm / motion_mm_per_s) * 1000,
      });
    }
  }
  return findings;
};
