import { thicknessColumn } from './common-columns.js';
import { readColumns } from './read-columns.js';

const columns = {
  thickness_mm: thicknessColumn,
  weight: {
    kind: 'number',
    names: ['count', 'number', 'frequency'],
    unit: 'number',
    min: 0,
    max: 1e9,
    optional: true,
  },
} as const;

/** A mix of patient sizes; a missing weight is null and counts as 1. */
export const parseSizesCsv = (
  text: string,
  mapping?: Partial<Record<keyof typeof columns, string>>,
) => readColumns(text, columns, mapping);
