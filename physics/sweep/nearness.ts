/** Where a setting stands in the room: its potential, and its filter's place in the room's list. */
export interface Place {
  readonly potential_kV: number;
  readonly filterPlace: number;
}

/** Changing to the next filter in the room's list counts as much as this much potential. */
const filterStep_kV = 5;

/** How far apart two settings of a room are, in kV. */
export const distance_kV = (a: Place, b: Place): number =>
  Math.abs(a.potential_kV - b.potential_kV) +
  filterStep_kV * Math.abs(a.filterPlace - b.filterPlace);
