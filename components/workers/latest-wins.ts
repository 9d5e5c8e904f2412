/** A run that was overtaken by a later one before it began. */
export const superseded = Symbol('superseded');

/**
 * Makes `run` answer the latest request: one runs, at most one waits, and a request that comes while
 * another waits takes its place. The one replaced resolves to `superseded` and is never run.
 */
export function latestWins<In, Out>(
  run: (input: In) => Promise<Out>,
): (input: In) => Promise<Out | typeof superseded> {
  interface Waiting {
    readonly input: In;
    readonly resolve: (answer: Promise<Out> | typeof superseded) => void;
  }
  let running = false;
  let waiting: Waiting | null = null;

  const begin = (input: In): Promise<Out> => {
    running = true;
    const answer = run(input);
    const next = () => {
      running = false;
      const { input: nextInput, resolve } = waiting ?? {};
      waiting = null;
      if (resolve) resolve(begin(nextInput as In));
    };
    answer.then(next, next);
    return answer;
  };

  return (input) => {
    if (!running) return begin(input);
    waiting?.resolve(superseded);
    return new Promise((resolve) => {
      waiting = { input, resolve };
    });
  };
}
