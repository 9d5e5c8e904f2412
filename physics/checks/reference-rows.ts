import type { Provenance } from '../../materials/index.js';
import { packedTables, provenances, sources } from './packed-reference.js';

/** A published value as kept under test/reference, one row of one of its files. */
export interface ReferenceRow {
  /** File name without its ending: `mu_nist`. */
  readonly table: string;
  readonly set: string;
  readonly item: string;
  /** As printed there, trailing zeros included. */
  readonly value: string;
  readonly unit: string;
  readonly conditions: string;
  readonly tolerance: string;
  readonly source: string;
  /** How the value came to be known, in the words of the file. */
  readonly known: string;
}

export type ReferenceTable = keyof typeof packedTables;

/** All rows of one reference table. */
export const referenceRows = (table: ReferenceTable): readonly ReferenceRow[] =>
  packedTables[table].split('\n').map((line) => {
    const [set, item, value, unit, conditions, tolerance, source, known] = line.split('|');
    return {
      table,
      set,
      item,
      value,
      unit,
      conditions,
      tolerance,
      source: sources[Number(source)],
      known: provenances[Number(known)],
    };
  });

/** The file's words as one of the project's kinds of provenance. */
export const provenanceOf = ({ known }: ReferenceRow): Provenance => {
  if (/^recalled|no text at hand/.test(known)) return 'recalled';
  if (/^(derived|computed)/.test(known)) return 'computed';
  return known.startsWith('common practice') ? 'assumed' : 'published';
};

/** The first number in a text such as `E=33.17 keV`, after a mark where one is given. */
export const numberAfter = (text: string, mark = ''): number =>
  Number(new RegExp(`${mark}\\s*(-?[\\d.]+(?:e[+-]?\\d+)?)`).exec(text)?.[1]);
