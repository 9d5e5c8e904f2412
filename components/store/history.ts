/** What was, is, and was undone. Steps are kept for as long as the page is open. */
export interface History<T> {
  readonly past: readonly T[];
  readonly present: T;
  readonly future: readonly T[];
  /** What the last step edited, and when; edits of one thing in quick succession make one step. */
  readonly lastKey: string | null;
  readonly lastTime_ms: number;
}

/** Edits of one field closer together than this are one step of undo: holding an arrow key. */
const together_ms = 900;

export const historyOf = <T>(present: T): History<T> => ({
  past: [],
  present,
  future: [],
  lastKey: null,
  lastTime_ms: Number.NEGATIVE_INFINITY,
});

/**
 * `present` replaced by `next`; what was undone before is given up. A step without a key (null)
 * stands by itself.
 */
export function record<T>(
  history: History<T>,
  next: T,
  key: string | null,
  now_ms: number,
): History<T> {
  const soon = now_ms - history.lastTime_ms < together_ms && history.past.length > 0;
  const joins = key !== null && history.lastKey === key && soon;
  return {
    past: joins ? history.past : [...history.past, history.present],
    present: next,
    future: [],
    lastKey: key,
    lastTime_ms: now_ms,
  };
}

export function undo<T>(history: History<T>): History<T> {
  const previous = history.past.at(-1);
  if (history.past.length === 0 || previous === undefined) return history;
  return {
    past: history.past.slice(0, -1),
    present: previous,
    future: [history.present, ...history.future],
    lastKey: null,
    lastTime_ms: Number.NEGATIVE_INFINITY,
  };
}

export function redo<T>(history: History<T>): History<T> {
  const [next, ...future] = history.future;
  if (next === undefined) return history;
  return {
    past: [...history.past, history.present],
    present: next,
    future,
    lastKey: null,
    lastTime_ms: Number.NEGATIVE_INFINITY,
  };
}

/** Every step changed in place, with no step added: what was, is, and was undone alike. */
export const mapSteps = <T>(history: History<T>, change: (step: T) => T): History<T> => ({
  ...history,
  past: history.past.map(change),
  present: change(history.present),
  future: history.future.map(change),
});
