import { electronRestEnergy_keV } from '../../materials/index.js';
import { quantileCount, rowPositions } from './angle-quantiles.js';
import { azimuthCosines, azimuthCount, azimuthSines } from './azimuth.js';
import { cutoffEnergy_keV, nodesPerKeV, tableStride } from './energy-nodes.js';
import {
  type EventBuffer,
  face,
  history,
  interaction,
  recordCollision,
  recordCrossing,
} from './events.js';
import { nextExponential } from './exponential.js';
import { flight, flightLength, place, placeLength, setFlight } from './flight.js';
import { fluorescenceEnergy } from './fluorescence.js';
import type { TransportGeometry } from './geometry.js';
import { marchBounded, matterAt, placeAt, regionAt } from './march-bounded.js';
import { angleStride, type MatterTables } from './matter-tables.js';
import { nextBits, nextUniform, type RandomStream } from './random.js';
import { drawEnergy, type EnergySampler, type Source, startPhoton } from './source.js';

/** What photons fly through and where they come from. */
export interface TransportWorld {
  readonly source: Source;
  readonly spectrum: EnergySampler;
  readonly geometry: TransportGeometry;
  readonly matter: MatterTables;
}

/** What one run of the kernel adds to. `collisions` null leaves interactions unreported. */
export interface KernelOutput {
  /** Energy absorbed per region of the geometry, keV. */
  readonly absorbed_keV: Float64Array;
  /** Energy that ended at each face (`faces` order), scattered photons, and unscattered last, keV. */
  readonly escaped_keV: Float64Array;
  /** Scattered photons at the detector and through the plane of the skin, either way. */
  readonly crossings: EventBuffer;
  /** Report the end of every photon that leaves, at whatever face, scattered or not. */
  readonly everyEnd: boolean;
  readonly collisions: EventBuffer | null;
}

/** The unscattered part of `escaped_keV`. */
export const unscattered = 3;
export const escapeCount = 4;

const perRest = 1 / electronRestEnergy_keV.value;
const cellShare = 2 ** -24;
const rowShare = 2 ** -19;
const branchShare = 2 ** -32;

/**
 * Analog transport of `photons` photons: photoelectric absorption with K fluorescence, bound Compton
 * scattering (Klein–Nishina × S(q)), Rayleigh scattering with F²(q); electrons deposit their energy
 * where they are freed. Marches from slab to slab. Returns the energy that was emitted, keV.
 */
