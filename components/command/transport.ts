import { availableParallelism } from 'node:os';
import { Command } from 'commander';
import { caseHash } from '../../physics/case/hash.js';
import { nearestKey, type ParsedCase } from '../../physics/case/index.js';
import {
  type CheckReport,
  type CheckRequest,
  type CheckSetup,
  checkReport,
  setUpCheck,
} from '../../physics/check-by-transport/index.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { usualSize } from '../../physics/stack/usual-size.js';
import { version } from '../../physics/version.js';
import { makeTransportThread } from '../workers/make-transport-thread.js';
import { photonRate } from '../workers/photon-rate.js';
import { transportPool } from '../workers/transport-pool.js';
import type { Io } from './io.js';
import { type Format, print } from './print.js';
import { readCase } from './read-case.js';
import { refuse } from './refusal.js';
import { Shortfall } from './shortfall.js';
import { progressText, transportCsv, transportText } from './transport-text.js';
import { wholeNumber } from './whole-number.js';

interface TransportCommandOptions extends Format {
  readonly photons: number;
  readonly seed: number;
  readonly workers: number;
  readonly technique?: string;
  readonly size?: string;
}

/** `transport`: Monte Carlo beside the estimate. */
export const transportCommand = (io: Io): Command =>
  new Command('transport')
    .summary('photon transport beside the estimate')
    .description(
      'Flies photons through the stack of a case, without the detail, and sets what they score beside\n' +
        'the estimate of scatter, backscatter and absorbed energy: standard error, difference and\n' +
        'verdict for each. One seed gives the same bits for any number of workers. Exit code 1 when\n' +
        'the estimate differs by more than its stated accuracy.',
    )
    .argument('<case>', 'a case file, NAME.case.json')
    .option(
      '--photons <number>',
      'photons to fly',
      wholeNumber('--photons', { min: 1000, max: 1e10, remedy: 'enter how many photons to fly' }),
      1e6,
    )
    .option(
      '--seed <number>',
      'seed of the random numbers',
      wholeNumber('--seed', { min: 0, max: 2 ** 32 - 1, remedy: 'enter a seed such as 1' }),
      1,
    )
    .option('--technique <name>', 'a technique of the case (default: the first)')
    .option('--size <name>', 'a patient size (default: the middle of those that weigh most)')
    .option(
      '--workers <number>',
      'threads that share the work',
      wholeNumber('--workers', { min: 1, max: 256, remedy: 'enter how many threads may fly' }),
      Math.max(1, availableParallelism() - 1),
    )
    .action((path: string, _: unknown, command: Command) =>
      runTransport(io, path, command.optsWithGlobals<TransportCommandOptions>()),
    );

const runTransport = async (
  io: Io,
  path: string,
  options: TransportCommandOptions,
): Promise<void> => {
  const parsed = readCase(io, path);
  const setup = setUpCheck(parsed.case, requestOf(parsed, options));
  if (!('input' in setup)) {
    const [{ message }] = setup.findings;
    return refuse(
      path,
      'cannot be flown',
      message,
      'change the case or choose another technique or size',
    );
  }
  const report = await fly(io, setup, options.workers);
  const stamp = { hash: caseHash(parsed.case), title: parsed.case.title };
  print(io, options, {
    json: () => ({ case: stamp, version, ...report }),
    csv: () => transportCsv(report),
    table: () => transportText(report, stamp),
  });
  if (report.rows.some(({ verdict }) => verdict === 'differs')) throw new Shortfall();
};

const requestOf = (
  { case: c }: ParsedCase,
  { photons, seed, technique, size }: TransportCommandOptions,
): CheckRequest => {
  const sizes = sizesOf(c.patient);
  return {
    photons,
    seed,
    technique: named('--technique', technique ?? c.techniques[0].name, c.techniques),
    size: named('--size', size ?? usualSize(sizes).name, sizes),
  };
};

const named = (
  option: string,
  name: string,
  known: readonly { readonly name: string }[],
): string => {
  const names = known.map((entry) => entry.name);
  if (names.includes(name)) return name;
  const near = nearestKey(name, names);
  const remedy = near ? `did you mean ${JSON.stringify(near)}?` : 'choose one of them';
  return refuse(option, JSON.stringify(name), `must be one of ${names.join(', ')}`, remedy);
};

/** Flies the run on worker threads, telling how far it has come where someone looks. */
const fly = async (io: Io, setup: CheckSetup, workers: number): Promise<CheckReport> => {
  const pool = transportPool(makeTransportThread, workers);
  const rate = photonRate(() => performance.now());
  try {
    const scores = await pool.run(setup.input, {
      onProgress: ({ photons, ofPhotons }) => {
        const perSecond = rate(photons);
        io.progress?.(progressText(photons, ofPhotons, perSecond));
      },
    });
    return checkReport(setup, scores, rate(scores.photons));
  } finally {
    pool.end();
    io.progress?.('');
  }
};
