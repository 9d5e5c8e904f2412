import type { ParsedCase } from '../../physics/case/index.js';
import type { AnswerTo, RoomTask } from '../../physics/sweep/room-task.js';
import type { PoolWorker } from './page-worker.js';

/** To a sweep worker: a case to hold ready, or a task about the case it holds. */
export type ToSweepWorker =
  | { readonly kind: 'load'; readonly parsed: ParsedCase }
  | { readonly kind: 'do'; readonly id: number; readonly task: RoomTask };

/** From it: what a task is answered with, or why it is not. */
export type FromSweepWorker =
  | { readonly kind: 'done'; readonly id: number; readonly answer: AnswerTo<RoomTask> }
  | { readonly kind: 'failed'; readonly id: number; readonly message: string };

export type SweepWorker = PoolWorker<ToSweepWorker, FromSweepWorker>;
