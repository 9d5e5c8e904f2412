/** What is timed: work whose result is returned, so that it cannot be optimised away. */
export interface Contender {
  readonly name: string;
  readonly run: () => unknown;
}

/** Contenders that answer the same question; the first is what the others are measured against. */
export interface Contest {
  readonly title: string;
  readonly contenders: readonly [Contender, ...Contender[]];
}

export interface Result {
  readonly name: string;
  /** Median over the rounds, per call. */
  readonly time_ms: number;
  /** Median over the rounds of this contender's time over the first one's in the same round. */
  readonly ratio: number;
  /** Quartiles of that ratio: how far apart rounds of unchanged code lie. */
  readonly ratioQuartiles: readonly [number, number];
}

export interface BenchOptions {
  readonly rounds?: number;
  readonly roundTime_ms?: number;
  /** Milliseconds from any fixed start. */
  readonly now?: () => number;
}

/** Value below which the share `fraction` of the numbers lies, by linear interpolation. */
export function quantile(values: readonly number[], fraction: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  const position = fraction * (sorted.length - 1);
  const below = Math.floor(position);
  const low = sorted[below] ?? Number.NaN;
  const high = sorted[Math.min(below + 1, sorted.length - 1)] ?? Number.NaN;
  return low + (high - low) * (position - below);
}

let sink: unknown;

/** Milliseconds per call of `repeats` calls in a row. */
function timePerCall(run: () => unknown, repeats: number, now: () => number): number {
  const started = now();
  for (let call = 0; call < repeats; call++) sink = run();
  return (now() - started) / repeats;
}

/**
 * Times the contenders of one contest in turn, round by round, so that a busy machine slows all of
 * them alike: ratios within a run mean something where times alone do not.
 */
export function compete(contest: Contest, options: BenchOptions = {}): readonly Result[] {
  const { rounds = 15, roundTime_ms = 20, now = () => performance.now() } = options;
  const repeats = contest.contenders.map(({ run }) => {
    const warm_ms = Math.min(timePerCall(run, 3, now), timePerCall(run, 3, now));
    return Math.max(1, Math.round(roundTime_ms / Math.max(warm_ms, 1e-4)));
  });
  const times = contest.contenders.map((): number[] => []);
  for (let round = 0; round < rounds; round++) {
    contest.contenders.forEach(({ run }, index) => {
      times[index]?.push(timePerCall(run, repeats[index] ?? 1, now));
    });
  }
  const first = times[0] ?? [];
  return contest.contenders.map(({ name }, index) => {
    const own = times[index] ?? [];
    const ratios = own.map((time, round) => time / (first[round] ?? Number.NaN));
    return {
      name,
      time_ms: quantile(own, 0.5),
      ratio: quantile(ratios, 0.5),
      ratioQuartiles: [quantile(ratios, 0.25), quantile(ratios, 0.75)],
    };
  });
}

/** Keeps the last result reachable for as long as the module lives. */
export const lastResult = (): unknown => sink;
