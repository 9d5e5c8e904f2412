import { powerAvailable_kW } from '../exposure.js';
import { numberText } from '../number-text.js';
import type { Finding } from '../results.js';
import { apartTexts } from './apart-texts.js';
import type { LimitInputs } from './limit-inputs.js';

/** Rounding is no excess. */
const slack = 1 + 1e-9;

interface Bound {
  readonly code: string;
  readonly value: number;
  readonly bound: number;
  /** The sentence, given value and bound as texts that differ. */
  readonly says: (value: string, bound: string) => string;
}

/** Power, current, time and heat that the tube and generator can give in this exposure. */
export const loadLimits = (inputs: LimitInputs): Finding[] => {
  const { case: c, setting, exposure, framesPerRun, path } = inputs;
  const { tube } = c.room;
  const { tubeLoad_mAs, tubeCurrent_mA, exposureTime_ms, power_kW } = exposure;
  if (tubeCurrent_mA === null || exposureTime_ms === null || power_kW === null) return [];
  const available_kW = powerAvailable_kW(tube, exposureTime_ms);
  const time = `${numberText(exposureTime_ms)} ms`;
  const above: readonly Bound[] = [
    {
      code: 'exposureTime',
      value: exposureTime_ms,
      bound: tube.exposureTime_ms.max,
      says: (value, bound) => `The exposure takes ${value} ms; the room allows ${bound} ms.`,
    },
    {
      code: 'power',
      value: power_kW,
      bound: available_kW,
      says: (value, bound) =>
        `Needs ${value} kW for ${time} (×${apartTexts(power_kW / available_kW, 1)[0]}); the room has ${bound} kW.`,
    },
    {
      code: 'tubeCurrent',
      value: tubeCurrent_mA,
      bound: tube.current_mA.max,
      says: (value, bound) => `Needs ${value} mA; the room's greatest is ${bound} mA.`,
    },
    {
      code: 'heatPerRun',
      value: (setting.potential_kV * tubeLoad_mAs * framesPerRun) / 1000,
      bound: tube.heatPerRun_kJ ?? Number.POSITIVE_INFINITY,
      says: (value, bound) =>
        `A run of ${framesPerRun} frames (masks counted) puts ${value} kJ into the anode; the room allows ${bound} kJ.`,
    },
  ];
  const below: readonly Bound[] = [
    {
      code: 'exposureTimeFloor',
      value: exposureTime_ms,
      bound: tube.exposureTime_ms.min,
      says: (value, bound) => `The exposure takes ${value} ms; the room's shortest is ${bound} ms.`,
    },
    {
      code: 'tubeCurrentFloor',
      value: tubeCurrent_mA,
      bound: tube.current_mA.min,
      says: (value, bound) => `Needs only ${value} mA; the room's least is ${bound} mA.`,
    },
  ];
  const broken = [
    ...above.filter(({ value, bound }) => value > bound * slack),
    ...below.filter(({ value, bound }) => value < bound / slack),
  ];
  return broken.map(({ code, value, bound, says }) => ({
    code,
    severity: 'limit',
    message: says(...apartTexts(value, bound)),
    path,
    value,
    bound,
  }));
};
