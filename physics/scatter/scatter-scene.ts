import type { EnergyNodes } from './energy-nodes.js';
import type { ScatterGeometry } from './geometry.js';
import type { ScatterGrid, ScoreTable } from './scores.js';
import type { Slab } from './slabs.js';

/** A stack in its geometry, on the energies it is solved for. */
export interface ScatterScene {
  readonly slabs: readonly Slab[];
  readonly geometry: ScatterGeometry;
  readonly nodes: EnergyNodes;
  readonly table: ScoreTable;
  readonly grid: ScatterGrid | null;
}
