import { type Path, printedPath, printedValue } from './printed.js';

/** One thing wrong with what was handed in, said so that it can be put right. */
export interface Fault {
  /** Where: `room.tube.anodeAngle_deg`. */
  readonly path: string;
  /** What stood there, shortened for print. */
  readonly value: string;
  /** What must hold: `must be 6 to 22`. */
  readonly rule: string;
  /** What to do: `enter the nameplate angle`. */
  readonly remedy: string;
}

/** The one line a fault prints as: `path: value: rule; remedy`. */
export const faultLine = (fault: Fault): string =>
  `${fault.path}: ${fault.value}: ${fault.rule}; ${fault.remedy}`;

/** A fault about a value found at a path of the case. */
export const faultAt = (path: Path, value: unknown, rule: string, remedy: string): Fault => ({
  path: printedPath(path),
  value: printedValue(value),
  rule,
  remedy,
});
