import type { Material } from '../../materials/material.js';
import type { Grid } from '../case/schema.js';
import { KeptBy } from '../numeric/kept-by.js';
import { gridGeometry } from './grid-geometry.js';
import { type GridTable, gridTable } from './grid-table.js';

/** The grid of a room: modelled, and what the user measured of it, which then takes precedence. */
export interface RoomGrid {
  readonly table: GridTable;
  /** Energy-independent transmissions the user measured; null where the model holds. */
  readonly measured: {
    readonly primaryTransmission: number;
    readonly scatterTransmission: number;
  } | null;
}

const known = new KeptBy<RoomGrid>();

/**
 * The grid a case describes, tabulated once per grid object and the materials its names stand for.
 *
 * @throws Error when strips leave no interspace or a material is unknown; a parsed case has neither.
 */
export const roomGrid = (grid: Grid, materials: (name: string) => Material): RoomGrid => {
  const geometry = gridGeometry(grid, materials);
  const { stripMaterial, interspaceMaterial, covers } = geometry;
  const made = [stripMaterial, interspaceMaterial, ...covers.map(({ material }) => material)];
  return known.get([grid, ...made], () => ({
    table: gridTable(geometry),
    measured: grid.measured,
  }));
};
