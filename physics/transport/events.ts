import { flight } from './flight.js';

/**
 * What the kernel tells the scorers: records of fixed length in a buffer that is emptied whenever it
 * fills. The kernel knows where photons go and what happens to them; scorers decide what it means.
 */
export interface EventBuffer {
  readonly values: Float64Array;
  /** First free place. */
  end: number;
  /** Takes the records from 0 to `end`; the buffer is reused afterwards. */
  readonly take: (values: Float64Array, end: number) => void;
}

/** A photon passes a plane that is watched. Offsets of a crossing record. */
export const crossing = {
  face: 0,
  history: 1,
  x: 2,
  y: 3,
  z: 4,
  u: 5,
  v: 6,
  w: 7,
  energy: 8,
  /** z of the last collision. */
  lastZ: 9,
  photon: 10,
} as const;
export const crossingLength = 11;

/** A photon interacts. Offsets of a collision record; the direction is the one it came with. */
export const collision = {
  kind: 0,
  history: 1,
  x: 2,
  y: 3,
  z: 4,
  u: 5,
  v: 6,
  w: 7,
  energy: 8,
  /** Energy the photon goes on with; 0 when it is absorbed. */
  energyAfter: 9,
  photon: 10,
  matter: 11,
} as const;
export const collisionLength = 12;

/** Values of `crossing.face`. `skin` is a scattered passage of the skin plane either way, not an end. */
export const face = { entrance: 0, side: 1, detector: 2, skin: 3, none: 4 } as const;

/** Values of `collision.kind`. */
export const interaction = { absorbed: 0, compton: 1, rayleigh: 2, fluorescence: 3 } as const;

/** What a photon has been through before. */
export const history = { primary: 0, firstCompton: 1, firstRayleigh: 2, multiple: 3 } as const;

const recordsInBuffer = 1024;

export function eventBuffer(recordLength: number, take: EventBuffer['take']): EventBuffer {
  return { values: new Float64Array(recordLength * recordsInBuffer), end: 0, take };
}

/** Hands over what is left. */
export function drain(buffer: EventBuffer): void {
  buffer.take(buffer.values, buffer.end);
  buffer.end = 0;
}

/** Notes that a photon passed a plane. */
export function recordCrossing(
  buffer: EventBuffer,
  photon: Float64Array,
  faceCode: number,
  past: number,
  number: number,
): void {
  const { values } = buffer;
  const at = claim(buffer, crossingLength);
  values[at + crossing.face] = faceCode;
  values[at + crossing.history] = past;
  copyFlight(values, at + crossing.x, photon);
  values[at + crossing.lastZ] = photon[flight.lastZ];
  values[at + crossing.photon] = number;
}

/** Notes an interaction; `photon` holds the state before it. */
export function recordCollision(
  buffer: EventBuffer,
  photon: Float64Array,
  kind: number,
  past: number,
  energyAfter_keV: number,
  number: number,
  matter: number,
): void {
  const { values } = buffer;
  const at = claim(buffer, collisionLength);
  values[at + collision.kind] = kind;
  values[at + collision.history] = past;
  copyFlight(values, at + collision.x, photon);
  values[at + collision.energyAfter] = energyAfter_keV;
  values[at + collision.photon] = number;
  values[at + collision.matter] = matter;
}

// The place of a new record; a full buffer is handed over first.
function claim(buffer: EventBuffer, recordLength: number): number {
  if (buffer.end + recordLength > buffer.values.length) drain(buffer);
  const at = buffer.end;
  buffer.end = at + recordLength;
  return at;
}

// x, y, z, u, v, w, energy stand in this order in a flight and in both records.
function copyFlight(values: Float64Array, at: number, photon: Float64Array): void {
  for (let i = 0; i <= flight.energy; i++) values[at + i] = photon[i];
}
