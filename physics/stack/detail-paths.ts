import type { Detail } from '../case/schema.js';
import { gaussLegendre } from '../numeric/gauss-legendre.js';

/**
 * One straight way of the beam through the detail: how much of the layer gives way, how much of
 * that is the detail's own matter (the rest is its reference), and the area it stands for.
 */
export interface DetailPath {
  readonly displaced_mm: number;
  readonly detail_mm: number;
  /** In the plane of the detail, before magnification. */
  readonly area_mm2: number;
}

export interface DetailPaths {
  /** The longest way, straight through the middle. */
  readonly central: Omit<DetailPath, 'area_mm2'>;
  /** Ways whose areas add up to the detail's. */
  readonly paths: readonly DetailPath[];
}

/** Gauss–Legendre points over the half profile of a vessel. */
const vesselPoints = 8;

/**
 * A cylinder across the beam: chord c(x) = 2√(d²/4 − x²), of which the share `fillingFraction` is
 * agent and the rest reference.
 *
 * With x = (d/2) sin φ the chord is d cos φ and dx = (d/2) cos φ dφ: the square root at the rim is
 * gone, and 8 Gauss–Legendre points in φ over one half give L∫ΔS² dx of one energy to 1e-9 for a
 * thin signal, 1e-6 at five and 1e-4 at twelve mean free paths of difference (tested).
 */
const vesselPaths = (detail: Detail): DetailPaths => {
  const { size_mm, length_mm, fillingFraction } = detail;
  const { nodes, weights } = gaussLegendre(vesselPoints);
  const path = (cosPhi: number): Omit<DetailPath, 'area_mm2'> => ({
    displaced_mm: size_mm * cosPhi,
    detail_mm: size_mm * cosPhi * fillingFraction,
  });
  return {
    central: path(1),
    paths: Array.from(nodes, (node, k) => {
      const cosPhi = Math.cos((node * Math.PI) / 2);
      return {
        ...path(cosPhi),
        area_mm2: length_mm * size_mm * cosPhi * weights[k] * (Math.PI / 2),
      };
    }),
  };
};

/** Everything but a vessel has one thickness all over its area; a width not given is the length. */
const flatPaths = (detail: Detail): DetailPaths => {
  const thickness_mm = detail.size_mm * (detail.shape === 'coat' ? detail.walls : 1);
  const central = { displaced_mm: thickness_mm, detail_mm: thickness_mm };
  const area_mm2 = detail.length_mm * (detail.width_mm ?? detail.length_mm);
  return { central, paths: [{ ...central, area_mm2 }] };
};

/** The ways of the beam through a detail of any shape, lengths in mm. */
export const detailPaths = (detail: Detail): DetailPaths =>
  detail.shape === 'vessel' ? vesselPaths(detail) : flatPaths(detail);

/** Volume of the detail's own matter in mL. */
export const detailVolume_mL = ({ paths }: DetailPaths): number =>
  paths.reduce((sum, path) => sum + path.detail_mm * path.area_mm2, 0) / 1000;
