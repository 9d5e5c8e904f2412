import { flight } from './flight.js';
import { nextBits, nextUniform, type RandomStream } from './random.js';

/** Where photons start. Lengths in cm, z as in the geometry. */
export type Source =
  /** A parallel beam of no width on the axis. */
  | { readonly kind: 'pencil' }
  /** A parallel beam filling a rectangle. */
  | { readonly kind: 'parallel'; readonly halfField_cm: readonly [number, number] }
  /** A point on the axis, isotropic within the pyramid through a rectangle at the detector. */
  | {
      readonly kind: 'point';
      readonly z_cm: number;
      readonly halfField_cm: readonly [number, number];
      readonly distance_cm: number;
    };

/** Energies and their shares by Vose's alias method (IEEE Trans. Softw. Eng. 17 (1991) 972). */
export interface EnergySampler {
  readonly energies_keV: Float64Array;
  /** Share of photons at each energy; sums to 1. */
  readonly shares: Float64Array;
  readonly keep: Float64Array;
  readonly alias: Int32Array;
}

/** An energy drawn from the spectrum, keV. */
export function drawEnergy(sampler: EnergySampler, stream: RandomStream): number {
  const count = sampler.keep.length;
  if (count === 1) return sampler.energies_keV[0];
  const at = (nextBits(stream) >>> 0) * (count * 2 ** -32);
  const cell = at | 0;
  return sampler.energies_keV[at - cell < sampler.keep[cell] ? cell : sampler.alias[cell]];
}

/** The sampler of a spectrum given as energies and weights (any positive scale). */
export function energySampler(energies_keV: Float64Array, weights: Float64Array): EnergySampler {
  const present = [...energies_keV.keys()].filter((i) => weights[i] > 0);
  const total = present.reduce((sum, i) => sum + weights[i], 0);
  if (present.length === 0 || !Number.isFinite(total)) throw new Error('spectrum: no photons');
  const shares = Float64Array.from(present, (i) => weights[i] / total);
  return {
    energies_keV: Float64Array.from(present, (i) => energies_keV[i]),
    shares,
    ...aliasTable(shares),
  };
}

function aliasTable(shares: Float64Array): Pick<EnergySampler, 'keep' | 'alias'> {
  const keep = shares.map((share) => share * shares.length);
  const alias = Int32Array.from(shares.keys());
  const small = [...keep.keys()].filter((i) => keep[i] < 1);
  const large = [...keep.keys()].filter((i) => keep[i] >= 1);
  while (small.length > 0 && large.length > 0) {
    const poor = small.pop() as number;
    const rich = large[large.length - 1];
    alias[poor] = rich;
    keep[rich] -= 1 - keep[poor];
    if (keep[rich] < 1) small.push(large.pop() as number);
  }
  return { keep, alias };
}

/** Puts a photon at its start, direction included, on the first plane of the geometry. */
export function startPhoton(
  source: Source,
  firstPlane_cm: number,
  stream: RandomStream,
  photon: Float64Array,
): void {
  if (source.kind === 'point') {
    startFromPoint(source, firstPlane_cm, stream, photon);
    return;
  }
  photon[flight.x] = 0;
  photon[flight.y] = 0;
  if (source.kind === 'parallel') {
    photon[flight.x] = source.halfField_cm[0] * (2 * nextUniform(stream) - 1);
    photon[flight.y] = source.halfField_cm[1] * (2 * nextUniform(stream) - 1);
  }
  photon[flight.z] = firstPlane_cm;
  photon[flight.u] = 0;
  photon[flight.v] = 0;
  photon[flight.w] = 1;
}

// Isotropic emission has cos³ of the angle to the axis as its density on a plane: rejected by it.
function startFromPoint(
  source: Extract<Source, { kind: 'point' }>,
  firstPlane_cm: number,
  stream: RandomStream,
  photon: Float64Array,
): void {
  const [halfX, halfY] = source.halfField_cm;
  for (;;) {
    const tanX = (halfX * (2 * nextUniform(stream) - 1)) / source.distance_cm;
    const tanY = (halfY * (2 * nextUniform(stream) - 1)) / source.distance_cm;
    const w = 1 / Math.sqrt(1 + tanX * tanX + tanY * tanY);
    if (nextUniform(stream) > w * w * w) continue;
    const way = firstPlane_cm - source.z_cm;
    photon[flight.x] = way * tanX;
    photon[flight.y] = way * tanY;
    photon[flight.z] = firstPlane_cm;
    photon[flight.u] = tanX * w;
    photon[flight.v] = tanY * w;
    photon[flight.w] = w;
    return;
  }
}

/** Solid angle of the pyramid from a point to a centred rectangle at a distance, sr. */
export function solidAngle_sr(halfX_cm: number, halfY_cm: number, distance_cm: number): number {
  const diagonal = Math.hypot(halfX_cm, distance_cm) * Math.hypot(halfY_cm, distance_cm);
  return 4 * Math.asin((halfX_cm * halfY_cm) / diagonal);
}
