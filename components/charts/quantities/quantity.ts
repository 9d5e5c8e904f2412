import type { Evaluation } from '../../../physics/results.js';

/** Stations along the beam, in their order. */
export const quantityGroups = [
  'beam',
  'exposure',
  'dose',
  'detail',
  'scatter and grid',
  'detector',
  'merit',
] as const;
export type QuantityGroup = (typeof quantityGroups)[number];

/** What is said of one number: its name, unit, what it is per, its computation, and its place. */
export interface Quantity {
  readonly id: string;
  readonly name: string;
  readonly unit: string;
  /** Where it acts along the beam; tables set groups apart. */
  readonly group: QuantityGroup;
  /** Per frame or per run where that must be said, else empty. */
  readonly per: '' | 'per frame' | 'per run' | 'per minute';
  /** The computation in words, for someone who wants to check it. */
  readonly words: string;
  readonly of: (evaluation: Evaluation) => number | null;
}

type Entry = Omit<Quantity, 'group' | 'per'> & Partial<Pick<Quantity, 'per'>>;

/** Quantities of one group; `per` may be left out where nothing must be said. */
export const inGroup = (group: QuantityGroup, entries: readonly Entry[]): readonly Quantity[] =>
  entries.map((entry) => ({ per: '', ...entry, group }));
