/** A worker as a pool sees it: messages of one kind to it, of another from it. */
export interface PoolWorker<To, From> {
  readonly post: (message: To) => void;
  /** Called once; `lost` when the worker has stopped by itself. */
  readonly listen: (answer: (message: From) => void, lost: (message: string) => void) => void;
  readonly end: () => void;
}

/** A page's worker as a pool sees it. */
export const pageWorker = <To, From>(worker: Worker): PoolWorker<To, From> => ({
  post: (message) => worker.postMessage(message),
  listen: (answer, lost) => {
    worker.addEventListener('message', ({ data }: MessageEvent<From>) => answer(data));
    worker.addEventListener('error', ({ message }) => lost(message || 'could not start'));
    worker.addEventListener('messageerror', () => lost('its answer could not be read'));
  },
  end: () => worker.terminate(),
});
