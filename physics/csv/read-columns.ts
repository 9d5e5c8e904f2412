import { parseDecimal } from './decimal.js';
import { matchHeading, plainName } from './heading.js';
import { type CsvRecord, csvRecords } from './records.js';
import { unitsFor } from './units.js';

/** A column of numbers: the headings it goes by and the unit it is kept in. */
export interface NumberColumn {
  readonly kind: 'number';
  readonly names: readonly string[];
  readonly unit: string;
  readonly min?: number;
  readonly max?: number;
  /** An optional column or cell may be missing and is then null. */
  readonly optional?: boolean;
}

/** A column of words. */
export interface TextColumn {
  readonly kind: 'text';
  readonly names: readonly string[];
  readonly optional?: boolean;
}

export type Columns = Readonly<Record<string, NumberColumn | TextColumn>>;

type Cell<C extends NumberColumn | TextColumn> =
  | (C['kind'] extends 'text' ? string : number)
  | (C extends { readonly optional: true } ? null : never);

/** A line that could not be read, and why. */
export interface BadRow {
  readonly line: number;
  readonly reason: string;
}

/** A table read: every line of the file is in `rows` or in `badRows`. */
export interface CsvTable<C extends Columns> {
  readonly rows: readonly { readonly [K in keyof C]: Cell<C[K]> }[];
  /** Line in the file of each row. */
  readonly lines: readonly number[];
  readonly badRows: readonly BadRow[];
  /** Columns whose heading named no unit and were taken to be in the unit they are kept in. */
  readonly assumedUnits: readonly string[];
  /** Headings that were not used. */
  readonly unusedHeadings: readonly string[];
}

/**
 * Reads a table with a heading row: `#` comments, cells separated by tab, semicolon or comma, a
 * decimal point or (with tab or semicolon) a decimal comma, units converted from the headings.
 *
 * @param columns what to read, by the key it is returned under
 * @param mapping for files with headings of their own: key → heading as it stands in the file
 */
export function readColumns<C extends Columns>(
  text: string,
  columns: C,
  mapping: Partial<Record<keyof C & string, string>> = {},
): CsvTable<C> {
  const { separator, records } = csvRecords(text);
  const [heading, ...body] = records;
  if (!heading)
    return emptyTable([{ line: 1, reason: 'the table is empty; a heading row must come first' }]);

  const found = findColumns(heading, columns, mapping);
  const faults = missingColumns(columns, found, heading);
  if (faults.length > 0) return emptyTable(faults);

  const rows: Record<string, number | string | null>[] = [];
  const lines: number[] = [];
  const badRows: BadRow[] = [];
  for (const record of body) {
    const row = readRecord(record, columns, found, heading.cells.length, separator);
    if (typeof row === 'string') badRows.push({ line: record.line, reason: row });
    else {
      rows.push(row);
      lines.push(record.line);
    }
  }
  const used = new Set([...found.values()].map(({ index }) => index));
  return {
    rows: rows as unknown as CsvTable<C>['rows'],
    lines,
    badRows,
    assumedUnits: [...found].filter(([, { unitNamed }]) => !unitNamed).map(([key]) => key),
    unusedHeadings: heading.cells.filter((_, i) => !used.has(i)),
  };
}

interface FoundColumn {
  readonly index: number;
  readonly factor: number;
  readonly unitNamed: boolean;
}

const emptyTable = (badRows: readonly BadRow[]) => ({
  rows: [],
  lines: [],
  badRows,
  assumedUnits: [],
  unusedHeadings: [],
});

function findColumns(
  heading: CsvRecord,
  columns: Columns,
  mapping: Partial<Record<string, string>>,
): Map<string, FoundColumn> {
  const found = new Map<string, FoundColumn>();
  for (const [key, column] of Object.entries(columns)) {
    const unit = column.kind === 'number' ? column.unit : null;
    const names = new Set([key, ...column.names].map(plainName));
    const mapped = mapping[key];
    heading.cells.forEach((cell, index) => {
      if (found.has(key) || (mapped !== undefined && cell !== mapped)) return;
      const isName = mapped === undefined ? (name: string) => names.has(name) : () => true;
      const match = matchHeading(cell, isName, unit);
      if (match) found.set(key, { index, ...match });
    });
  }
  return found;
}

function missingColumns(
  columns: Columns,
  found: ReadonlyMap<string, FoundColumn>,
  heading: CsvRecord,
): BadRow[] {
  return Object.entries(columns)
    .filter(([key, column]) => !column.optional && !found.has(key))
    .map(([key, column]) => ({
      line: heading.line,
      reason: `no column for ${key} among ${heading.cells.join(', ')}; name one ${column.names[0]}${
        column.kind === 'number' && column.unit !== 'number'
          ? `, in ${unitsFor(column.unit).join(' or ')},`
          : ''
      } or map a heading to it`,
    }));
}

/** The values of one record, or the reason why it cannot be read. */
function readRecord(
  record: CsvRecord,
  columns: Columns,
  found: ReadonlyMap<string, FoundColumn>,
  width: number,
  separator: string,
): Record<string, number | string | null> | string {
  if (record.cells.length !== width) {
    return `${record.cells.length} cells where the heading has ${width}`;
  }
  const row: Record<string, number | string | null> = {};
  for (const [key, column] of Object.entries(columns)) {
    const place = found.get(key);
    const cell = place ? record.cells[place.index] : '';
    if (!place || cell === '') {
      if (!column.optional) return `${key} is empty`;
      row[key] = null;
    } else if (column.kind === 'text') {
      row[key] = cell;
    } else {
      const value = parseDecimal(cell, separator);
      if (value === null) return `${key}: ${cell}: is not a number`;
      // Fifteen digits: 0.295 cm is 2.95 mm, not 2.9499999999999997 mm.
      const converted = Number((value * place.factor).toPrecision(15));
      if (!Number.isFinite(converted)) return `${key}: ${cell}: is too large`;
      const { min = Number.NEGATIVE_INFINITY, max = Number.POSITIVE_INFINITY } = column;
      if (!(converted >= min && converted <= max)) {
        return `${key}: ${cell}: must be ${min} to ${max} ${column.unit}`;
      }
      row[key] = converted;
    }
  }
  return row;
}
