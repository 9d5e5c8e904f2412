import type { SolveAnswer, SolveQuestion } from '../../../physics/solve.js';

/** The four things that can be asked. */
export type QuestionKind = SolveQuestion['what'];

/** What has become of a question. */
export type Asked =
  | { readonly phase: 'running'; readonly question: SolveQuestion }
  | { readonly phase: 'failed'; readonly question: SolveQuestion; readonly message: string }
  | {
      readonly phase: 'done';
      readonly question: SolveQuestion;
      readonly answer: SolveAnswer;
      /** What the answer depends on, to tell when the case has moved on. */
      readonly basis: string;
    };
