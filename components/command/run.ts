import { CommanderError } from 'commander';
import { cautions } from '../../physics/cautions.js';
import { type ExitCode, exitCode } from './exit-code.js';
import type { Io } from './io.js';
import { program } from './program.js';
import { faultsText, Refusal } from './refusal.js';
import { Shortfall } from './shortfall.js';
import { usageFault } from './usage-fault.js';

/**
 * Runs one command line and says how it went. The answer goes to standard output, faults to
 * standard error; bad input leaves standard output empty.
 *
 * @param words the command line without the program's own name.
 */
export const run = async (words: readonly string[], io: Io): Promise<ExitCode> => {
  const root = program(io);
  const asJson = words.includes('--json');
  try {
    if (words.length === 0) {
      io.err(`${root.helpInformation()}\n${cautions.join('\n')}\n`);
      return exitCode.badInput;
    }
    await root.parseAsync([...words], { from: 'user' });
    return exitCode.done;
  } catch (error) {
    if (error instanceof Shortfall) return exitCode.fellShort;
    if (error instanceof Refusal) {
      io.err(faultsText(error.faults, asJson));
      return exitCode.badInput;
    }
    if (error instanceof CommanderError) {
      if (error.exitCode === 0) return exitCode.done;
      const commands = root.commands.map((command) => command.name());
      io.err(faultsText([usageFault(error, commands)], asJson));
      return exitCode.badInput;
    }
    throw error;
  }
};
