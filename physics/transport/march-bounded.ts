import { nodesPerKeV, tableStride } from './energy-nodes.js';
import { face } from './events.js';
import { flight, place } from './flight.js';
import { type Bounds, slabOf, type TransportGeometry } from './geometry.js';
import { type Insert, insertDistance, insertHolds } from './insert.js';

/**
 * Flies a photon through slabs with finite sides or an insert until its mean free paths are used up,
 * it leaves, or it passes the skin plane. Changes `photon` and `where`, returns the face.
 */
export function marchBounded(
  geometry: TransportGeometry,
  bounds: Bounds,
  attenuation_per_cm: Float32Array,
  photon: Float64Array,
  where: Int32Array,
): number {
  const planes = geometry.planes_cm;
  const { insert } = bounds;
  const [halfX, halfY] = bounds.halfWidth_cm;
  const u = photon[flight.u];
  const v = photon[flight.v];
  const w = photon[flight.w];
  const at = photon[flight.energy] * nodesPerKeV;
  const node = at | 0;
  const between = at - node;
  for (;;) {
    const slab = where[place.slab];
    const entry = matterAt(geometry, bounds, where) * tableStride + node;
    const lower = attenuation_per_cm[entry];
    const attenuation = lower + between * (attenuation_per_cm[entry + 1] - lower);
    const toPlane = ((w > 0 ? planes[slab + 1] : planes[slab]) - photon[flight.z]) / w;
    const toX = sideDistance(
      photon[flight.x],
      u,
      where[place.sideX],
      halfX,
      bounds.worldHalfWidth_cm,
    );
    const toY = sideDistance(
      photon[flight.y],
      v,
      where[place.sideY],
      halfY,
      bounds.worldHalfWidth_cm,
    );
    const toInsert =
      insert !== null && insert.slab === slab
        ? insertDistance(insert, photon, where[place.inInsert] === 1)
        : Number.POSITIVE_INFINITY;
    const reach = Math.max(0, Math.min(toPlane, toX, toY, toInsert));
    const depth = attenuation * reach;
    if (depth > photon[flight.path]) {
      advance(photon, photon[flight.path] / attenuation);
      return face.none;
    }
    photon[flight.path] -= depth;
    advance(photon, reach);
    if (toInsert <= reach) {
      where[place.inInsert] ^= 1;
    } else if (toPlane <= reach) {
      if (w > 0) {
        photon[flight.z] = planes[slab + 1];
        where[place.slab] = slab + 1;
        if (slab + 1 === geometry.slabMatter.length) return face.detector;
        if (slab + 1 === geometry.skinPlane) return face.skin;
      } else {
        photon[flight.z] = planes[slab];
        where[place.slab] = slab - 1;
        if (slab === geometry.skinPlane) return face.skin;
        if (slab === 0) return face.entrance;
      }
    } else {
      const axis = toX <= reach ? place.sideX : place.sideY;
      where[axis] += (axis === place.sideX ? u : v) > 0 ? 1 : -1;
      if (Math.abs(where[axis]) > 1) return face.side;
    }
  }
}

/** Matter around a photon at its place. */
export function matterAt(geometry: TransportGeometry, bounds: Bounds, where: Int32Array): number {
  const slab = where[place.slab];
  if (where[place.inInsert] === 1) return (bounds.insert as Insert).matter;
  const beside = where[place.sideX] !== 0 || where[place.sideY] !== 0;
  return beside && bounds.slabBounded[slab] === 1
    ? bounds.outsideMatter
    : geometry.slabMatter[slab];
}

/** Region of the energy tally at a place: slabs first, then beside them, then the insert. */
export function regionAt(geometry: TransportGeometry, bounds: Bounds, where: Int32Array): number {
  const slab = where[place.slab];
  const slabs = geometry.slabMatter.length;
  if (where[place.inInsert] === 1) return slabs + 1;
  const beside = where[place.sideX] !== 0 || where[place.sideY] !== 0;
  return beside && bounds.slabBounded[slab] === 1 ? slabs : slab;
}

/** Puts `where` to the place of the position held by `photon`. */
export function placeAt(
  geometry: TransportGeometry,
  bounds: Bounds,
  photon: Float64Array,
  where: Int32Array,
): void {
  const [halfX, halfY] = bounds.halfWidth_cm;
  const slab = slabOf(geometry.planes_cm, photon[flight.z]);
  where[place.slab] = slab;
  where[place.sideX] = sideOf(photon[flight.x], halfX);
  where[place.sideY] = sideOf(photon[flight.y], halfY);
  where[place.inInsert] =
    bounds.insert?.slab === slab && insertHolds(bounds.insert, photon) ? 1 : 0;
}

const sideOf = (position: number, half: number): number =>
  position > half ? 1 : position < -half ? -1 : 0;

// Planes across one axis stand at −world, −half, +half, +world; `side` tells between which two.
function sideDistance(
  position: number,
  direction: number,
  side: number,
  half: number,
  world: number,
): number {
  if (direction === 0) return Number.POSITIVE_INFINITY;
  const ahead = direction > 0 ? side : -side;
  const plane = ahead === 1 ? world : ahead === 0 ? half : -half;
  return (direction > 0 ? plane - position : plane + position) / Math.abs(direction);
}

function advance(photon: Float64Array, way: number): void {
  photon[flight.x] += way * photon[flight.u];
  photon[flight.y] += way * photon[flight.v];
  photon[flight.z] += way * photon[flight.w];
}
