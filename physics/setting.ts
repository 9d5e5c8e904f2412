import type { Technique } from './case/schema.js';

/** What the room is told to do with the beam: the part of a technique a sweep varies. */
export interface Setting {
  readonly potential_kV: number;
  /** Name of one of the room's filters. */
  readonly filter: string;
  readonly grid: 'in' | 'out';
}

/** The setting a technique is written with (a control curve may lead elsewhere at some sizes). */
export const settingOf = (technique: Technique): Setting => ({
  potential_kV: technique.potential_kV,
  filter: technique.filter,
  grid: technique.grid,
});

/** `70 kV, 0.2 Cu` for sentences and tables. */
export const settingLabel = (setting: Pick<Setting, 'potential_kV' | 'filter'>): string =>
  `${setting.potential_kV} kV, ${setting.filter === 'none' ? 'no filter' : setting.filter}`;
