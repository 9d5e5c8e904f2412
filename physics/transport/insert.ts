import { flight } from './flight.js';

/**
 * A body inside one slab, replacing its matter: a box with half sizes along x, y and z, or a
 * cylinder along y with half sizes (radius, half length, radius).
 */
export interface Insert {
  readonly shape: 'cylinder' | 'box';
  readonly slab: number;
  /** Place in the matter tables. */
  readonly matter: number;
  readonly centre_cm: readonly [number, number, number];
  readonly half_cm: readonly [number, number, number];
}

/** Whether a position lies in the insert. */
export function insertHolds(insert: Insert, position: Float64Array): boolean {
  const { centre_cm, half_cm, shape } = insert;
  const x = Math.abs(position[flight.x] - centre_cm[0]);
  const y = Math.abs(position[flight.y] - centre_cm[1]);
  const z = Math.abs(position[flight.z] - centre_cm[2]);
  if (y > half_cm[1]) return false;
  return shape === 'cylinder'
    ? x * x + z * z <= half_cm[0] * half_cm[0]
    : x <= half_cm[0] && z <= half_cm[2];
}

/** Way to the insert's surface: out of it when inside, into it otherwise; infinite on a miss. */
export function insertDistance(insert: Insert, photon: Float64Array, inside: boolean): number {
  let near = Number.NEGATIVE_INFINITY;
  let far = Number.POSITIVE_INFINITY;
  const round = insert.shape === 'cylinder';
  for (let axis = 0; axis < 3; axis++) {
    if (round && axis !== 1) continue;
    const direction = photon[flight.u + axis];
    const offset = photon[axis] - insert.centre_cm[axis];
    const half = insert.half_cm[axis];
    if (direction === 0) {
      if (Math.abs(offset) > half) return Number.POSITIVE_INFINITY;
      continue;
    }
    const middle = -offset / direction;
    const spread = half / Math.abs(direction);
    near = Math.max(near, middle - spread);
    far = Math.min(far, middle + spread);
  }
  if (round) {
    const u = photon[flight.u];
    const w = photon[flight.w];
    const x = photon[flight.x] - insert.centre_cm[0];
    const z = photon[flight.z] - insert.centre_cm[2];
    const squared = u * u + w * w;
    const middle = -(x * u + z * w) / squared;
    const discriminant = middle * middle - (x * x + z * z - insert.half_cm[0] ** 2) / squared;
    if (!(discriminant > 0)) return inside ? 0 : Number.POSITIVE_INFINITY;
    const spread = Math.sqrt(discriminant);
    near = Math.max(near, middle - spread);
    far = Math.min(far, middle + spread);
  }
  if (inside) return Math.max(0, far);
  return far > near && near > 0 ? near : Number.POSITIVE_INFINITY;
}
