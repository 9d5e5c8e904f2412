import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve, sep } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('../..', import.meta.url));

/** The folders that have a tsconfig of their own and may import only what it references. */
export const folders = [
  'materials',
  'physics',
  'scenes',
  'components/charts',
  'components/store',
  'components/workers',
  'components/dossier',
  'components/command',
  'components/desk',
  'test',
] as const;
export type Folder = (typeof folders)[number];

const leaveOut = new Set(['node_modules', 'dist', '.git', '.vite']);

/** Every source file below a folder, as paths from the root with forward slashes. */
export function sourceFiles(below: string): string[] {
  return readdirSync(join(root, below), { withFileTypes: true }).flatMap((entry) => {
    const path = `${below}/${entry.name}`;
    if (entry.isDirectory()) return leaveOut.has(entry.name) ? [] : sourceFiles(path);
    return /\.(ts|mjs)$/.test(entry.name) ? [path] : [];
  });
}

export const readSource = (path: string): string => readFileSync(join(root, path), 'utf8');

/** Folders a tsconfig references, those referenced by its references included. */
export function allowedFrom(folder: Folder): Set<Folder> {
  const config = JSON.parse(readSource(`${folder}/tsconfig.json`)) as {
    references: { path: string }[];
  };
  const direct = config.references.map(
    ({ path }) =>
      relative(root, resolve(root, folder, path))
        .split(sep)
        .join('/') as Folder,
  );
  return new Set(direct.flatMap((target) => [target, ...allowedFrom(target)]));
}

/** The folder a path from the root belongs to, undefined for files of no folder. */
export const folderOf = (path: string): Folder | undefined =>
  folders.find((folder) => path === folder || path.startsWith(`${folder}/`));

/** Where a relative import of a file leads, as a path from the root. */
export const targetOf = (file: string, specifier: string): string =>
  relative(root, resolve(root, dirname(file), specifier))
    .split(sep)
    .join('/');

/** The name of the package a bare import means: `d3-scale`, `@noble/hashes`, `node:fs`. */
export const packageOf = (specifier: string): string =>
  specifier.split('/', specifier.startsWith('@') ? 2 : 1).join('/');
