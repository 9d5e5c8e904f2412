import { type Material, massAttenuationOn } from '../../materials/index.js';
import type { DetailPath } from '../stack/detail-paths.js';
import type { PlacedDetail } from '../stack/place-detail.js';

/** What one path through the detail does to the plain stack's primary beam, channel by channel. */
export interface PathColumns {
  /** exp(−(μ_reference − μ_layer)·displaced): the comparison image over the plain stack. */
  readonly reference: Float64Array;
  /** The image with the detail over the plain stack. */
  readonly detail: Float64Array;
  /** Reference minus detail, over the plain stack; from expm1, so thin details lose no digits. */
  readonly difference: Float64Array;
}

const perMm = (material: Material, energies_keV: Float64Array): Float64Array => {
  const scale = material.density_g_per_cm3 / 10;
  return massAttenuationOn(material, energies_keV).map((coefficient) => coefficient * scale);
};

/**
 * A gas in dense matter gives back more mean free paths than a number can hold, at energies where
 * the plain stack passes nothing: infinity times nothing is no number. e³⁰⁰ twice over still is one,
 * and no photon that counts (above 15 keV behind a tube's filter) meets 300 mean free paths in a
 * detail.
 */
const greatestGain = 300;
const bounded = (exponent: number): number => Math.min(exponent, greatestGain);

/** The central path and every path of a detail on an energy grid. */
export const detailColumns = (
  detail: PlacedDetail,
  energies_keV: Float64Array,
): { readonly central: PathColumns; readonly paths: readonly PathColumns[] } => {
  const layer = perMm(detail.layer, energies_keV);
  const reference = perMm(detail.reference, energies_keV);
  const matter = perMm(detail.matter, energies_keV);
  const along = ({ displaced_mm, detail_mm }: Omit<DetailPath, 'area_mm2'>): PathColumns => {
    const inPlace = reference.map((mu, i) => Math.exp(bounded((layer[i] - mu) * displaced_mm)));
    const depth = matter.map((mu, i) => -bounded((reference[i] - mu) * detail_mm));
    return {
      reference: inPlace,
      detail: inPlace.map((share, i) => share * Math.exp(-depth[i])),
      difference: inPlace.map((share, i) => -share * Math.expm1(-depth[i])),
    };
  };
  return { central: along(detail.central), paths: detail.paths.map(along) };
};
