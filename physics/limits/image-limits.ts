import { numberText } from '../number-text.js';
import type { Finding } from '../results.js';
import { smallestSide_mm } from '../unsharpness.js';
import { apartTexts } from './apart-texts.js';
import type { LimitInputs } from './limit-inputs.js';

/** Detector floor and ceiling, and motion during the exposure. */
export const imageLimits = (inputs: LimitInputs): Finding[] => [
  ...detectorLimits(inputs),
  ...motionLimits(inputs),
];

const detectorLimits = ({ case: c, detectorAirKerma_uGy: value, path }: LimitInputs): Finding[] => {
  const { min, max } = c.room.detector.airKerma_uGy;
  if (value >= min && value <= max) return [];
  const isLow = value < min;
  const bound = isLow ? min : max;
  const [is, most] = apartTexts(value, bound);
  return [
    {
      code: isLow ? 'detectorFloor' : 'detectorCeiling',
      severity: 'limit',
      message: `Detector air kerma ${is} µGy is ${isLow ? 'below the detector floor' : 'above the detector ceiling'} of ${most} µGy.`,
      path,
      value,
      bound,
    },
  ];
};

/** Share of the detail's smallest side across the beam that motion may blur before the exposure is too slow (assumed). */
const motionShare = 0.5;

const motionLimits = ({ case: c, exposure }: LimitInputs): Finding[] => {
  const { motion_mm_per_s } = c.task;
  const value = exposure.exposureTime_ms;
  if (value === null || motion_mm_per_s <= 0) return [];
  const side_mm = smallestSide_mm(c);
  const bound = ((motionShare * side_mm) / motion_mm_per_s) * 1000;
  if (value <= bound) return [];
  const [is, most] = apartTexts(value, bound);
  const blur_mm = (motion_mm_per_s * value) / 1000;
  return [
    {
      code: 'motion',
      severity: 'limit',
      message: `Motion of ${motion_mm_per_s} mm/s blurs ${numberText(blur_mm)} mm in ${is} ms, more than half the detail's smallest side of ${numberText(side_mm)} mm; the exposure must not exceed ${most} ms.`,
      path: 'task.motion_mm_per_s',
      value,
      bound,
    },
  ];
};
