import { potentialColumn } from './common-columns.js';
import { readColumns } from './read-columns.js';

/** Columns of a table of readings; a row must hold a half-value layer, an output or both. */
const columns = {
  potential_kV: potentialColumn,
  filter: { kind: 'text', names: ['added filter'], optional: true },
  halfValueLayer_mmAl: {
    kind: 'number',
    names: ['half value layer', 'hvl', 'hvl1', 'first hvl'],
    unit: 'mmAl',
    min: 0.01,
    max: 50,
    optional: true,
  },
  airKerma_uGy_per_mAs: {
    kind: 'number',
    names: ['air kerma', 'kerma', 'output', 'tube output'],
    unit: 'uGy/mAs',
    min: 1e-6,
    max: 1e5,
    optional: true,
  },
  distance_mm: {
    kind: 'number',
    names: ['distance', 'focus distance', 'source distance'],
    unit: 'mm',
    min: 100,
    max: 10_000,
    optional: true,
  },
  relativeUncertainty_percent: {
    kind: 'number',
    names: ['relative uncertainty', 'uncertainty'],
    unit: 'percent',
    min: 1e-3,
    max: 100,
    optional: true,
  },
} as const;

/**
 * Readings of a room from a table: half-value layer and output by potential and filter, as
 * `room.readings` of a case. Cells left out take the case's defaults (null here).
 *
 * @param mapping for files with headings of their own: key → heading as it stands in the file
 * @example parseReadingsCsv('kVp,HVL (mm Al),output (mGy/mAs)\n80,2.95,0.062').rows[0]
 */
export function parseReadingsCsv(
  text: string,
  mapping?: Partial<Record<keyof typeof columns, string>>,
) {
  const table = readColumns(text, columns, mapping);
  const measured = table.rows.map(
    (row) => row.halfValueLayer_mmAl !== null || row.airKerma_uGy_per_mAs !== null,
  );
  const empty = table.lines
    .filter((_, i) => !measured[i])
    .map((line) => ({
      line,
      reason: 'neither halfValueLayer_mmAl nor airKerma_uGy_per_mAs is given',
    }));
  return {
    ...table,
    rows: table.rows.filter((_, i) => measured[i]),
    lines: table.lines.filter((_, i) => measured[i]),
    badRows: [...table.badRows, ...empty].sort((a, b) => a.line - b.line),
  };
}
