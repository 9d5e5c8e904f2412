import type { FromTransportWorker, TransportWorker } from './transport-messages.js';

/** A page's worker as the transport pool sees it. */
export const pageWorker = (worker: Worker): TransportWorker => ({
  post: (message) => worker.postMessage(message),
  listen: (answer, lost) => {
    worker.addEventListener('message', ({ data }: MessageEvent<FromTransportWorker>) =>
      answer(data),
    );
    worker.addEventListener('error', ({ message }) => lost(message || 'could not start'));
    worker.addEventListener('messageerror', () => lost('its answer could not be read'));
  },
  end: () => worker.terminate(),
});
