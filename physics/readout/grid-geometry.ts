import type { Material } from '../../materials/material.js';
import type { MaterialLayer } from '../beam/attenuate.js';
import type { Grid } from '../case/schema.js';

/** A focused linear grid: lead-like strips on edge, interspace between them, covers over both. */
export interface GridGeometry {
  readonly strip_mm: number;
  readonly interspace_mm: number;
  /** Strip height along the beam: ratio × interspace. */
  readonly height_mm: number;
  readonly stripMaterial: Material;
  readonly interspaceMaterial: Material;
  readonly covers: readonly MaterialLayer[];
}

/**
 * The grid of a room as matter. Grid ratio is strip height over interspace width (IEC 60627).
 *
 * @throws Error when the strips leave no interspace (path, value, rule, remedy).
 */
export const gridGeometry = (grid: Grid, materials: (name: string) => Material): GridGeometry => {
  const pitch_mm = 10 / grid.strips_per_cm;
  const strip_mm = grid.strip.thickness_um / 1000;
  const interspace_mm = pitch_mm - strip_mm;
  if (!(interspace_mm > 0)) {
    throw new Error(
      `room.grid.strip.thickness_um: ${grid.strip.thickness_um}: must be less than the pitch of ${pitch_mm * 1000} µm; check strips_per_cm and strip thickness`,
    );
  }
  return {
    strip_mm,
    interspace_mm,
    height_mm: grid.ratio * interspace_mm,
    stripMaterial: materials(grid.strip.material),
    interspaceMaterial: materials(grid.interspace.material),
    covers: grid.cover.map(({ material, thickness_mm }) => ({
      material: materials(material),
      thickness_mm,
    })),
  };
};
