import type { Case, Size } from '../case/schema.js';
import { roomPotentials_kV } from '../room-potentials.js';
import { sizesOf } from '../stack/sizes.js';

/** What a sweep runs over. */
export interface SweepAxes {
  readonly potentials_kV: readonly number[];
  /** Names of the room's filters. */
  readonly filters: readonly string[];
  readonly sizes: readonly Size[];
}

/** The whole room: every potential, every filter, every size of the mix. */
export const roomAxes = (c: Case): SweepAxes => ({
  potentials_kV: roomPotentials_kV(c),
  filters: c.room.filters.map(({ name }) => name),
  sizes: sizesOf(c.patient),
});
