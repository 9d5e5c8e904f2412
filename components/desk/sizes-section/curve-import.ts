import type { Case } from '../../../physics/case/schema.js';
import { parseControlCurveCsv } from '../../../physics/csv/index.js';
import { type Json, withValueAt } from '../../store/path.js';
import { requestEdit } from '../fields/case-edit.js';
import { reportFaults } from '../fields/report-faults.js';
import { rowFaults, unitFaults } from './table-import.js';

/** Columns of a control curve, as headings it may have. */
export const curveColumns =
  'thickness (mm), potential (kV), tube current (mA), exposure time (ms), filter';

/**
 * Gives a technique the control curve of a CSV table, its rows written into the case. Rows that
 * cannot be read, repeat a thickness or name a filter the room has not are listed with their line.
 *
 * @returns what was done, in words.
 */
export async function readCurve(
  file: File,
  from: HTMLElement,
  c: Case,
  technique: number,
): Promise<string> {
  const { rows, lines, badRows, assumedUnits } = parseControlCurveCsv(await file.text());
  const filters = c.room.filters.map(({ name }) => name);
  const reasonAgainst = (i: number): string | null => {
    const { filter, thickness_mm } = rows[i];
    if (!filters.includes(filter)) return `filter ${filter} is none of ${filters.join(', ')}`;
    const isFirst = rows.findIndex((row) => row.thickness_mm === thickness_mm) === i;
    return isFirst ? null : `thickness ${thickness_mm} mm stands on an earlier line`;
  };
  const judged = rows.map((row, i) => ({ row, line: lines[i], reason: reasonAgainst(i) }));
  const kept = judged.filter(({ reason }) => reason === null).map(({ row }) => row);
  const refused = judged.flatMap(({ line, reason }) => (reason === null ? [] : [{ line, reason }]));
  const faults = [
    ...rowFaults(
      file.name,
      [...badRows, ...refused].sort((a, b) => a.line - b.line),
    ),
    ...unitFaults(file.name, assumedUnits),
  ];
  if (faults.length > 0) reportFaults(from, `${file.name}: ${kept.length} rows read`, faults);
  if (kept.length === 0) return `${file.name}: no row could be read`;
  const ascending = [...kept].sort((a, b) => a.thickness_mm - b.thickness_mm);
  const control: Json = { curve: file.name, rows: ascending.map((row): Json => ({ ...row })) };
  requestEdit(from, {
    change: (document) => withValueAt(document, `techniques[${technique}].control`, control),
  });
  return `${c.techniques[technique].name} follows ${file.name}, ${kept.length} rows`;
}
