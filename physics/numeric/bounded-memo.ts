/**
 * Remembers the last `limit` results of `make` by key, forgetting the one unused for longest. A sweep
 * over potentials asks for the same few grids again and again; a run of random potentials must not
 * fill the memory.
 */
export function boundedMemo<Input, Result>(
  limit: number,
  keyOf: (input: Input) => string,
  make: (input: Input) => Result,
): (input: Input) => Result {
  const kept = new Map<string, Result>();
  return (input) => {
    const key = keyOf(input);
    const known = kept.get(key);
    if (known !== undefined) {
      kept.delete(key);
      kept.set(key, known);
      return known;
    }
    const made = make(input);
    kept.set(key, made);
    if (kept.size > limit) kept.delete(kept.keys().next().value as string);
    return made;
  };
}
