/** What was, is, and was undone. Steps are kept for as long as the page is open. */
export interface History<T> {
  readonly past: readonly T[];
  readonly present: T;
  readonly future: readonly T[];
  /** What the last step changed, and when; equal keys in quick succession make one step. */
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

/** `present` replaced by `next`; what was undone before is given up. */
export function record<T>(history: History<T>, next: T, key: string, now_ms: number): History<T> {
  const joins =
    history.lastKey === key && now_ms - history.lastTime_ms < together_ms && history.past.length > 0;
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
