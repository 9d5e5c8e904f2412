import { nodesPerKeV, tableStride } from './energy-nodes.js';
import { face } from './events.js';
import { flight, flightLength, placeLength } from './flight.js';
import { slabOf, type TransportGeometry } from './geometry.js';
import { marchBounded, placeAt } from './march-bounded.js';
import type { MatterTables } from './matter-tables.js';

/** Deeper than this nothing arrives that could be told from nothing. */
const opaque = 100;

/** Mean free paths from a point along a direction with w > 0 to the end of the geometry. */
export type RayDepth = (from: Float64Array, direction: Float64Array, energy_keV: number) => number;

/** The ray tracer of a geometry: a sum over slabs, or a flight through the bounds. */
export function rayDepth(geometry: TransportGeometry, matter: MatterTables): RayDepth {
  const { bounds } = geometry;
  const { attenuation_per_cm } = matter;
  if (bounds === null) return throughSlabs(geometry, attenuation_per_cm);
  const ray = new Float64Array(flightLength);
  const where = new Int32Array(placeLength);
  return (from, direction, energy_keV) => {
    ray.set(from);
    ray.set(direction, flight.u);
    ray[flight.energy] = energy_keV;
    ray[flight.path] = opaque;
    placeAt(geometry, bounds, ray, where);
    const ended = marchBounded(geometry, bounds, attenuation_per_cm, ray, where);
    return ended === face.none ? opaque : opaque - ray[flight.path];
  };
}

function throughSlabs(geometry: TransportGeometry, attenuation_per_cm: Float32Array): RayDepth {
  const { planes_cm: planes, slabMatter } = geometry;
  return (from, direction, energy_keV) => {
    const at = energy_keV * nodesPerKeV;
    const node = at | 0;
    const between = at - node;
    let perpendicular = 0;
    let exit = from[2];
    for (let slab = slabOf(planes, exit); slab < slabMatter.length; slab++) {
      const entry = slabMatter[slab] * tableStride + node;
      const lower = attenuation_per_cm[entry];
      const attenuation = lower + between * (attenuation_per_cm[entry + 1] - lower);
      perpendicular += attenuation * (planes[slab + 1] - exit);
      exit = planes[slab + 1];
    }
    return perpendicular / direction[2];
  };
}
