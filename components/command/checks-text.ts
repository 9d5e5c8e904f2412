import type { CheckRow } from '../../physics/checks/index.js';
import { shown } from './numbers.js';
import { plainTableText } from './plain-table.js';

/** Checks for people: a table for each source, then what fell short and the count. */
export const checksText = (rows: readonly CheckRow[], summaryOnly: boolean): string => {
  const short = rows.filter(({ verdict }) => verdict === 'short');
  const bySource = grouped(rows, ({ source, provenance }) => `${source} (${provenance})`);
  return [
    ...(summaryOnly ? [] : [...bySource].map(([source, group]) => rowTable(source, group))),
    summaryTable(rows),
    short.length > 0 ? rowTable('Fallen short', short) : 'No check fell short.\n',
  ].join('\n');
};

const grouped = (
  rows: readonly CheckRow[],
  nameOf: (row: CheckRow) => string,
): ReadonlyMap<string, readonly CheckRow[]> => {
  const groups = new Map<string, CheckRow[]>();
  for (const row of rows) {
    const group = groups.get(nameOf(row));
    if (group) group.push(row);
    else groups.set(nameOf(row), [row]);
  }
  return groups;
};

const longestId = 90;

const rowTable = (title: string, rows: readonly CheckRow[]): string => {
  const notes = new Set(rows.flatMap(({ note }) => note ?? []));
  const table = plainTableText({
    title,
    headings: ['check', 'verdict', 'unit', 'expected', 'computed', 'tolerance'],
    rows: rows.map((row) => [
      row.id.length > longestId ? `${row.id.slice(0, longestId - 1)}…` : row.id,
      row.verdict,
      row.unit,
      shown(row.expected),
      shown(row.computed),
      toleranceText(row),
    ]),
    wordColumns: 3,
  });
  return [table, ...[...notes].map((note) => `note: ${note}\n`)].join('');
};

const toleranceText = ({ tolerance, toleranceIs }: CheckRow): string =>
  toleranceIs === 'relative' ? `${shown(100 * tolerance, 2)} %` : shown(tolerance, 2);

const summaryTable = (rows: readonly CheckRow[]): string => {
  const count = (group: readonly CheckRow[], verdict: CheckRow['verdict']): string =>
    String(group.filter((row) => row.verdict === verdict).length);
  const groups = grouped(rows, ({ id }) => id.split(',')[0]);
  return plainTableText({
    title: `${rows.length} checks`,
    headings: ['checks', 'met', 'short', 'unconfirmed source'],
    rows: [...groups, ['all', rows] as const].map(([name, group]) => [
      name,
      count(group, 'met'),
      count(group, 'short'),
      count(group, 'unconfirmed source'),
    ]),
  });
};
