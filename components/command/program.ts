import { Command } from 'commander';
import { cautions } from '../../physics/cautions.js';
import { version } from '../../physics/version.js';
import { beamCommand } from './beam.js';
import { checksCommand } from './checks.js';
import type { Io } from './io.js';
import { matterCommand } from './matter.js';
import { sweepCommand } from './sweep.js';
import { transportCommand } from './transport.js';
import { weighCommand } from './weigh.js';

/** The whole command line, writing through `io`. */
export const program = (io: Io): Command => {
  const root = new Command('stratabeam')
    .description('Weighs imaging protocols, Current against Proposed, for one room and one task.')
    .version(version, '--version', 'print the version')
    .helpOption('-h, --help', 'print this help')
    .helpCommand(false)
    .addHelpText('after', `\n${cautions.join('\n')}`);
  for (const command of [
    weighCommand(io),
    sweepCommand(io),
    transportCommand(io),
    beamCommand(io),
    matterCommand(io),
    checksCommand(io),
  ]) {
    root.addCommand(withAnswerForms(command));
  }
  return forAll(root, (command) =>
    command.exitOverride().configureOutput({
      writeOut: io.out,
      writeErr: () => undefined,
      outputError: () => undefined,
    }),
  );
};

/** Options every command shares, and the cautions under its help. */
const withAnswerForms = (command: Command): Command =>
  command
    .option('--json', 'answer for programs, at full precision')
    .option('--csv', 'answer as a CSV table')
    .addHelpText('after', `\n${cautions.join('\n')}`);

const forAll = (command: Command, change: (command: Command) => void): Command => {
  change(command);
  for (const inner of command.commands) forAll(inner, change);
  return command;
};
