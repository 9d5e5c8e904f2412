import { describe, expect, test } from 'vitest';
import {
  allowedFrom,
  type Folder,
  folderOf,
  folders,
  importsOf,
  packageOf,
  readSource,
  sourceFiles,
  targetOf,
} from './folders.js';

/** Import lines that lead where their folder may not go, as `file: specifier`. */
function wrongWays(folder: Folder): string[] {
  const allowed = allowedFrom(folder);
  return sourceFiles(folder).flatMap((file) =>
    importsOf(readSource(file))
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
      import './c.js';
      export * from './d.js';
      const e = await import('./e.js');
      new Worker(new URL('./f.js', import.meta.url));
      // import './not-me.js';
      /* import './nor-me.js'; */`;
    expect(importsOf(source).sort()).toEqual(
      ['./a.js', '../b.js', './d.js', './c.js', './e.js', './f.js'].sort(),
    );
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
          importsOf(readSource(file))
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
