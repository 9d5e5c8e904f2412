import { describe, expect, test } from 'vitest';
import { version } from '../../physics/version.js';
import { folderOf, packageOf, readSource, sourceFiles } from './folders.js';
import { importsOf } from './imports-of.js';

interface Manifest {
  readonly version: string;
  readonly scripts: Record<string, string>;
  readonly dependencies: Record<string, string>;
  readonly devDependencies: Record<string, string>;
}
interface Lock {
  readonly packages: Record<string, { version: string; hasInstallScript?: boolean }>;
}

const manifest = JSON.parse(readSource('package.json')) as Manifest;
const lock = JSON.parse(readSource('package-lock.json')) as Lock;

/** Places in the lockfile where a package is installed, nested copies included. */
const copiesOf = (name: string) =>
  Object.keys(lock.packages).filter((path) => path.endsWith(`node_modules/${name}`));

describe('packages', () => {
  test.each(['lit', 'lit-html', 'lit-element', '@lit/reactive-element', 'three'])(
    'the lockfile holds one copy of %s',
    (name) => {
      expect(copiesOf(name)).toEqual([`node_modules/${name}`]);
    },
  );

  test('answers carry the version of the package', () => {
    expect(version).toBe(manifest.version);
    expect(lock.packages[''].version).toBe(manifest.version);
  });

  test('every version is pinned exactly', () => {
    const loose = Object.entries({ ...manifest.dependencies, ...manifest.devDependencies }).filter(
      ([, version]) => !/^\d+\.\d+\.\d+$/.test(version),
    );
    expect(loose).toEqual([]);
  });

  test('whatever the shipped folders import is a dependency', () => {
    const missing = ['materials', 'physics', 'scenes', 'components']
      .flatMap(sourceFiles)
      .filter((file) => folderOf(file) && !file.includes('/generate/'))
      .flatMap((file) =>
        importsOf(readSource(file), file).map((specifier) => ({ file, specifier })),
      )
      .filter(({ specifier }) => !/^(\.|node:|stratabeam)/.test(specifier))
      .filter(({ specifier }) => !(packageOf(specifier) in manifest.dependencies))
      .map(({ file, specifier }) => `${file}: ${specifier}`);
    expect(missing).toEqual([]);
  });
});
