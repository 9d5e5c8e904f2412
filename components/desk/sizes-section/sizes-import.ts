import { parseSizesCsv } from '../../../physics/csv/index.js';
import { binSizes } from '../../../physics/sizes.js';
import { type Json, withValueAt } from '../../store/path.js';
import { requestEdit } from '../fields/case-edit.js';
import { reportFaults } from '../fields/report-faults.js';
import { rowFaults, unitFaults } from './table-import.js';

/** Columns of a size table, as headings it may have. */
export const sizeColumns = 'thickness (mm), weight or count (optional)';

/**
 * Replaces the size mix by that of a CSV table: a list of patients, a histogram, or sizes with
 * weights. Many thicknesses become bins; rows that cannot be read are listed with their line.
 *
 * @returns what was done, in words.
 */
export async function readSizes(file: File, from: HTMLElement): Promise<string> {
  const { rows, badRows, assumedUnits } = parseSizesCsv(await file.text());
  const { sizes, width_mm } = binSizes(
    rows.map(({ thickness_mm, weight }) => ({ thickness_mm, weight: weight ?? 1 })),
  );
  const faults = [
    ...rowFaults(file.name, badRows),
    ...unitFaults(
      file.name,
      assumedUnits.filter((column) => column !== 'weight'),
    ),
  ];
  if (faults.length > 0) reportFaults(from, `${file.name}: ${rows.length} rows read`, faults);
  if (sizes.length === 0) return `${file.name}: no size could be read`;
  const mix = sizes.map((size): Json => ({ ...size }));
  requestEdit(from, { change: (document) => withValueAt(document, 'patient.sizes', mix) });
  const binned = width_mm === null ? '' : ` in bins of ${width_mm} mm`;
  return `${file.name}: ${rows.length} rows, ${sizes.length} sizes${binned}`;
}
