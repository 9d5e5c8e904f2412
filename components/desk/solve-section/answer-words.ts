import type { Case } from '../../../physics/case/schema.js';
import { holdConstantWords } from '../../../physics/compare.js';
import { settingLabel } from '../../../physics/setting.js';
import type { SolveAnswer, SolveQuestion } from '../../../physics/solve.js';
import { costs } from '../../../physics/sweep/costs.js';
import { formatEntry, formatNumber, formatPercent } from '../../charts/format.js';

/** An answer in words: what was found, more about it, and how the forward run meets the target. */
export interface AnswerWords {
  /** Null where a limit stops it: the findings say which. */
  readonly found: string | null;
  readonly more: string;
  readonly forward: string;
}

/** How a forward run compares with its target; further off than 1 %, a limit stopped it first. */
const forwardWords = (name: string, forward: number | null, target: number | null): string => {
  if (forward === null || target === null) return '';
  const off = Math.abs(forward / target - 1);
  const how =
    off < 0.01
      ? `met within ${formatEntry(Number(Math.max(100 * off, 0.01).toPrecision(1)))} %`
      : 'reached and more: a limit stops it first';
  return `Run forward again: ${name} ${formatNumber(forward, 4)}, target ${formatNumber(target, 4)}, ${how}.`;
};

export function answerWords(c: Case, question: SolveQuestion, given: SolveAnswer): AnswerWords {
  const { target, forward } = given.answer;
  const sdnr = forwardWords('SdNR', forward, target);
  const agent = c.task.detail.agent?.name ?? 'agent';
  const stops = given.answer.findings.length > 0 ? 'What stops a thicker one stands below.' : '';
  switch (given.what) {
    case 'bestSetting': {
      const { value } = given.answer;
      if (!value || question.what !== 'bestSetting') return none;
      const { words, unit } = costs[question.cost];
      return {
        found: settingLabel(value.setting),
        more: `SdNR² ${formatNumber(value.figureOfMerit)} per ${unit} ${words}, ${holdConstantWords[question.holdConstant]}; within 90 % of it from ${value.window90_kV.join(' to ')} kV; the control must hold ${formatNumber(value.detectorAirKerma_uGy)} µGy at the detector.`,
        forward: forwardWords(`SdNR² per ${unit}`, forward, target),
      };
    }
    case 'leastAgent': {
      const { value } = given.answer;
      if (!value) return none;
      return {
        found: `${formatNumber(value.amount)} ${value.unit} of ${agent}`,
        more: `as in the lumen; the case has ${formatEntry(c.task.detail.agent?.amount.value ?? 0)}.`,
        forward: sdnr,
      };
    }
    case 'lessAgent': {
      const { value } = given.answer;
      if (!value || question.what !== 'lessAgent') return none;
      return {
        found: `${formatNumber(value.potential_kV)} kV`,
        more: `the room’s step ${formatEntry(value.roomPotential_kV)} kV gives SdNR ${formatNumber(value.roomSdnr, 4)} with ${formatPercent(question.agentShare)} of the ${agent}; the control must hold ${formatNumber(value.detectorAirKerma_uGy)} µGy at the detector.`,
        forward: sdnr,
      };
    }
    case 'thickestPatient': {
      const { value } = given.answer;
      if (!value) return none;
      return { found: `${formatNumber(value.thickness_mm, 4)} mm`, more: stops, forward: sdnr };
    }
  }
}

const none: AnswerWords = { found: null, more: '', forward: '' };
