import type { ParsedCase } from '../../../physics/case/index.js';
import type { Weighing } from '../../../physics/results.js';
import type { DetailSpectra } from '../../workers/detail-spectra.js';
import type { Evaluator } from '../../workers/evaluator.js';
import { latestWins, superseded } from '../../workers/latest-wins.js';
import type { ScanHold, ScanPoint } from '../../workers/scan-slice.js';
import { scanPlan } from './scan-plan.js';

/** What is asked for a state of the desk. */
export interface Question {
  readonly revision: number;
  readonly parsed: ParsedCase;
  readonly size: string;
  readonly hold: ScanHold;
}

/** Where answers go, each with the question it belongs to. */
export interface AnswerSink {
  readonly weighing: (weighing: Weighing, question: Question) => void;
  readonly curve: (scan: readonly ScanPoint[], spectra: DetailSpectra, question: Question) => void;
  readonly failed: (message: string, question: Question) => void;
}

/**
 * Asks the evaluator: first the weighing, then, while nothing newer was asked, the spectra and the
 * potential scan in slices. The latest question wins; an error reaches the sink and stops nothing.
 */
export function answering(evaluator: Evaluator, sink: AnswerSink): (question: Question) => void {
  let latest: Question | null = null;

  const weigh = latestWins(async (question: Question) => {
    await evaluator.load(question.parsed);
    return evaluator.weigh();
  });
  const scan = async (question: Question) => {
    const spectra = await evaluator.spectra(question.size);
    const points: ScanPoint[] = [];
    for (const request of scanPlan(question.parsed.case, question.size, question.hold)) {
      if (latest !== question) return;
      points.push(...(await evaluator.scan(request)));
    }
    if (latest === question) sink.curve(points, spectra, question);
  };

  return async (question) => {
    latest = question;
    try {
      const weighing = await weigh(question);
      if (weighing === superseded) return;
      sink.weighing(weighing, question);
      if (latest === question) await scan(question);
    } catch (error) {
      sink.failed(error instanceof Error ? error.message : String(error), question);
    }
  };
}
