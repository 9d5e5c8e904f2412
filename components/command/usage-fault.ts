import type { CommanderError } from 'commander';
import type { Fault } from '../../physics/case/index.js';

/** What commander found wrong with the words of the command line, in our grammar. */
export const usageFault = (error: CommanderError, commands: readonly string[]): Fault => {
  const named = /'([^']*)'/.exec(error.message)?.[1] ?? '';
  switch (error.code) {
    case 'commander.unknownCommand':
      return fault(
        'command',
        JSON.stringify(named),
        `must be one of ${commands.join(', ')}`,
        helpHint,
      );
    case 'commander.unknownOption':
      return fault(named, 'given', 'is not an option of this command', helpHint);
    case 'commander.missingArgument':
      return fault(named.toUpperCase(), 'missing', 'must be given', helpHint);
    case 'commander.optionMissingArgument':
    case 'commander.missingMandatoryOptionValue': {
      const option = named.split(' ')[0];
      return fault(option, 'missing', 'must be given with a value', `write ${named}`);
    }
    case 'commander.excessArguments':
      return fault(
        'arguments',
        'too many',
        'must be those of the command',
        'put names with blanks in quotes',
      );
    default:
      return fault(
        'command line',
        'not understood',
        error.message.replace(/^error: /, ''),
        helpHint,
      );
  }
};

const helpHint = 'see --help';

const fault = (path: string, value: string, rule: string, remedy: string): Fault => ({
  path,
  value,
  rule,
  remedy,
});
