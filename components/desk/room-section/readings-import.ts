import { html, type TemplateResult } from 'lit';
import { parseReadingsCsv } from '../../../physics/csv/index.js';
import { addItems } from '../../store/list-changes.js';
import type { Json } from '../../store/path.js';
import { requestEdit } from '../fields/case-edit.js';
import { reportFaults } from '../fields/report-faults.js';

/** Columns of a reading, as headings a table may have. */
const columns =
  'potential (kV), filter, half-value layer (mm Al), air kerma (µGy/mAs), distance (mm)';

/** Without the keys a table left out, which then take the case's defaults. */
const given = (row: Readonly<Record<string, number | string | null>>): Json =>
  Object.fromEntries(Object.entries(row).filter(([, value]) => value !== null));

/** Adds the readings of a CSV file; every row that cannot be read is listed with its line. */
async function read(input: HTMLInputElement): Promise<void> {
  const file = input.files?.[0];
  if (!file) return;
  const { rows, badRows, assumedUnits } = parseReadingsCsv(await file.text());
  input.value = '';
  if (rows.length > 0) requestEdit(input, { change: addItems('room.readings', rows.map(given)) });
  const faults = [
    ...badRows.map(({ line, reason }) => ({
      path: `${file.name}, line ${line}`,
      value: 'not read',
      rule: reason,
      remedy: 'correct the line and read the file again',
    })),
    ...assumedUnits.map((column) => ({
      path: file.name,
      value: column,
      rule: 'must name its unit in the heading; it was taken as written here',
      remedy: `write the heading as in ${columns}`,
    })),
  ];
  if (faults.length > 0)
    reportFaults(input, `${file.name}: ${rows.length} readings added, the rest not`, faults);
}

/** A way to add readings from a table, with what its headings may be. */
export const readingsImport = (): TemplateResult =>
  html`<label class="file"><span>add readings from a CSV file</span>
    <input type="file" accept=".csv,text/csv" title=${columns} @change=${(event: Event) => read(event.target as HTMLInputElement)} /></label>`;
