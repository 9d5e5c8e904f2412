import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { readSource, root, sourceFiles } from './folders.js';

const rootNames = [
  'components',
  'materials',
  'physics',
  'scenes',
  'test',
  'DEVELOPERS.md',
  'LICENSE',
  'README.md',
  'package-lock.json',
  'package.json',
  'tsconfig.json',
];
const made = ['node_modules', 'dist'];

describe('layout', () => {
  test('the root folder holds the named entries, dotfiles and nothing else', () => {
    const others = readdirSync(root).filter(
      (name) => !name.startsWith('.') && !rootNames.includes(name) && !made.includes(name),
    );
    expect(others).toEqual([]);
  });

  test('no file but a table is longer than 300 lines', () => {
    const longest = 300;
    const tooLong = ['components', 'materials', 'physics', 'scenes', 'test']
      .flatMap(sourceFiles)
      .filter((file) => !/^(materials\/tables|test\/reference)\//.test(file))
      .map((file) => ({ file, lines: readSource(file).split('\n').length - 1 }))
      .filter(({ lines }) => lines > longest);
    expect(tooLong).toEqual([]);
  });

  test('no decorated file lies directly in components, where no tsconfig governs it', () => {
    const direct = readdirSync(join(root, 'components')).filter((name) => name.endsWith('.ts'));
    expect(direct).toEqual(['vite.config.ts']);
  });
});
