import { currentAvailable_mA, powerAvailable_kW } from '../exposure.js';
import { numberText } from '../number-text.js';
import type { Finding } from '../results.js';
import type { LimitInputs } from './limit-inputs.js';

const limit = (finding: Omit<Finding, 'severity'>): Finding => ({ severity: 'limit', ...finding });

/** The step of the room's potential selector nearest to a value inside its range. */
export const nearestPotential_kV = (
  range: { min: number; max: number; step: number },
  potential_kV: number,
): number => {
  const inside = Math.min(range.max, Math.max(range.min, potential_kV));
  const stepped = range.min + Math.round((inside - range.min) / range.step) * range.step;
  return Number(Math.min(range.max, stepped).toFixed(6));
};

/** The generator offers potentials from min to max in steps. */
export const potentialLimits = ({ case: c, setting, path }: LimitInputs): Finding[] => {
  const range = c.room.tube.potential_kV;
  const { potential_kV } = setting;
  const nearest = nearestPotential_kV(range, potential_kV);
  const where = { path: `${path}.potential_kV`, value: potential_kV, nearest: `${nearest} kV` };
  if (potential_kV < range.min || potential_kV > range.max) {
    const bound = potential_kV < range.min ? range.min : range.max;
    return [
      limit({
        code: 'potentialRange',
        message: `${potential_kV} kV lies outside the room's ${range.min} to ${range.max} kV.`,
        bound,
        ...where,
      }),
    ];
  }
  if (Math.abs(nearest - potential_kV) > 1e-6) {
    return [
      limit({
        code: 'potentialStep',
        message: `${potential_kV} kV is not one of the room's steps of ${range.step} kV from ${range.min} kV.`,
        bound: range.step,
        ...where,
      }),
    ];
  }
  return [];
};

/** Power, current, time and heat that the tube and generator can give in this exposure. */
export const loadLimits = (inputs: LimitInputs): Finding[] => {
  const { case: c, setting, exposure, framesPerRun, path } = inputs;
  const { tube } = c.room;
  const { tubeLoad_mAs, tubeCurrent_mA, exposureTime_ms, power_kW } = exposure;
  if (tubeCurrent_mA === null || exposureTime_ms === null || power_kW === null) return [];
  const findings: Finding[] = [];
  const slack = 1 + 1e-9;
  const { min: minTime_ms, max: maxTime_ms } = tube.exposureTime_ms;
  if (exposureTime_ms > maxTime_ms * slack) {
    findings.push(
      limit({
        code: 'exposureTime',
        message: `The exposure takes ${numberText(exposureTime_ms)} ms; the room allows ${maxTime_ms} ms.`,
        path,
        value: exposureTime_ms,
        bound: maxTime_ms,
      }),
    );
  } else if (exposureTime_ms < minTime_ms / slack) {
    findings.push(
      limit({
        code: 'exposureTimeFloor',
        message: `The exposure takes ${numberText(exposureTime_ms)} ms; the room's shortest is ${minTime_ms} ms.`,
        path,
        value: exposureTime_ms,
        bound: minTime_ms,
      }),
    );
  }
  const available_kW = powerAvailable_kW(tube, exposureTime_ms);
  if (power_kW > available_kW * slack) {
    findings.push(
      limit({
        code: 'power',
        message: `Needs ${numberText(power_kW)} kW for ${numberText(exposureTime_ms)} ms (×${(power_kW / available_kW).toFixed(2)}); the room has ${numberText(available_kW)} kW.`,
        path,
        value: power_kW,
        bound: available_kW,
      }),
    );
  }
  if (tubeCurrent_mA > tube.current_mA.max * slack) {
    findings.push(
      limit({
        code: 'tubeCurrent',
        message: `Needs ${numberText(tubeCurrent_mA)} mA; the room's greatest is ${tube.current_mA.max} mA.`,
        path,
        value: tubeCurrent_mA,
        bound: tube.current_mA.max,
      }),
    );
  } else if (tubeCurrent_mA < tube.current_mA.min / slack) {
    findings.push(
      limit({
        code: 'tubeCurrentFloor',
        message: `Needs only ${numberText(tubeCurrent_mA)} mA; the room's least is ${tube.current_mA.min} mA.`,
        path,
        value: tubeCurrent_mA,
        bound: tube.current_mA.min,
      }),
    );
  }
  const heat_kJ = (setting.potential_kV * tubeLoad_mAs * framesPerRun) / 1000;
  if (tube.heatPerRun_kJ !== null && heat_kJ > tube.heatPerRun_kJ * slack) {
    findings.push(
      limit({
        code: 'heatPerRun',
        message: `A run of ${framesPerRun} frames (masks counted) puts ${numberText(heat_kJ)} kJ into the anode; the room allows ${numberText(tube.heatPerRun_kJ)} kJ.`,
        path,
        value: heat_kJ,
        bound: tube.heatPerRun_kJ,
      }),
    );
  }
  return findings;
};

/** Largest load of one frame at a potential within the room's longest exposure, mAs. */
export const greatestTubeLoad_mAs = (inputs: Pick<LimitInputs, 'case' | 'setting'>): number => {
  const { tube } = inputs.case.room;
  const time_ms = tube.exposureTime_ms.max;
  return (currentAvailable_mA(tube, inputs.setting.potential_kV, time_ms) * time_ms) / 1000;
};
