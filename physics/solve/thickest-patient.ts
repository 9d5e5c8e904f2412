import type { Case, Size, Technique } from '../case/schema.js';
import { numberText } from '../number-text.js';
import { operatingPoint } from '../operating-point.js';
import type { Finding } from '../results.js';
import { settingOf } from '../setting.js';
import { sweepSetting } from '../sweep/sweep-setting.js';
import { type Answer, blockedBy, noAnswer } from './answer.js';

export interface ThickestPatient {
  readonly thickness_mm: number;
  readonly sdnr: number;
}

/** Found to this; no patient is measured better. */
const resolution_mm = 0.5;

interface Trial {
  readonly isMet: boolean;
  readonly sdnr: number | null;
  readonly findings: readonly Finding[];
}

/**
 * Thickest patient in whom a technique, as set, still shows the detail at a target SdNR with no
 * limit broken, between `thinnest_mm` and `thickest_mm`. Halving: every step places the patient
 * anew and solves its scatter.
 *
 * The findings say what stops the next half millimetre: SdNR, or the limit by name.
 */
export const thickestPatient = (
  c: Case,
  technique: Technique,
  targetSdnr: number,
  thinnest_mm: number,
  thickest_mm: number,
): Answer<ThickestPatient> => {
  const trial = (thickness_mm: number): Trial => {
    const size: Size = { name: `${numberText(thickness_mm, 5)} mm`, thickness_mm, weight: 1 };
    const point = operatingPoint(c, technique, size);
    if (!('made' in point)) return { isMet: false, sdnr: null, findings: point.findings };
    const { values, findings } = sweepSetting(c, point, settingOf(technique), 'asSet');
    const limits = findings.filter(({ severity }) => severity === 'limit');
    const sdnr = values?.sdnr ?? 0;
    return { isMet: sdnr >= targetSdnr && limits.length === 0, sdnr, findings: limits };
  };
  const stopping = (stopped: Trial): Finding[] =>
    stopped.findings.length > 0
      ? [...stopped.findings]
      : [
          blockedBy(
            'sdnrShort',
            `SdNR falls to ${numberText(stopped.sdnr ?? 0)}, below ${numberText(targetSdnr)}.`,
            {
              value: stopped.sdnr,
              bound: targetSdnr,
            },
          ),
        ];
  const thin = trial(thinnest_mm);
  if (!thin.isMet) return noAnswer(targetSdnr, stopping(thin));
  let low = thinnest_mm;
  let high = thickest_mm;
  let stopped = trial(high);
  if (stopped.isMet) low = high;
  while (high - low > resolution_mm) {
    const middle = (low + high) / 2;
    const tried = trial(middle);
    if (tried.isMet) low = middle;
    else {
      high = middle;
      stopped = tried;
    }
  }
  const again = trial(low);
  return {
    value: { thickness_mm: low, sdnr: again.sdnr ?? 0 },
    target: targetSdnr,
    forward: again.sdnr,
    findings: stopped.isMet ? [] : stopping(stopped),
  };
};
