import { airKermaPerRoentgen_mGy } from '../../materials/index.js';
import type { Fault } from '../case/fault.js';
import { numberText } from '../number-text.js';
import {
  type ModelledReading,
  modelledHalfValueLayer_mmAl,
  modelledOutput_uGy_per_mAs,
} from './reading-model.js';

/**
 * A half-value layer is believed between those of this much and this much inherent aluminium, and
 * beyond them by this factor: behind a thick added filter the inherent filter hardly shows.
 */
const believedInherent_mmAl = [0.5, 25] as const;
const believedBeyond = 1.25;
/** An output is believed between these output scales; a real tube lies within 0.5 to 1.3. */
const believedOutputFactor = [0.15, 5] as const;
/** What a mistaken unit must bring the output scale to, to be named as the likely cause. */
const likelyOutputFactor = [0.4, 1.8] as const;

const within = (value: number, [from, to]: readonly [number, number]): boolean =>
  value >= from && value <= to;

/** Mistakes of unit in an output, with the factor on the output scale that would put each right. */
const outputMistakes = [
  { factor: 1000, entered: 'in mGy/mAs' },
  { factor: airKermaPerRoentgen_mGy.value, entered: 'in mR/mAs' },
  { factor: 100, entered: 'with its distance in cm' },
  { factor: 1e-3, entered: 'in nGy/mAs' },
] as const;

/** A half-value layer no diagnostic tube can have, most often read in cm; null if believed. */
export function halfValueLayerFault(modelled: ModelledReading): Fault | null {
  const value = modelled.reading.halfValueLayer_mmAl;
  if (value === null) return null;
  const [thin, thick] = believedInherent_mmAl.map((inherent) =>
    modelledHalfValueLayer_mmAl(modelled, inherent),
  );
  const [least, most] = [thin / believedBeyond, thick * believedBeyond];
  if (within(value, [least, most])) return null;
  const meant = [value * 10, value / 10].find((v) => within(v, [least, most]));
  return {
    path: `room.readings[${modelled.index}].halfValueLayer_mmAl`,
    value: numberText(value),
    rule: `must be ${numberText(least)} to ${numberText(most)} mm Al at ${modelled.reading.potential_kV} kV through this filter`,
    remedy:
      meant === undefined
        ? 'check the potential, the filter and the unit'
        : `enter ${numberText(meant)} if it was read in ${meant > value ? 'cm' : 'tenths of mm'}`,
  };
}

/** An output no diagnostic tube can have, most often in another unit; null if believed. */
export function outputFault(modelled: ModelledReading, inherent_mmAl: number): Fault | null {
  const value = modelled.reading.airKerma_uGy_per_mAs;
  if (value === null) return null;
  const model = modelledOutput_uGy_per_mAs(modelled, inherent_mmAl);
  if (within(value / model, believedOutputFactor)) return null;
  const [least, most] = believedOutputFactor.map((factor) => factor * model);
  const mistake = outputMistakes.find(({ factor }) =>
    within((value / model) * factor, likelyOutputFactor),
  );
  const { potential_kV, distance_mm } = modelled.reading;
  return {
    path: `room.readings[${modelled.index}].airKerma_uGy_per_mAs`,
    value: numberText(value),
    rule: `must be ${numberText(least)} to ${numberText(most)} µGy/mAs at ${potential_kV} kV and ${numberText(distance_mm)} mm`,
    remedy: mistake
      ? `it looks entered ${mistake.entered}; enter µGy/mAs, and the distance in mm`
      : 'check the unit, the distance and the filter',
  };
}
