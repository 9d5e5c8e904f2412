import type { BrokenCase } from './broken/broken-case.js';
import { details } from './broken/details.js';
import { keys } from './broken/keys.js';
import { names } from './broken/names.js';
import { numbers } from './broken/numbers.js';
import { together } from './broken/together.js';
import { whole } from './broken/whole.js';

export { type BrokenCase, type Loose, soundCase, soundText } from './broken/broken-case.js';

/** Case files with one thing wrong each. */
export const brokenCases: readonly BrokenCase[] = [
  ...numbers,
  ...keys,
  ...whole,
  ...names,
  ...together,
  ...details,
];
