import type { AlongBeam } from '../../../physics/along-beam.js';
import type { ParsedCase } from '../../../physics/case/index.js';
import type { HoldConstant, Weighing } from '../../../physics/results.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import type { Evaluator } from '../../workers/evaluator.js';
import { latestWins, superseded } from '../../workers/latest-wins.js';
import { scanPlan } from './scan-plan.js';

/** What is asked for a state of the desk. */
export interface Question {
  readonly revision: number;
  readonly parsed: ParsedCase;
  readonly size: string;
  readonly hold: HoldConstant;
}

/** What the beam path shows. */
export interface Answer {
  readonly weighing: Weighing;
  readonly along: readonly AlongBeam[];
}

/** Where answers go, each with the question it belongs to. */
export interface AnswerSink {
  readonly answer: (answer: Answer, question: Question) => void;
  readonly curve: (scan: readonly SweepSetting[], question: Question) => void;
  /** The answer at another size of the mix than the one looked at. */
  readonly otherSize: (weighing: Weighing, question: Question) => void;
  readonly failed: (message: string, question: Question) => void;
}

/**
 * Asks the evaluator: first what the beam path shows, then, while nothing newer was asked, the
 * potential scan in slices and the other sizes one by one. The latest question wins; an error reaches the sink and stops nothing.
 */
export function answering(evaluator: Evaluator, sink: AnswerSink): (question: Question) => void {
  let latest: Question | null = null;

  const weigh = latestWins(async (question: Question) => {
    await evaluator.load(question.parsed);
    const [weighing, along] = await Promise.all([
      evaluator.weigh(question.size),
      evaluator.along(question.size),
    ]);
    return { weighing, along };
  });
  const scan = async (question: Question) => {
    const points: SweepSetting[] = [];
    for (const request of scanPlan(question.parsed.case, question.size, question.hold)) {
      if (latest !== question) return;
      points.push(...(await evaluator.scan(request)));
    }
    if (latest === question) sink.curve(points, question);
  };
  const otherSizes = async (question: Question) => {
    for (const { name } of sizesOf(question.parsed.case.patient)) {
      if (latest !== question) return;
      if (name === question.size) continue;
      const weighing = await evaluator.weigh(name);
      if (latest === question) sink.otherSize(weighing, question);
    }
  };

  return async (question) => {
    latest = question;
    try {
      const answer = await weigh(question);
      if (answer === superseded) return;
      sink.answer(answer, question);
      if (latest === question) await scan(question);
      await otherSizes(question);
    } catch (error) {
      sink.failed(error instanceof Error ? error.message : String(error), question);
    }
  };
}
