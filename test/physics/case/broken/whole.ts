import { type BrokenCase, changed, rewritten, soundText, written } from './broken-case.js';

/** Files that are not a case at all. */
export const whole: readonly BrokenCase[] = [
  written('an empty file', '', 'line 1, column 1', 'must not end here'),
  written('a page instead of a case', '<html></html>', 'line 1, column 1', 'must be a value'),
  written('a list instead of a case', '[]', 'case', 'must be an object'),
  written('text instead of a case', '"case"', 'case', 'must be an object'),
  written(
    'a file of ten million characters',
    `{"title": "${'x'.repeat(1e7)}"}`,
    'case',
    'must be at most 5 million characters',
  ),
  written(
    'brackets nested ten thousand deep',
    `${'['.repeat(1e4)}${']'.repeat(1e4)}`,
    'line 1, column 34',
    'must not nest deeper than 32 levels',
  ),
  rewritten(
    'a comma too many',
    ['"version": 1,', '"version": 1,,'],
    'line 3, column 16',
    'must be a key',
  ),
  written(
    'a file cut short',
    soundText.slice(0, soundText.indexOf('"agentsCompared"')),
    'line 165, column 3',
    'must not end here',
  ),
  changed('another format', (c) => (c.format = 'other'), 'format', 'must be "stratabeam.case"'),
  changed('a newer version', (c) => (c.version = 2), 'version', 'must be at most 1'),
  changed('a version that is text', (c) => (c.version = '1'), 'version', 'must be 1'),
];
