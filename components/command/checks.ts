import { Command } from 'commander';
import { type CheckRow, publishedChecks } from '../../physics/checks/index.js';
import { csvText } from '../../physics/csv/csv-text.js';
import { checksText } from './checks-text.js';
import type { Io } from './io.js';
import { type Format, print } from './print.js';
import { Shortfall } from './shortfall.js';

interface ChecksOptions extends Format {
  readonly summary: boolean;
}

/** `checks`: every published value beside what Stratabeam computes. */
export const checksCommand = (io: Io): Command =>
  new Command('checks')
    .summary('every published check beside what Stratabeam computes')
    .description(
      'Every published (or, where said, separately computed) value beside what Stratabeam ' +
        'computes, with tolerance, source and provenance. A physics value quoted from memory is met ' +
        'or short and marked recalled; a legal limit quoted from memory is an unconfirmed source, ' +
        'never met. Compositions and legal limits are data carried, counted apart. Exit code 1 when ' +
        'a check falls short.',
    )
    .option('--summary', 'only the count and what fell short', false)
    .action((_: unknown, command: Command) =>
      runChecks(io, command.optsWithGlobals<ChecksOptions>()),
    );

const runChecks = (io: Io, options: ChecksOptions): void => {
  const rows = publishedChecks();
  print(io, options, {
    json: () => ({ rows }),
    csv: () => checksCsv(rows),
    table: () => checksText(rows, options.summary),
  });
  if (rows.some(({ verdict }) => verdict === 'short')) throw new Shortfall();
};

const columns = [
  'id',
  'kind',
  'expected',
  'computed',
  'unit',
  'tolerance',
  'toleranceIs',
  'verdict',
  'source',
  'provenance',
  'note',
] as const satisfies readonly (keyof CheckRow)[];

const checksCsv = (rows: readonly CheckRow[]): string =>
  csvText(
    columns,
    rows.map((row) => columns.map((column) => row[column] ?? null)),
  );
