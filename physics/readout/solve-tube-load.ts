import { numberText } from '../number-text.js';
import type { HoldConstant } from '../results.js';
import type { LinearReadout } from './readout.js';

/** A tube load, or why there is none. */
export type SolvedLoad =
  | { readonly tubeLoad_mAs: number; readonly reason: null }
  | { readonly tubeLoad_mAs: null; readonly reason: string };

/** What can be solved for; `asSet` holds nothing. */
export type HeldQuantity = Exclude<HoldConstant, 'asSet'>;

const solved = (tubeLoad_mAs: number): SolvedLoad => ({ tubeLoad_mAs, reason: null });
const unreachable = (reason: string): SolvedLoad => ({ tubeLoad_mAs: null, reason });

/**
 * Tube load at which the chosen quantity of one frame meets a target.
 *
 * Kerma, signal and load are in proportion to m. For SdNR, with k = SdNR²,
 * m = {k a + √[(k a)² + 4(c − k s) k e]} / [2(c − k s)]; with c ≤ k s no load suffices, since static
 * noise grows with the signal.
 *
 * @param hold quantity held; target in its own unit: SdNR, µGy (detector air kerma), signal per mm²,
 * mGy (incident air kerma), mAs.
 * @param incidentAirKerma_mGy_per_mAs used for `incidentAirKerma`.
 * @returns mAs > 0 (0 for a target of 0), or null with the reason as a sentence.
 */
export const solveTubeLoad = (
  readout: LinearReadout,
  incidentAirKerma_mGy_per_mAs: number,
  hold: HeldQuantity,
  target: number,
): SolvedLoad => {
  if (!(target >= 0 && target < Infinity)) {
    return unreachable(`The target ${target} is not a quantity that can be reached.`);
  }
  if (target === 0) return solved(0);
  if (hold === 'sdnr') return forSdnr(readout, target);
  const perMAs = {
    detectorAirKerma: readout.detectorAirKerma_uGy_per_mAs,
    detectorSignal: readout.signalTotal_per_mm2_per_mAs,
    incidentAirKerma: incidentAirKerma_mGy_per_mAs,
    tubeLoad: 1,
  }[hold];
  const load = target / perMAs;
  return perMAs > 0 && load < Infinity
    ? solved(load)
    : unreachable('No photon of this beam arrives, so no tube load reaches the target.');
};

const forSdnr = ({ coefficients }: LinearReadout, target: number): SolvedLoad => {
  const { c, a, e, s } = coefficients;
  const k = target * target;
  const gain = c - k * s;
  if (c === 0) return unreachable('The detail has no contrast in this beam.');
  if (!(gain > 0)) {
    return unreachable(
      `SdNR ${numberText(target)} cannot be reached at any tube load: structure and background noise grow with the signal and hold it below ${numberText(Math.sqrt(c / s))}.`,
    );
  }
  return solved((k * a + Math.sqrt((k * a) ** 2 + 4 * gain * k * e)) / (2 * gain));
};
