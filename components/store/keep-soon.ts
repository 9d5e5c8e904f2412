/** Keeps the latest of many values, a moment after the last one came. */
export interface Keeper<T> {
  readonly later: (value: T) => void;
  /** Keeps what waits at once: the page may be gone in a moment. */
  readonly now: () => void;
}

/** @param told hears after each keeping whether it succeeded. */
export function keepSoon<T>(
  keep: (value: T) => Promise<boolean>,
  after_ms: number,
  told: (isKept: boolean) => void,
): Keeper<T> {
  let waiting: { readonly value: T } | null = null;
  let timer: ReturnType<typeof setTimeout> | undefined;
  const now = () => {
    clearTimeout(timer);
    if (!waiting) return;
    const { value } = waiting;
    waiting = null;
    void keep(value).then(told);
  };
  return {
    later: (value) => {
      waiting = { value };
      clearTimeout(timer);
      timer = setTimeout(now, after_ms);
    },
    now,
  };
}
