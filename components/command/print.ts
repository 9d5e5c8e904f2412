import type { Io } from './io.js';

/** How a command was asked to answer. */
export interface Format {
  readonly json?: boolean;
  readonly csv?: boolean;
}

/** The forms of one answer; only the one asked for is made. */
export interface Forms {
  readonly json: () => unknown;
  readonly csv?: () => string;
  readonly table: () => string;
}

/** Prints an answer in the form asked for. */
export const print = (io: Io, format: Format, forms: Forms): void => {
  if (format.json) io.out(`${JSON.stringify(forms.json(), null, 2)}\n`);
  else if (format.csv && forms.csv) io.out(forms.csv());
  else io.out(forms.table());
};
