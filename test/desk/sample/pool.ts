import type { RunOptions, SweepPool } from '../../../components/workers/sweep-pool.js';
import type { ParsedCase } from '../../../physics/case/index.js';
import { type AnswerTo, type RoomTask, runRoomTask } from '../../../physics/sweep/room-task.js';

/** A pool without workers: it answers on this thread, one task a turn, and hears the signal. */
export const samePool: SweepPool = {
  run: async <T extends RoomTask>(
    parsed: ParsedCase,
    tasks: readonly T[],
    { onAnswer, signal }: RunOptions<T> = {},
  ) => {
    const answers: AnswerTo<T>[] = [];
    for (const [i, task] of tasks.entries()) {
      await new Promise((done) => setTimeout(done));
      signal?.throwIfAborted();
      const answer = runRoomTask(parsed.case, task);
      answers.push(answer);
      onAnswer?.(i, answer);
    }
    return answers;
  },
  isBusy: () => false,
  end: () => undefined,
};
