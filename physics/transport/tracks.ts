import {
  collision,
  collisionLength,
  crossing,
  crossingLength,
  drain,
  eventBuffer,
  face,
} from './events.js';
import { regionCount } from './geometry.js';
import type { TransportInput } from './input.js';
import { escapeCount, flyPhotons } from './kernel.js';
import { randomStream } from './random.js';

/** What happens at a point of a track. */
export const trackPoints = [
  'start',
  'absorbed',
  'compton',
  'rayleigh',
  'fluorescence',
  'left',
] as const;

/**
 * The way of one photon, from where it starts to where it is absorbed or ends. Positions in cm as
 * in the geometry, four numbers a point: x, y, z and the energy it goes on with, keV.
 */
export interface Track {
  readonly points: Float32Array;
  /** Index into `trackPoints` for every point. */
  readonly kinds: Uint8Array;
  /** Reached the detector plane. */
  readonly isDetected: boolean;
}

const left = trackPoints.indexOf('left');

/**
 * The first photons of a run, exactly as its first batch flies them (up to the photons of that
 * batch). Photons that leave towards the detector are drawn on to its plane.
 */
export function recordTracks(input: TransportInput, count: number): Track[] {
  const points: number[][] = Array.from({ length: count }, () => []);
  const kinds: number[][] = Array.from({ length: count }, () => []);
  const detected = new Uint8Array(count);
  const add = (photon: number, kind: number, position: readonly number[], energy_keV: number) => {
    points[photon].push(...position, energy_keV);
    kinds[photon].push(kind);
  };
  const startAt = (values: Float64Array, x: number, photon: number, energy_keV: number): void => {
    if (kinds[photon].length > 0) return;
    add(photon, 0, startOf(input, values, x), energy_keV);
  };
  const collisions = eventBuffer(collisionLength, (values, end) => {
    for (let at = 0; at < end; at += collisionLength) {
      const photon = values[at + collision.photon];
      startAt(values, at + collision.x, photon, values[at + collision.energy]);
      const position = [...values.subarray(at + collision.x, at + collision.u)];
      add(photon, 1 + values[at + collision.kind], position, values[at + collision.energyAfter]);
    }
  });
  const crossings = eventBuffer(crossingLength, (values, end) => {
    // Collisions came first: hand them over before the ends of their photons.
    drain(collisions);
    for (let at = 0; at < end; at += crossingLength) {
      const ended = values[at + crossing.face];
      if (ended === face.skin) continue;
      const photon = values[at + crossing.photon];
      startAt(values, at + crossing.x, photon, values[at + crossing.energy]);
      if (ended === face.detector) detected[photon] = 1;
      const z = ended === face.detector ? input.geometry.detector_cm : values[at + crossing.z];
      add(photon, left, onwards(values, at + crossing.x, z), values[at + crossing.energy]);
    }
  });
  flyPhotons(input, randomStream(input.seed, 0), count, {
    absorbed_keV: new Float64Array(regionCount(input.geometry)),
    escaped_keV: new Float64Array(escapeCount),
    crossings,
    everyEnd: true,
    collisions,
  });
  drain(crossings);
  return points.map((list, photon) => ({
    points: Float32Array.from(list),
    kinds: Uint8Array.from(kinds[photon]),
    isDetected: detected[photon] === 1,
  }));
}

// Where a photon started that was first seen at `x`: back along its direction to the source.
function startOf({ source, geometry }: TransportInput, values: Float64Array, x: number): number[] {
  return onwards(values, x, source.kind === 'point' ? source.z_cm : geometry.planes_cm[0]);
}

// Position at depth z on the line of a record whose x, y, z, u, v, w start at `x`.
function onwards(values: Float64Array, x: number, z_cm: number): number[] {
  const [px, py, pz, u, v, w] = values.subarray(x, x + 6);
  const way = z_cm === pz ? 0 : (z_cm - pz) / w;
  return [px + way * u, py + way * v, z_cm];
}
