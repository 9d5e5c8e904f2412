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
 * Monotone piecewise cubic (Fritsch & Butland 1984 slopes; one-sided three-point slopes at the ends),
 * separately between nodes given twice, so that nothing rings at a jump.
 */
export function monotoneCubic(x: Float64Array, y: Float64Array): HermiteCurve {
  const slope = new Float64Array(x.length);
  let from = 0;
  for (let i = 1; i <= x.length; i++) {
    if (i < x.length && x[i] !== x[i - 1]) continue;
    setMonotoneSlopes(x, y, slope, from, i - 1);
    from = i;
  }
  return { x, y, slope };
}

function setMonotoneSlopes(
  x: Float64Array,
  y: Float64Array,
  slope: Float64Array,
  from: number,
  to: number,
): void {
  if (to === from) return;
  const secant = (i: number) => (y[i + 1] - y[i]) / (x[i + 1] - x[i]);
  if (to === from + 1) {
    slope[from] = slope[to] = secant(from);
    return;
  }
  for (let i = from + 1; i < to; i++) {
    slope[i] = innerSlope(x[i] - x[i - 1], secant(i - 1), x[i + 1] - x[i], secant(i));
  }
  slope[from] = endSlope(
    x[from + 1] - x[from],
    secant(from),
    x[from + 2] - x[from + 1],
    secant(from + 1),
  );
  slope[to] = endSlope(x[to] - x[to - 1], secant(to - 1), x[to - 1] - x[to - 2], secant(to - 2));
}

// Weighted harmonic mean of the neighbouring secants, zero at a turning point.
function innerSlope(hLeft: number, left: number, hRight: number, right: number): number {
  if (left * right <= 0) return 0;
  const wLeft = 2 * hRight + hLeft;
  const wRight = hRight + 2 * hLeft;
  return (wLeft + wRight) / (wLeft / left + wRight / right);
}

// Three-point slope at an end, held back where it would break monotonicity.
function endSlope(hNear: number, near: number, hFar: number, far: number): number {
  const slope = ((2 * hNear + hFar) * near - hNear * far) / (hNear + hFar);
  if (slope * near <= 0) return 0;
  if (near * far <= 0 && Math.abs(slope) > 3 * Math.abs(near)) return 3 * near;
  return slope;
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
