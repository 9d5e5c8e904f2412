/**
 * A piecewise cubic through nodes with given slopes. `x` ascends; a node given twice is a jump, and
 * the later row holds at the node itself.
 */
export interface HermiteCurve {
  readonly x: Float64Array;
  readonly y: Float64Array;
  readonly slope: Float64Array;
}

/** The curve's value at x; a straight line continues it beyond either end. */
export function evaluate(curve: HermiteCurve, at: number): number {
  const { x, y, slope } = curve;
  const last = x.length - 1;
  if (at <= x[0]) return y[0] + slope[0] * (at - x[0]);
  if (at >= x[last]) return y[last] + slope[last] * (at - x[last]);
  const i = lastNodeNotAbove(x, at);
  const h = x[i + 1] - x[i];
  const t = (at - x[i]) / h;
  const s = 1 - t;
  return (
    s * s * ((1 + 2 * t) * y[i] + t * h * slope[i]) +
    t * t * ((1 + 2 * s) * y[i + 1] - s * h * slope[i + 1])
  );
}

/** Natural cubic spline: second derivative continuous inside, zero at both ends. */
export function naturalSpline(x: Float64Array, y: Float64Array): HermiteCurve {
  const n = x.length;
  const slope = new Float64Array(n);
  if (n < 3) return { x, y, slope: slope.fill(n === 2 ? (y[1] - y[0]) / (x[1] - x[0]) : 0) };
  // Tridiagonal system for the node slopes, eliminated downward and solved upward.
  const upper = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const left = i > 0 ? 1 / (x[i] - x[i - 1]) : 0;
    const right = i < n - 1 ? 1 / (x[i + 1] - x[i]) : 0;
    const rise =
      (i > 0 ? (y[i] - y[i - 1]) * left * left : 0) +
      (i < n - 1 ? (y[i + 1] - y[i]) * right * right : 0);
    const pivot = 2 * (left + right) - (i > 0 ? left * upper[i - 1] : 0);
    upper[i] = right / pivot;
    slope[i] = (3 * rise - (i > 0 ? left * slope[i - 1] : 0)) / pivot;
  }
  for (let i = n - 2; i >= 0; i--) slope[i] -= upper[i] * slope[i + 1];
  return { x, y, slope };
}

/**
 * Monotone piecewise cubic, separately between nodes given twice, so that nothing rings at a jump.
 * Slopes after Fritsch & Butland 1984, one-sided three-point slopes at the ends, with one change: an
 * interval less than a third as long as its neighbour has no say in the slope of the longer one.
 * Tables put a node close to a jump, and a rounding step over so short an interval would otherwise
 * bend the next, long one by several per cent.
 */
export function monotoneCubic(x: Float64Array, y: Float64Array): HermiteCurve {
  const slope = new Float64Array(x.length);
  let from = 0;
  for (let i = 1; i <= x.length; i++) {
    if (i < x.length && x[i] !== x[i - 1]) continue;
    slope.set(monotoneSlopes(x.subarray(from, i), y.subarray(from, i)), from);
    from = i;
  }
  return { x, y, slope };
}

function monotoneSlopes(x: Float64Array, y: Float64Array): Float64Array {
  const last = x.length - 1;
  const length = (i: number) => x[i + 1] - x[i];
  const secant = (i: number) => (y[i + 1] - y[i]) / length(i);
  // One-sided slope at a node of interval i, from it and the interval beyond.
  const oneSided = (i: number, beyond: number) =>
    beyond < 0 || beyond >= last || outweighs(length(beyond), length(i))
      ? secant(i)
      : threePointSlope(length(i), secant(i), length(beyond), secant(beyond));
  return x.map((_, i) => {
    if (last === 0) return 0;
    if (i === 0) return withinMonotone(oneSided(0, 1), secant(0), secant(0));
    if (i === last) return withinMonotone(oneSided(i - 1, i - 2), secant(i - 1), secant(i - 1));
    const [left, right] = [secant(i - 1), secant(i)];
    if (outweighs(length(i), length(i - 1))) return withinMonotone(oneSided(i, i + 1), left, right);
    if (outweighs(length(i - 1), length(i))) {
      return withinMonotone(oneSided(i - 1, i - 2), left, right);
    }
    return withinMonotone(harmonicSlope(length(i - 1), left, length(i), right), left, right);
  });
}

// Whether an interval is so much longer than its neighbour that the neighbour is not heard.
function outweighs(length: number, neighbour: number): boolean {
  return neighbour * 3 < length;
}

// Weighted harmonic mean of the neighbouring secants (Fritsch & Butland 1984, eq. 5).
function harmonicSlope(hLeft: number, left: number, hRight: number, right: number): number {
  const wLeft = 2 * hRight + hLeft;
  const wRight = hRight + 2 * hLeft;
  return (wLeft + wRight) / (wLeft / left + wRight / right);
}

function threePointSlope(hNear: number, near: number, hFar: number, far: number): number {
  return ((2 * hNear + hFar) * near - hNear * far) / (hNear + hFar);
}

// Zero at a turning point, else at most three times either secant: enough for monotone pieces.
function withinMonotone(slope: number, left: number, right: number): number {
  if (left * right <= 0 || slope * left <= 0) return 0;
  const most = 3 * Math.min(Math.abs(left), Math.abs(right));
  return Math.sign(slope) * Math.min(Math.abs(slope), most);
}

// Index of the last node at or below `at`, by bisection; at a doubled node that is its upper row.
function lastNodeNotAbove(x: Float64Array, at: number): number {
  let low = 0;
  let high = x.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (x[middle] <= at) low = middle;
    else high = middle;
  }
  return low;
}
