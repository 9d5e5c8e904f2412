import { kept } from '../../materials/kept.js';
import type { Material } from '../../materials/material.js';
import type { Grid } from '../case/schema.js';
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

const known = new WeakMap<Grid, RoomGrid>();

/**
 * The grid a case describes, tabulated once per grid object.
 *
 * @throws Error when strips leave no interspace or a material is unknown.
 */
export const roomGrid = (grid: Grid, materials: (name: string) => Material): RoomGrid =>
  kept(known, grid, () => ({
    table: gridTable(gridGeometry(grid, materials)),
    measured: grid.measured,
  }));
