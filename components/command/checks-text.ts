import type { CheckKind, CheckRow, Verdict } from '../../physics/checks/index.js';
import { shown } from './numbers.js';
import { plainTableText } from './plain-table.js';

/** Checks for people: a table for each source, the counts, and what fell short. */
export const checksText = (rows: readonly CheckRow[], summaryOnly: boolean): string => {
  const short = rows.filter(({ verdict }) => verdict === 'short');
  const bySource = grouped(rows, ({ source, provenance }) => `${source} (${provenance})`);
  return [
    ...(summaryOnly ? [] : [...bySource].map(([source, group]) => rowTable(source, group))),
    ...kinds.map((kind) => countTable(rows, kind)),
    provenanceTable(rows),
    short.length > 0 ? rowTable('Fallen short', short) : 'No check fell short.\n',
  ].join('\n');
};

const kinds = ['computed', 'data carried'] as const satisfies readonly CheckKind[];

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

const verdicts = ['met', 'short', 'unconfirmed source'] as const satisfies readonly Verdict[];

/** How many of some rows have each verdict. */
const counts = (rows: readonly CheckRow[]): string[] =>
  verdicts.map((verdict) => String(rows.filter((row) => row.verdict === verdict).length));

const kindTitles: Readonly<Record<CheckKind, string>> = {
  computed: 'values computed',
  'data carried': 'values of data carried: that they were entered right, nothing more',
};

const countTable = (all: readonly CheckRow[], kind: CheckKind): string => {
  const rows = all.filter((row) => row.kind === kind);
  const groups = grouped(rows, ({ id }) => id.split(',')[0]);
  return plainTableText({
    title: `${rows.length} ${kindTitles[kind]}`,
    headings: ['checks', ...verdicts],
    rows: [...groups, ['all', rows] as const].map(([name, group]) => [name, ...counts(group)]),
  });
};

const provenanceWords: readonly (readonly [CheckRow['provenance'], string])[] = [
  ['published', 'published, text or abstract read'],
  ['recalled', 'published, recalled without the text'],
  ['computed', 'computed separately, not published'],
  ['assumed', 'common practice, no source'],
];

const provenanceTable = (rows: readonly CheckRow[]): string =>
  plainTableText({
    title: 'By how the expected value came to be known',
    headings: ['expected value', 'kind', ...verdicts],
    rows: provenanceWords.flatMap(([provenance, words]) =>
      kinds.flatMap((kind) => {
        const group = rows.filter((row) => row.provenance === provenance && row.kind === kind);
        return group.length === 0 ? [] : [[words, kind, ...counts(group)]];
      }),
    ),
    wordColumns: 2,
  });
