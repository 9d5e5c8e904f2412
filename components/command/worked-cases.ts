import { readdirSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join, relative } from 'node:path';

/** The worked cases that come with Stratabeam, for the help text: where they lie and what they ask. */
export const workedCases = (): string => {
  const manifest = createRequire(import.meta.url).resolve('stratabeam/package.json');
  const folder = join(dirname(manifest), 'components/examples');
  const cases = readdirSync(folder)
    .filter((file) => file.endsWith('.case.json'))
    .map((file) => `  ${file.padEnd(26)} ${titleOf(join(folder, file))}`);
  const shown = relative(process.cwd(), folder) || '.';
  return `\nWorked cases with the answers to expect, in ${shown}:\n${cases.join('\n')}`;
};

const titleOf = (path: string): string => {
  const { title }: { title?: string } = JSON.parse(readFileSync(path, 'utf8'));
  return title ?? '';
};
