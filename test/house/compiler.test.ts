import { execFileSync } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { dirname, join, posix } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { allowedFrom, folders, root } from './folders.js';

/** `components/desk` → `components-desk`, for file names. */
const flat = (folder: string) => folder.replaceAll('/', '-');

const pairs = folders.flatMap((from) =>
  folders.filter((to) => to !== from).map((to) => ({ from, to })),
);

/**
 * The house in miniature: the real tsconfigs with one tiny module per folder, one file per pair of
 * folders importing it, and a probe for the page's types in every folder. One compiler run judges
 * them all.
 */
describe('the compiler', () => {
  const house = mkdtempSync(join(tmpdir(), 'stratabeam-house-'));
  let complaints: string[] = [];
  const complaintsAbout = (file: string) =>
    complaints.filter((line) => line.startsWith(`${file}(`)).join('\n');

  beforeAll(() => {
    cpSync(join(root, 'tsconfig.json'), join(house, 'tsconfig.json'));
    writeFileSync(join(house, 'package.json'), '{ "name": "house", "type": "module" }');
    symlinkSync(join(root, 'node_modules'), join(house, 'node_modules'), 'dir');
    for (const folder of folders) {
      mkdirSync(join(house, folder), { recursive: true });
      cpSync(join(root, folder, 'tsconfig.json'), join(house, folder, 'tsconfig.json'));
      writeFileSync(join(house, folder, 'index.ts'), `export const name = '${folder}';\n`);
      writeFileSync(join(house, folder, 'page.ts'), 'export const title = document.title;\n');
    }
    cpSync(join(root, 'test/tsconfig.base.json'), join(house, 'test/tsconfig.base.json'));
    for (const { from, to } of pairs) {
      const specifier = posix.relative(`/${from}`, `/${to}/index.js`);
      const source = `import { name } from '${specifier}';\nexport const heard: string = name;\n`;
      writeFileSync(join(house, from, `from-${flat(to)}.ts`), source);
    }
    const tsc = join(
      dirname(createRequire(import.meta.url).resolve('typescript/package.json')),
      'bin/tsc',
    );
    try {
      execFileSync(process.execPath, [tsc, '-b', '--pretty', 'false'], {
        cwd: house,
        encoding: 'utf8',
      });
    } catch (failure) {
      complaints = (failure as { stdout: string }).stdout.split('\n');
    }
  }, 60_000);
  afterAll(() => rmSync(house, { recursive: true, force: true }));

  const refused = pairs.filter(({ from, to }) => !allowedFrom(from).has(to));
  const granted = pairs.filter(({ from, to }) => allowedFrom(from).has(to));

  test.each(refused)('refuses an import of $to in $from', ({ from, to }) => {
    expect(complaintsAbout(`${from}/from-${flat(to)}.ts`)).toContain('error TS6307');
  });

  test.each(granted)('allows an import of $to in $from', ({ from, to }) => {
    expect(complaintsAbout(`${from}/from-${flat(to)}.ts`)).toBe('');
  });

  test.each(['materials', 'physics'])('refuses the page’s types in %s', (folder) => {
    expect(complaintsAbout(`${folder}/page.ts`)).toContain("Cannot find name 'document'");
  });

  test.each(['scenes', 'components/charts', 'components/desk'])(
    'knows the page in %s',
    (folder) => {
      expect(complaintsAbout(`${folder}/page.ts`)).toBe('');
    },
  );
});
