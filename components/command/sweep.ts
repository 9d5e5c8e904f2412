import { Command } from 'commander';
import type { Case } from '../../physics/case/index.js';
import { caseHash } from '../../physics/case/index.js';
import { holdConstants } from '../../physics/compare.js';
import type { HoldConstant } from '../../physics/results.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { roomAxes } from '../../physics/sweep/axes.js';
import { type CostName, costNames } from '../../physics/sweep/costs.js';
import { type SweepRequest, sweep, usualCosts } from '../../physics/sweep.js';
import { version } from '../../physics/version.js';
import { sweepCsv } from '../charts/sweep-csv.js';
import type { Io } from './io.js';
import { namedAmong } from './named-among.js';
import { potentialsIn } from './potentials.js';
import { type Format, print } from './print.js';
import { readCase } from './read-case.js';
import { sweepTables } from './sweep-tables.js';

interface SweepOptions extends Format {
  readonly potential?: readonly number[];
  readonly filters: string;
  readonly sizes: string;
  readonly hold: string;
  readonly costs: string;
}

/** `sweep`: every setting of the room at every size, and what no setting beats. */
export const sweepCommand = (io: Io): Command =>
  new Command('sweep')
    .summary('every setting of the room at every size, and the frontier')
    .description(
      "Current's grid and acquisition with every potential and filter of the room at every\n" +
        'patient size, one quantity held equal to what Current delivers: the best settings, the\n' +
        'settings that no other beats, and what forbids the rest.',
    )
    .argument('<case>', 'a case file, NAME.case.json')
    .option('--potential <kV>', 'from:to:step, or kV with commas; all of the room', potentialsIn)
    .option('--filters <names>', "the room's filters by name, with commas", 'all')
    .option('--sizes <names>', 'sizes of the mix by name, with commas', 'all')
    .option('--hold <quantity>', `held constant: ${holdConstants.join(', ')}`, 'sdnr')
    .option('--costs <names>', `of the frontier: ${costNames.join(', ')}`, usualCosts.join(','))
    .action((path: string, _: unknown, command: Command) =>
      runSweep(io, path, command.optsWithGlobals<SweepOptions>()),
    );

const runSweep = (io: Io, path: string, options: SweepOptions): void => {
  const { case: c, assumed } = readCase(io, path);
  const request = requestOf(c, options);
  const swept = sweep(c, request);
  print(io, options, {
    json: () => ({ case: { hash: caseHash(c), title: c.title }, version, assumed, ...swept }),
    csv: () => sweepCsv(swept.settings, swept.holdConstant, swept.investigationalAgent),
    table: () => sweepTables(c, swept),
  });
};

const requestOf = (c: Case, options: SweepOptions): SweepRequest => {
  const room = roomAxes(c);
  const sizes = sizesOf(c.patient);
  const sizeNames = namedAmong(
    '--sizes',
    options.sizes,
    sizes.map(({ name }) => name),
  );
  const [holdConstant] = namedAmong('--hold', options.hold, holdConstants, 1);
  return {
    axes: {
      potentials_kV: options.potential ?? room.potentials_kV,
      filters: namedAmong('--filters', options.filters, room.filters),
      sizes: sizes.filter(({ name }) => sizeNames.includes(name)),
    },
    holdConstant: holdConstant as HoldConstant,
    costs: namedAmong('--costs', options.costs, costNames) as CostName[],
  };
};
