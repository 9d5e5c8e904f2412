import { describe, expect, test } from 'vitest';
import {
  allowedFrom,
  type Folder,
  folderOf,
  folders,
  packageOf,
  readSource,
  sourceFiles,
  targetOf,
} from './folders.js';
import { importsOf } from './imports-of.js';

/** Import lines that lead where their folder may not go, as `file: specifier`. */
function wrongWays(folder: Folder): string[] {
  const allowed = allowedFrom(folder);
  return sourceFiles(folder).flatMap((file) =>
    importsOf(readSource(file), file)
      .filter((specifier) => specifier.startsWith('.'))
      .filter((specifier) => {
        const target = folderOf(targetOf(file, specifier));
        return target !== undefined && target !== folder && !allowed.has(target);
      })
      .map((specifier) => `${file}: ${specifier}`),
  );
}

/** Packages that may be imported; every other, `node:` ones included, is refused. */
const packagesAllowed: Partial<Record<Folder, readonly string[]>> = {
  materials: [],
  physics: [
    'zod',
    'ml-matrix',
    'ml-levenberg-marquardt',
    '@noble/hashes',
    'canonicalize',
    'd3-array',
    'd3-contour',
  ],
};

describe('imports', () => {
  test('the scanner sees every form of import', () => {
    const source = `
      import { a } from './a.js';
      import type { B } from "../b.js";
      import './c.js'; export * from './d.js'; export { d } from './d1.js';
      import {
        one, // from './not-me.js'
        two,
      } from './e.js';
      const f = await import('./f.js'), g = await import(\`./g.js\`), h = await import(f.name);
      new Worker(new URL('./i.js', import.meta.url), { type: 'module' });
      type J = import('./j.js').J;
      import k = require('k');
      const l = new URL(\`./l.\${f.kind}\`, import.meta.url);
      // import './not-me.js';
      /* import './nor-me.js'; */`;
    const names = 'a.js ../b.js c.js d.js d1.js e.js f.js g.js i.js j.js'.split(' ');
    const found = [...names.map((name) => (name.startsWith('.') ? name : `./${name}`)), 'k'];
    expect(importsOf(source).sort()).toEqual([...found, './l.*', '*'].sort());
  });

  test('the scanner takes no word in code, string, template or comment for an import', () => {
    const source = `
      show(request, from);
      function show(request: Request, from: HTMLElement): void { if (from.id !== 'a') return; }
      const kinds = { from: 'below', import: 'x' };
      const label = 'taken from "room"', other = "import 'y'";
      html\`<p from='top' \${from ? 'left' : 'right'}>copied from '\${label}' import('z')</p>\`;
      const pattern = /from 'w'/g; // it's from 'v'
      const page = new URL('./v.html', document.baseURI);
      export const from = 'u'; export { label };`;
    expect(importsOf(source)).toEqual([]);
  });

  test('the scanner refuses what it cannot read', () => {
    expect(() => importsOf('import { from', 'broken.ts')).toThrow(/^broken\.ts: /);
  });

  test('the dependency order is materials, physics, scenes, components', () => {
    const orderOf = (folder: Folder) =>
      ['materials', 'physics', 'scenes', 'components', 'test'].indexOf(folder.split('/')[0] ?? '');
    for (const folder of folders) {
      for (const target of allowedFrom(folder)) {
        expect(orderOf(target), `${folder} → ${target}`).toBeLessThanOrEqual(orderOf(folder));
      }
      expect(allowedFrom(folder).has('test'), `${folder} → test`).toBe(false);
    }
    expect(allowedFrom('components/command').has('components/desk')).toBe(false);
  });

  test.each(folders)('%s imports nothing from a folder it does not reference', (folder) => {
    expect(wrongWays(folder)).toEqual([]);
  });

  test.each(Object.entries(packagesAllowed))(
    '%s imports no package but those it is allowed',
    (folder, allowed) => {
      const foreign = sourceFiles(folder)
        .filter((file) => !file.includes('/generate/'))
        .flatMap((file) =>
          importsOf(readSource(file), file)
            .filter((specifier) => !specifier.startsWith('.'))
            .filter((specifier) => !allowed.includes(packageOf(specifier)))
            .map((specifier) => `${file}: ${specifier}`),
        );
      expect(foreign).toEqual([]);
    },
  );

  test.each(['materials', 'physics'])('%s knows no clock and no unseeded randomness', (folder) => {
    const hosts = /\bMath\.random\b|\bDate\.now\b|\bnew Date\(\s*\)|\bperformance\.now\b/;
    const guilty = sourceFiles(folder)
      .filter((file) => !file.includes('/generate/'))
      .filter((file) => hosts.test(readSource(file)));
    expect(guilty).toEqual([]);
  });
});
