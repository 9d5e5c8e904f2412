const maxSteps = 100;

/**
 * Root of a continuous function between two arguments where it has opposite signs, by false position
 * with the Illinois weighting (Dowell & Jarratt 1971), falling back on halving when that is slow.
 *
 * @returns the root to `tolerance` relative, or null when the signs are the same at both ends or `f` is not a
 *   number somewhere between
 */
export function findRoot(
  f: (x: number) => number,
  from: number,
  to: number,
  tolerance = 1e-9,
): number | null {
  let [a, b] = [from, to];
  let [fa, fb] = [f(a), f(b)];
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (!(fa * fb < 0)) return null;
  for (let step = 0; step < maxSteps && Math.abs(b - a) > tolerance * Math.abs(b); step++) {
    const x = step % 8 === 7 ? (a + b) / 2 : b - (fb * (b - a)) / (fb - fa);
    const fx = f(x);
    if (fx === 0) return x;
    if (Number.isNaN(fx)) return null;
    if (fx * fb < 0) [a, fa] = [b, fb];
    else fa /= 2;
    [b, fb] = [x, fx];
  }
  return b;
}
