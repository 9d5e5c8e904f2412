import { findRoot } from '../numeric/find-root.js';
import { attenuate, type MaterialLayer } from './attenuate.js';
import { halfValueLayer_mm } from './half-value-layer.js';
import { referenceMaterial } from './reference-materials.js';
import type { Spectrum } from './spectrum.js';

const thickest_mm = 200;

/**
 * Aluminium-equivalent filtration: the thickness of aluminium that gives the unfiltered beam the same
 * first half-value layer as `layers` do (the IEC 60522 notion of quality-equivalent filtration).
 *
 * @param unfiltered the beam before the layers
 * @returns mm Al, 0 to 200; null when no aluminium does it (an empty beam, a K-edge filter that
 *   softens the beam)
 */
export function aluminiumEquivalent_mm(
  unfiltered: Spectrum,
  layers: readonly MaterialLayer[],
): number | null {
  const target = halfValueLayer_mm(attenuate(unfiltered, layers), referenceMaterial('aluminium'));
  return target === null ? null : aluminiumForHalfValueLayer_mm(unfiltered, target);
}

/** Thickness of aluminium in mm that brings a beam to the given first half-value layer; null if none. */
export function aluminiumForHalfValueLayer_mm(
  beam: Spectrum,
  halfValueLayer_mmAl: number,
): number | null {
  const aluminium = referenceMaterial('aluminium');
  const excess = (thickness_mm: number) => {
    const filtered = attenuate(beam, [{ material: aluminium, thickness_mm }]);
    const reached = halfValueLayer_mm(filtered, aluminium);
    return reached === null ? Number.NaN : reached - halfValueLayer_mmAl;
  };
  return findRoot(excess, 0, thickest_mm);
}
