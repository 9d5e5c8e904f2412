import { kept } from '../../materials/kept.js';
import type { Case, Size } from '../case/schema.js';
import { type RuleDeparture, rulesOfThumb } from '../rules-of-thumb.js';
import {
  type PercentileResult,
  percentileResult,
  type ThicknessResult,
  thicknessResult,
} from '../sizes.js';
import { type SolveAnswer, type SolveQuestion, solve } from '../solve.js';
import { sizesOf } from '../stack/sizes.js';
import { type SweepPiece, type SweepRequest, sweepPiece } from '../sweep.js';

/** A piece of work about a case that takes longer than a frame; plain data, fit to be posted. */
export type RoomTask =
  | { readonly kind: 'sweepPiece'; readonly request: SweepRequest; readonly index: number }
  | { readonly kind: 'percentile'; readonly percentile: number }
  | { readonly kind: 'thickness'; readonly size: Size }
  | { readonly kind: 'rules'; readonly size: Size }
  | { readonly kind: 'solve'; readonly question: SolveQuestion };

interface Answers {
  readonly sweepPiece: SweepPiece;
  readonly percentile: PercentileResult;
  readonly thickness: ThicknessResult;
  readonly rules: readonly RuleDeparture[];
  readonly solve: SolveAnswer;
}

/** What a task is answered with. */
export type AnswerTo<T extends RoomTask> = Answers[T['kind']];

/** Thicknesses outside a patient's mix that were asked for, so that their scatter is solved once. */
const others = new WeakMap<Case['patient'], Map<number, Size>>();

/** The case's own object for a size that came by post: what is remembered goes by identity. */
const ownSize = (c: Case, size: Size): Size =>
  sizesOf(c.patient).find(
    ({ name, thickness_mm }) => name === size.name && thickness_mm === size.thickness_mm,
  ) ??
  kept(
    kept(others, c.patient, () => new Map<number, Size>()),
    size.thickness_mm,
    () => size,
  );

const ownRequest = (c: Case, request: SweepRequest): SweepRequest => ({
  ...request,
  axes: { ...request.axes, sizes: request.axes.sizes.map((size) => ownSize(c, size)) },
});

const ownQuestion = (c: Case, question: SolveQuestion): SolveQuestion =>
  'size' in question ? { ...question, size: ownSize(c, question.size) } : question;

/** Does a task. */
export const runRoomTask = <T extends RoomTask>(c: Case, task: T): AnswerTo<T> => {
  const answer = (): Answers[keyof Answers] => {
    switch (task.kind) {
      case 'sweepPiece':
        return sweepPiece(c, ownRequest(c, task.request), task.index);
      case 'percentile':
        return percentileResult(c, task.percentile);
      case 'thickness':
        return thicknessResult(c, ownSize(c, task.size));
      case 'rules':
        return rulesOfThumb(c, ownSize(c, task.size));
      case 'solve':
        return solve(c, ownQuestion(c, task.question));
    }
  };
  return answer() as AnswerTo<T>;
};

/** The patient thickness a task is about: tasks of one thickness share what is dear to compute. */
export const thicknessOf = (task: RoomTask): number | null => {
  switch (task.kind) {
    case 'sweepPiece': {
      const { sizes, filters } = task.request.axes;
      return sizes[Math.floor(task.index / filters.length)].thickness_mm;
    }
    case 'percentile':
      return null;
    case 'solve':
      return 'size' in task.question ? task.question.size.thickness_mm : null;
    default:
      return task.size.thickness_mm;
  }
};