export function flyPhotons(
  world: TransportWorld,
  stream: RandomStream,
  photons: number,
  output: KernelOutput,
): number {
  const { source, geometry, spectrum, matter } = world;
  const { bounds, planes_cm: planes, slabMatter, skinPlane } = geometry;
  const { attenuation_per_cm, comptonShare, scatterShare } = matter;
  const { comptonCosines, rayleighCosines, fluorescence } = matter;
  const { firstEmitter } = fluorescence;
  const { absorbed_keV, escaped_keV, crossings, collisions, everyEnd } = output;
  const lastSlab = slabMatter.length - 1;
  const photon = new Float64Array(flightLength);
  const where = new Int32Array(placeLength);
  let emitted = 0;

  for (let number = 0; number < photons; number++) {
    let energy = drawEnergy(spectrum, stream);
    emitted += energy;
    startPhoton(source, planes[0], stream, photon);
    if (bounds !== null) placeAt(geometry, bounds, photon, where);
    let x = photon[flight.x];
    let y = photon[flight.y];
    let z = photon[flight.z];
    let u = photon[flight.u];
    let v = photon[flight.v];
    let w = photon[flight.w];
    let lastZ = z;
    let past: number = history.primary;
    let slab = 0;

    for (;;) {
      const at = energy * nodesPerKeV;
      const node = at | 0;
      const between = at - node;
      let path = nextExponential(stream);
      let ended: number = face.none;
      let substance = 0;
      let region = 0;

      if (bounds === null) {
        const perZ = 1 / w;
        let way = 0;
        for (;;) {
          substance = slabMatter[slab];
          const entry = substance * tableStride + node;
          const lower = attenuation_per_cm[entry];
          const attenuation = lower + between * (attenuation_per_cm[entry + 1] - lower);
          const reach = ((w > 0 ? planes[slab + 1] : planes[slab]) - z) * perZ;
          const depth = attenuation * reach;
          if (depth > path) {
            const rest = path / attenuation;
            way += rest;
            z += rest * w;
            break;
          }
          path -= depth;
          way += reach;
          if (w > 0) {
            z = planes[++slab];
            if (slab > lastSlab) {
              ended = face.detector;
              break;
            }
            if (slab === skinPlane && past !== history.primary) {
              setFlight(photon, x + way * u, y + way * v, z, u, v, w, energy, lastZ);
              recordCrossing(crossings, photon, face.skin, past, number);
            }
          } else {
            z = planes[slab];
            if (slab === skinPlane) {
              setFlight(photon, x + way * u, y + way * v, z, u, v, w, energy, lastZ);
              recordCrossing(crossings, photon, face.skin, past, number);
            }
            if (--slab < 0) {
              ended = face.entrance;
              break;
            }
          }
        }
        x += way * u;
        y += way * v;
        region = slab;
      } else {
        setFlight(photon, x, y, z, u, v, w, energy, lastZ);
        photon[flight.path] = path;
        do {
          ended = marchBounded(geometry, bounds, attenuation_per_cm, photon, where);
          if (ended === face.skin) {
            if (past !== history.primary) {
              recordCrossing(crossings, photon, face.skin, past, number);
            }
            if (where[place.slab] < 0) ended = face.entrance;
          }
        } while (ended === face.skin);
        x = photon[flight.x];
        y = photon[flight.y];
        z = photon[flight.z];
        if (ended === face.none) {
          substance = matterAt(geometry, bounds, where);
          region = regionAt(geometry, bounds, where);
        }
      }

      if (ended !== face.none) {
        if (everyEnd || (ended === face.detector && past !== history.primary)) {
          setFlight(photon, x, y, z, u, v, w, energy, lastZ);
          recordCrossing(crossings, photon, ended, past, number);
        }
        escaped_keV[past === history.primary ? unscattered : ended] += energy;
        break;
      }

      // What happens there.
      const entry = substance * tableStride + node;
      const branch = (nextBits(stream) >>> 0) * branchShare;
      const scatters =
        scatterShare[entry] + between * (scatterShare[entry + 1] - scatterShare[entry]);
      const comptons =
        comptonShare[entry] + between * (comptonShare[entry + 1] - comptonShare[entry]);
      const turn = nextBits(stream);
      let kind: number = interaction.absorbed;
      let after = 0;
      let cosTheta = 0;
      if (branch < scatters) {
        kind = branch < comptons ? interaction.compton : interaction.rayleigh;
        const row = (rowPositions[node] + (turn >>> 13) * rowShare) | 0;
        const pick = nextBits(stream);
        const cell = substance * angleStride + row * quantileCount + (pick >>> 24);
        const cosines = kind === interaction.compton ? comptonCosines : rayleighCosines;
        cosTheta = cosines[cell];
        cosTheta += (pick & 0xffffff) * cellShare * (cosines[cell + 1] - cosTheta);
        after =
          kind === interaction.rayleigh ? energy : energy / (1 + energy * perRest * (1 - cosTheta));
      } else if (firstEmitter[substance] < firstEmitter[substance + 1]) {
        after = fluorescenceEnergy(fluorescence, substance, node, between, stream);
        if (after > 0) kind = interaction.fluorescence;
        cosTheta = 2 * nextUniform(stream) - 1;
      }
      if (after < cutoffEnergy_keV) after = 0;
      absorbed_keV[region] += energy - after;
      if (collisions !== null) {
        setFlight(photon, x, y, z, u, v, w, energy, lastZ);
        recordCollision(collisions, photon, kind, past, after, number, substance);
      }
      if (after === 0) break;

      // Where it goes on to.
      const cosPhi = azimuthCosines[turn & (azimuthCount - 1)];
      const sinPhi = azimuthSines[turn & (azimuthCount - 1)];
      const sineSquared = 1 - w * w;
      const turnSquared = Math.max(0, 1 - cosTheta * cosTheta);
      if (sineSquared > 1e-12) {
        const stretch = Math.sqrt(turnSquared / sineSquared);
        const oldU = u;
        u = u * cosTheta + stretch * (u * w * cosPhi - v * sinPhi);
        v = v * cosTheta + stretch * (v * w * cosPhi + oldU * sinPhi);
        w = w * cosTheta - stretch * sineSquared * cosPhi;
      } else {
        const sinTheta = Math.sqrt(turnSquared);
        u = sinTheta * cosPhi;
        v = sinTheta * sinPhi;
        w = w > 0 ? cosTheta : -cosTheta;
      }
      if (w === 0) w = 1e-12;
      past =
        past !== history.primary || kind === interaction.fluorescence
          ? history.multiple
          : kind === interaction.compton
            ? history.firstCompton
            : history.firstRayleigh;
      energy = after;
      lastZ = z;
    }
  }
  return emitted;
}
