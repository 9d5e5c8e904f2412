import { nodesPerKeV, tableStride } from './energy-nodes.js';
import { face } from './events.js';
import { flight, flightLength, placeLength } from './flight.js';
import { slabOf, type TransportGeometry } from './geometry.js';
import { marchBounded, placeAt } from './march-bounded.js';
import type { MatterTables } from './matter-tables.js';

/** Deeper than this nothing arrives that could be told from nothing. */
const opaque = 100;

/**
 * Replaces `path` of a photon in flight with w > 0 by the mean free paths from where it is, straight
 * on, to the end of the geometry; nothing else of it changes.
 */
export type RayDepth = (photon: Float64Array) => void;

/** The ray tracer of a geometry: a sum over slabs, or a flight through the bounds. */
export function rayDepth(geometry: TransportGeometry, matter: MatterTables): RayDepth {
  const { bounds } = geometry;
  const { attenuation_per_cm } = matter;
  if (bounds === null) return throughSlabs(geometry, attenuation_per_cm);
  const ray = new Float64Array(flightLength);
  const where = new Int32Array(placeLength);
  return (photon) => {
    ray.set(photon);
    ray[flight.path] = opaque;
    placeAt(geometry, bounds, ray, where);
    const ended = marchBounded(geometry, bounds, attenuation_per_cm, ray, where);
    photon[flight.path] = ended === face.none ? opaque : opaque - ray[flight.path];
  };
}

function throughSlabs(geometry: TransportGeometry, attenuation_per_cm: Float32Array): RayDepth {
  const { planes_cm: planes, slabMatter } = geometry;
  return (photon) => {
    const at = photon[flight.energy] * nodesPerKeV;
    const node = at | 0;
    const between = at - node;
    let from = photon[flight.z];
    let perpendicular = 0;
    for (let slab = slabOf(planes, from); slab < slabMatter.length; slab++) {
      const entry = slabMatter[slab] * tableStride + node;
      const lower = attenuation_per_cm[entry];
      const attenuation = lower + between * (attenuation_per_cm[entry + 1] - lower);
      perpendicular += attenuation * (planes[slab + 1] - from);
      from = planes[slab + 1];
    }
    photon[flight.path] = perpendicular / photon[flight.w];
  };
}
