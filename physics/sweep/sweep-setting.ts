import type { Case, Technique } from '../case/schema.js';
import { heldTarget } from '../compare.js';
import { framesPerRun } from '../frames.js';
import { limitFindings } from '../limits.js';
import { type OperatingPoint, operatingPoint } from '../operating-point.js';
import { outputBeam } from '../output-beam.js';
import { prepare } from '../prepare.js';
import { solveTubeLoad } from '../readout/index.js';
import type { Finding, HoldConstant } from '../results.js';
import type { Setting } from '../setting.js';
import { yieldOf } from '../yield.js';
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
 * reference's control.
 */
export const sweepSetting = (
  c: Case,
  reference: OperatingPoint,
  setting: Setting,
  hold: HoldConstant,
): SweepSetting => {
  const where = { ...setting, size: reference.size.name };
  const { acquisition } = reference.technique;
  if (hold === 'asSet') {
    const technique: Technique = { ...reference.technique, ...setting };
    const point = operatingPoint(c, technique, reference.size);
    if (!('made' in point)) return { ...named(where), values: null, findings: point.findings };
    return finished(c, reference, point.made, point.tubeLoad_mAs, setting, point.findings);
  }
  const { spectrum, findings } = outputBeam(prepare(c), setting.potential_kV, setting.filter);
  if (!spectrum) return { ...named(where), values: null, findings };
  const made = yieldOf(c, reference.made.placement, setting, acquisition, spectrum);
  const load = solveTubeLoad(
    made.readout,
    made.dose.incidentAirKerma_mGy,
    hold,
    heldTarget(reference, hold),
  );
  if (load.tubeLoad_mAs === null) {
    const finding: Finding = {
      code: 'equalityUnreachable',
      severity: 'limit',
      message: load.reason,
      value: null,
    };
    return { ...named(where), values: null, findings: [...findings, finding] };
  }
  return finished(c, reference, made, load.tubeLoad_mAs, setting, findings);
};

const named = ({ potential_kV, filter, size }: Setting & { size: string }) => ({
  potential_kV,
  filter,
  size,
});

const finished = (
  c: Case,
  { technique, size }: OperatingPoint,
  made: OperatingPoint['made'],
  tubeLoad_mAs: number,
  setting: Setting,
  findings: readonly Finding[],
): SweepSetting => {
  const { acquisition } = technique;
  const values = sweepValues(c, made, setting, acquisition, tubeLoad_mAs);
  const { exposureTime_ms, tubeCurrent_mA, power_kW } = values;
  return {
    ...named({ ...setting, size: size.name }),
    values,
    findings: [
      ...findings,
      ...limitFindings({
        case: c,
        setting,
        mode: acquisition.mode,
        framesPerRun: framesPerRun(acquisition),
        exposure: { tubeLoad_mAs, exposureTime_ms, tubeCurrent_mA, power_kW },
        halfValueLayer_mmAl: values.halfValueLayer_mmAl,
        sourceToSkin_mm: made.placement.stack.sourceToSkin_mm,
        detectorAirKerma_uGy: values.detectorAirKerma_uGy,
        incidentAirKermaRate_mGy_per_min:
          acquisition.mode === 'radiography' && acquisition.frames === 1
            ? null
            : values.incidentAirKerma_mGy * acquisition.frameRate_per_s * 60,
        path: 'setting',
      }),
    ],
  };
};
