/** A photon in flight, as numbers in one array that kernel, march and source share. */
export const flight = {
  x: 0,
  y: 1,
  z: 2,
  u: 3,
  v: 4,
  w: 5,
  energy: 6,
  /** Mean free paths left until the next interaction. */
  path: 7,
  lastZ: 8,
} as const;
export const flightLength = 9;

/** Where it is in a bounded geometry: slab, side of the bounded slabs in x and y, in the insert. */
export const place = { slab: 0, sideX: 1, sideY: 2, inInsert: 3 } as const;
export const placeLength = 4;

/** Writes a photon's state; `path` is left as it is. */
export function setFlight(
  photon: Float64Array,
  x: number,
  y: number,
  z: number,
  u: number,
  v: number,
  w: number,
  energy_keV: number,
  lastZ: number,
): void {
  photon[flight.x] = x;
  photon[flight.y] = y;
  photon[flight.z] = z;
  photon[flight.u] = u;
  photon[flight.v] = v;
  photon[flight.w] = w;
  photon[flight.energy] = energy_keV;
  photon[flight.lastZ] = lastZ;
}
