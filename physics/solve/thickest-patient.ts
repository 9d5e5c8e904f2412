import type { Case, Size, Technique } from '../case/schema.js';
import { limitsOf } from '../findings.js';
import { numberText } from '../number-text.js';
import { operatingPoint } from '../operating-point.js';
import type { Finding } from '../results.js';
import { settingAsSet } from '../sweep/sweep-setting.js';
import { type Answer, blockedBy, noAnswer } from './answer.js';

export interface ThickestPatient {
  readonly thickness_mm: number;
  readonly sdnr: number;
}

/** Found to this; no patient is measured better. */
const resolution_mm = 0.5;

/** Thicknesses tried first, evenly from thickest to thinnest, to find where the target is met at all. */
const coarseSteps = 6;

interface Trial {
  readonly thickness_mm: number;
  readonly isMet: boolean;
  readonly sdnr: number | null;
  readonly limits: readonly Finding[];
}

/**
 * Thickest patient in whom a technique, as set, still shows the detail at a target SdNR with no
 * limit broken, between `thinnest_mm` and `thickest_mm`. Looked for from the thickest down, then by
 * halving: every step places the patient anew and solves its scatter. `forward` is its SdNR: the
 * target, or more where a limit stops a thicker patient first.
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
  const trial = (thickness_mm: number): Trial => trialAt(c, technique, targetSdnr, thickness_mm);
  let stopped = trial(thickest_mm);
  if (stopped.isMet) return answerOf(targetSdnr, stopped, []);
  let met: Trial | null = null;
  const step_mm = (thickest_mm - thinnest_mm) / coarseSteps;
  for (let step = 1; step <= coarseSteps && !met; step++) {
    const tried = trial(thickest_mm - step * step_mm);
    if (tried.isMet) met = tried;
    else stopped = tried;
  }
  if (!met) return noAnswer(targetSdnr, stopping(stopped, targetSdnr));
  while (stopped.thickness_mm - met.thickness_mm > resolution_mm) {
    const tried = trial((stopped.thickness_mm + met.thickness_mm) / 2);
    if (tried.isMet) met = tried;
    else stopped = tried;
  }
  return answerOf(targetSdnr, met, stopping(stopped, targetSdnr));
};

const trialAt = (
  c: Case,
  technique: Technique,
  targetSdnr: number,
  thickness_mm: number,
): Trial => {
  const size: Size = { name: `${numberText(thickness_mm, 5)} mm`, thickness_mm, weight: 1 };
  const point = operatingPoint(c, technique, size);
  if (!('made' in point)) {
    return { thickness_mm, isMet: false, sdnr: null, limits: point.findings };
  }
  const { values, findings } = settingAsSet(c, point);
  const limits = limitsOf(findings);
  const sdnr = values?.sdnr ?? 0;
  return { thickness_mm, isMet: sdnr >= targetSdnr && limits.length === 0, sdnr, limits };
};

const answerOf = (
  target: number,
  { thickness_mm, sdnr }: Trial,
  findings: readonly Finding[],
): Answer<ThickestPatient> => ({
  value: { thickness_mm, sdnr: sdnr ?? 0 },
  target,
  forward: sdnr,
  findings,
});

const stopping = ({ limits, sdnr }: Trial, targetSdnr: number): Finding[] => {
  if (limits.length > 0) return [...limits];
  const message = `SdNR falls to ${numberText(sdnr ?? 0, 4)}, below ${numberText(targetSdnr, 4)}.`;
  return [blockedBy('sdnrShort', message, { value: sdnr, bound: targetSdnr })];
};
