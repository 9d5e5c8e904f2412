import type { Acquisition, Tube } from './case/schema.js';
import type { Exposure } from './results.js';

/**
 * Greatest tube power at an exposure time: the generator's rating, or the rating chart's where that
 * is lower. Between chart rows power is interpolated in ln time; outside it the end row holds.
 *
 * @returns kW; always positive.
 */
export const powerAvailable_kW = (tube: Tube, exposureTime_ms: number): number => {
  const { rating, power_kW } = tube;
  if (rating.length === 0) return power_kW;
  const after = rating.findIndex((row) => row.exposureTime_ms >= exposureTime_ms);
  if (after === 0) return Math.min(power_kW, rating[0].power_kW);
  if (after < 0) return Math.min(power_kW, rating[rating.length - 1].power_kW);
  const low = rating[after - 1];
  const high = rating[after];
  const share =
    Math.log(exposureTime_ms / low.exposureTime_ms) /
    Math.log(high.exposureTime_ms / low.exposureTime_ms);
  return Math.min(power_kW, low.power_kW + share * (high.power_kW - low.power_kW));
};

/** Greatest tube current the room can hold for a time at a potential, mA. */
export const currentAvailable_mA = (
  tube: Tube,
  potential_kV: number,
  exposureTime_ms: number,
): number =>
  Math.min(tube.current_mA.max, (powerAvailable_kW(tube, exposureTime_ms) / potential_kV) * 1000);

/**
 * The shortest exposure time that delivers a tube load within power and current, but no shorter
 * than the room's minimum. The power of a rating chart falls with time, so the time is found by
 * bisection on load delivered, which rises with time.
 *
 * @returns ms; the longest time of the room when even that falls short.
 */
export const shortestExposureTime_ms = (
  tube: Tube,
  potential_kV: number,
  tubeLoad_mAs: number,
): number => {
  const deliverable_mAs = (time_ms: number): number =>
    (currentAvailable_mA(tube, potential_kV, time_ms) * time_ms) / 1000;
  let low = tube.exposureTime_ms.min;
  let high = Math.max(tube.exposureTime_ms.max, low);
  if (deliverable_mAs(low) >= tubeLoad_mAs) return low;
  if (deliverable_mAs(high) < tubeLoad_mAs) return high;
  for (let step = 0; step < 60 && high - low > 1e-9 * high; step++) {
    const middle = (low + high) / 2;
    if (deliverable_mAs(middle) >= tubeLoad_mAs) high = middle;
    else low = middle;
  }
  return high;
};

/**
 * Splits a tube load per frame into current and time as the acquisition fixes it. What the room
 * cannot deliver is not clipped here: `limits` says so.
 *
 * @returns mAs, mA, ms and kW of one frame.
 */
export const splitTubeLoad = (
  tube: Tube,
  acquisition: Acquisition,
  potential_kV: number,
  tubeLoad_mAs: number,
): Exposure => {
  const { fixed } = acquisition;
  const exposureTime_ms =
    fixed === 'shortest'
      ? shortestExposureTime_ms(tube, potential_kV, tubeLoad_mAs)
      : 'exposureTime_ms' in fixed
        ? fixed.exposureTime_ms
        : (tubeLoad_mAs / fixed.tubeCurrent_mA) * 1000;
  const tubeCurrent_mA = exposureTime_ms > 0 ? (tubeLoad_mAs / exposureTime_ms) * 1000 : 0;
  return {
    tubeLoad_mAs,
    tubeCurrent_mA,
    exposureTime_ms,
    power_kW: (potential_kV * tubeCurrent_mA) / 1000,
  };
};
