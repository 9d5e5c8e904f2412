import { readdirSync, readFileSync } from 'node:fs';
import { faultLine, type ParsedCase, parseCaseText } from '../../physics/case/index.js';

const folder = new URL('../../components/examples/', import.meta.url);

export const readExampleText = (file: string): string =>
  readFileSync(new URL(file, folder), 'utf8');

/** Names of the worked cases: `aortography`. */
export const exampleNames: readonly string[] = readdirSync(folder)
  .filter((file) => file.endsWith('.case.json'))
  .map((file) => file.replace('.case.json', ''));

export const parsedExample = (name: string): ParsedCase => {
  const parsed = parseCaseText(readExampleText(`${name}.case.json`));
  if ('faults' in parsed) throw new Error(parsed.faults.map(faultLine).join('\n'));
  return parsed;
};
