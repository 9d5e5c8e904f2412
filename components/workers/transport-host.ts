import { runBatch } from '../../physics/jobs/index.js';
import type { TransportInput } from '../../physics/transport/index.js';
import type { FromTransportWorker, ToTransportWorker } from './transport-messages.js';

/** What a transport worker does with its messages; `post` may hand over the buffers it is given. */
export function transportHost(
  post: (message: FromTransportWorker, transfer: ArrayBuffer[]) => void,
): (message: ToTransportWorker) => void {
  let run = -1;
  let input: TransportInput | null = null;
  return (message) => {
    if (message.kind === 'load') {
      run = message.run;
      input = message.input;
      return;
    }
    if (input === null || message.run !== run) return;
    try {
      const { batch, scores } = runBatch(input, message.batch);
      post({ kind: 'scores', run, batch, scores }, [scores.buffer as ArrayBuffer]);
    } catch (error) {
      post({ kind: 'failed', run, message: String(error) }, []);
    }
  };
}
