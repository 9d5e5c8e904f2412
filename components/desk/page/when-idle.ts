/** Longest that idle work is put off. */
const latest_ms = 150;

/**
 * A call that runs `work` once, soon, when the browser has nothing more pressing: what is below the
 * fold need not hold up what is above it. Calls before it has run are one.
 */
export function whenIdle(work: () => void): () => void {
  let isWaiting = false;
  const run = () => {
    isWaiting = false;
    work();
  };
  return () => {
    if (isWaiting) return;
    isWaiting = true;
    if ('requestIdleCallback' in globalThis) requestIdleCallback(run, { timeout: latest_ms });
    else setTimeout(run, latest_ms / 3);
  };
}
