import type { Case } from '../../physics/case/index.js';
import { sharedWith } from '../../physics/case/shared-with.js';
import { runRoomTask } from '../../physics/sweep/room-task.js';
import type { FromSweepWorker, ToSweepWorker } from './sweep-messages.js';

/**
 * What a sweep worker does with its messages, free of any worker. Parts of the case that an edit
 * left alone keep their identity, and with it what was computed of them.
 */
export function sweepHost(
  post: (message: FromSweepWorker) => void,
): (message: ToSweepWorker) => void {
  let loaded: Case | undefined;
  return (message) => {
    if (message.kind === 'load') {
      loaded = sharedWith(loaded, message.parsed.case);
      return;
    }
    const { id, task } = message;
    if (!loaded) return post({ kind: 'failed', id, message: 'no case was handed over' });
    try {
      post({ kind: 'done', id, answer: runRoomTask(loaded, task) });
    } catch (error) {
      post({ kind: 'failed', id, message: error instanceof Error ? error.message : String(error) });
    }
  };
}
