import { rate_mGy_per_min } from '../at-load.js';
import type { Acquisition, Case, Technique } from '../case/schema.js';
import { heldTarget } from '../compare.js';
import { isCurve } from '../control.js';
import { framesPerRun } from '../frames.js';
import { limitFindings } from '../limits.js';
import { type OperatingPoint, operatingPoint } from '../operating-point.js';
import type { Finding, HoldConstant } from '../results.js';
import type { Setting } from '../setting.js';
import { deliver, loadFor, type Yield } from '../yield.js';
import { type SweepValues, sweepValues } from './values.js';

/** One setting of a sweep at one size; values are null where its condition cannot be met. */
export interface SweepSetting {
  readonly potential_kV: number;
  readonly filter: string;
  readonly size: string;
  readonly values: SweepValues | null;
  readonly findings: readonly Finding[];
}

/**
 * One setting under a hold-constant condition: the reference technique with another potential and
 * filter, its load such that the held quantity equals the reference's as set. `asSet` keeps the
 * reference's control; a control curve says nothing about settings off the curve, so there it gives
 * no values and a finding.
 */
export const sweepSetting = (
  c: Case,
  reference: OperatingPoint,
  setting: Setting,
  hold: HoldConstant,
): SweepSetting =>
  hold === 'asSet'
    ? underOwnControl(c, reference, setting)
    : heldEqual(c, reference, setting, hold);

/** A technique as set, where its operating point is: the same row as a setting of a sweep. */
export const settingAsSet = (c: Case, point: OperatingPoint): SweepSetting =>
  atLoad(c, point.made, point.technique.acquisition, point.size.name, point);

const underOwnControl = (
  c: Case,
  { technique, size }: OperatingPoint,
  setting: Setting,
): SweepSetting => {
  if (isCurve(technique.control)) return withoutValues(setting, size.name, [offCurve(technique)]);
  const point = operatingPoint(c, { ...technique, ...setting }, size);
  return 'made' in point
    ? settingAsSet(c, point)
    : withoutValues(setting, size.name, point.findings);
};

const heldEqual = (
  c: Case,
  reference: OperatingPoint,
  setting: Setting,
  hold: Exclude<HoldConstant, 'asSet'>,
): SweepSetting => {
  const { size, technique } = reference;
  const { acquisition } = technique;
  const { made, findings } = deliver(c, reference.made.placement, setting, acquisition);
  if (!made) return withoutValues(setting, size.name, findings);
  const { tubeLoad_mAs, reason } = loadFor(made, hold, heldTarget(reference, hold));
  return tubeLoad_mAs === null
    ? withoutValues(setting, size.name, [...findings, unreachable(reason)])
    : atLoad(c, made, acquisition, size.name, { tubeLoad_mAs, findings });
};

const unreachable = (message: string): Finding => ({
  code: 'equalityUnreachable',
  severity: 'limit',
  message,
  value: null,
});

const offCurve = ({ name }: Technique): Finding => ({
  code: 'offControlCurve',
  severity: 'limit',
  message: `${name} follows a control curve, which says what the room delivers on it and nowhere else; hold a quantity constant instead.`,
  path: 'techniques[0].control',
  value: null,
});

const withoutValues = (
  { potential_kV, filter }: Setting,
  size: string,
  findings: readonly Finding[],
): SweepSetting => ({ potential_kV, filter, size, values: null, findings });

/** A yield at a load, and every limit it meets there. */
const atLoad = (
  c: Case,
  made: Yield,
  acquisition: Acquisition,
  size: string,
  { tubeLoad_mAs, findings }: Pick<OperatingPoint, 'tubeLoad_mAs' | 'findings'>,
): SweepSetting => {
  const values = sweepValues(c, made, acquisition, tubeLoad_mAs);
  const { exposureTime_ms, tubeCurrent_mA, power_kW } = values;
  const { setting, placement } = made;
  const limits = limitFindings({
    case: c,
    setting,
    mode: acquisition.mode,
    framesPerRun: framesPerRun(acquisition),
    exposure: { tubeLoad_mAs, exposureTime_ms, tubeCurrent_mA, power_kW },
    halfValueLayer_mmAl: values.halfValueLayer_mmAl,
    sourceToSkin_mm: placement.stack.sourceToSkin_mm,
    detectorAirKerma_uGy: values.detectorAirKerma_uGy,
    incidentAirKermaRate_mGy_per_min: rate_mGy_per_min(acquisition, values.incidentAirKerma_mGy),
    path: 'setting',
  });
  return {
    potential_kV: setting.potential_kV,
    filter: setting.filter,
    size,
    values,
    findings: [...findings, ...limits],
  };
};
