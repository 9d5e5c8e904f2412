import type { ScatterDetector } from '../scatter/index.js';
import type { Stack } from '../stack/stack.js';
import { materialOf } from './material-of.js';

/** A phantom of one slab in a parallel beam and vacuum; distances can be set otherwise. */
export const slabStack = (
  name: string,
  thickness_mm: number,
  field_mm: number,
  more: Partial<Stack> = {},
): Stack => ({
  sizeName: '',
  thickness_mm,
  layers: [{ name, material: materialOf(name), thickness_mm }],
  supportEntrance: [],
  supportExit: [],
  beam: 'parallel',
  sourceToDetector_mm: 1000 + thickness_mm,
  sourceToSkin_mm: 1000,
  exitToDetector_mm: 0,
  field_mm: [field_mm, field_mm],
  air: false,
  ...more,
});

/** Absorbs every photon whole; `nodes_keV` are energies at which answers are wanted. */
export const idealDetector = (nodes_keV: readonly number[] = []): ScatterDetector => ({
  efficiency: () => 1,
  energyFraction: () => 1,
  energySquareFraction: () => 1,
  edges_keV: nodes_keV,
});
