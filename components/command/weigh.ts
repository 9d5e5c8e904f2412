import { Command } from 'commander';
import type { Case } from '../../physics/case/index.js';
import { limitsOf } from '../../physics/findings.js';
import type { Weighing } from '../../physics/results.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { weigh } from '../../physics/weigh.js';
import type { Io } from './io.js';
import { type Format, print } from './print.js';
import { readCase } from './read-case.js';
import { Shortfall } from './shortfall.js';
import { weighCsv } from './weigh-csv.js';
import { weighTables } from './weigh-tables.js';
import { workedCases } from './worked-cases.js';

/** `weigh`: every quantity of every technique at every size, and the comparisons. */
export const weighCommand = (io: Io): Command =>
  new Command('weigh')
    .summary('every technique at every size, and the comparisons')
    .description(
      'Every quantity of every technique of a case at every patient size, and each Proposed ' +
        'technique against Current with one quantity after another held constant. Exit code 1 ' +
        'when something forbids a Proposed technique.',
    )
    .argument('<case>', 'a case file, NAME.case.json')
    .addHelpText('after', workedCases)
    .action((path: string, _: unknown, command: Command) =>
      runWeigh(io, path, command.optsWithGlobals<Format>()),
    );

const runWeigh = (io: Io, path: string, format: Format): void => {
  const parsed = readCase(io, path);
  const weighing = weigh(parsed);
  print(io, format, {
    json: () => weighing,
    csv: () => weighCsv(weighing),
    table: () => weighTables(weighing, parsed.case),
  });
  if (isForbidden(parsed.case, weighing)) throw new Shortfall();
};

/** True when a limit forbids a Proposed technique, or it cannot even be computed, at some size. */
const isForbidden = ({ techniques, patient }: Case, { evaluations }: Weighing): boolean => {
  const sizes = sizesOf(patient);
  return techniques.slice(1).some(({ name }) => {
    const own = evaluations.filter(({ technique }) => technique === name);
    const limits = own.flatMap(({ findings }) => limitsOf(findings));
    return own.length < sizes.length || limits.length > 0;
  });
};
