import { type Fault, faultLine } from '../../physics/case/index.js';

/** Bad input: thrown anywhere below a command, printed once at the top, exit code 2. */
export class Refusal extends Error {
  constructor(readonly faults: readonly Fault[]) {
    super(faults.map(faultLine).join('\n'));
  }
}

/** Ends the command with one fault. */
export function refuse(path: string, value: string, rule: string, remedy: string): never {
  throw new Refusal([{ path, value, rule, remedy }]);
}

/** Faults for standard error: a line each, or `{ "faults": […] }` for programs. */
export const faultsText = (faults: readonly Fault[], asJson: boolean): string =>
  asJson ? `${JSON.stringify({ faults }, null, 2)}\n` : `${faults.map(faultLine).join('\n')}\n`;
