import { readReference } from './read-reference.js';

/** The reference files that the checks command must know where no test folder is installed. */
export const shippedTables = [
  'mu_nist',
  'edges',
  'compositions',
  'qualities',
  'tube_model',
  'tg195',
  'optimum_energy',
  'agents',
  'gadolinium_equivalence',
  'detectors',
  'scatter_spr',
  'backscatter',
  'min_hvl',
  'trade_facts',
] as const;

/** physics/checks/packed-reference.ts as it must stand: the files' rows, repeated words once. */
export function packedReference(): string {
  const sources = new Map<string, number>();
  const provenances = new Map<string, number>();
  const numbered = (known: Map<string, number>, text: string): number => {
    if (!known.has(text)) known.set(text, known.size);
    return known.get(text) as number;
  };
  const tables = shippedTables.map((table) => {
    const lines = readReference(`${table}.csv`).map((row) => {
      const texts = [row.set, row.item, row.value, row.unit, row.conditions, row.tolerance];
      const source = numbered(sources, row.source);
      const provenance = numbered(provenances, row.provenance);
      const line = [...texts, source, provenance].join('|');
      if (line.split('|').length !== 8) throw new Error(`${table}: a row holds "|": ${line}`);
      return line;
    });
    return `  ${table}:\n    ${literal(lines.join('\n'))},\n`;
  });
  const list = (known: Map<string, number>): string =>
    [...known.keys()].map((text) => `  ${literal(text)},\n`).join('');
  return `${heading}export const sources: readonly string[] = [
${list(sources)}];

export const provenances: readonly string[] = [
${list(provenances)}];

/** Rows by file: set|item|value|unit|conditions|tolerance|number of source|number of provenance. */
export const packedTables = {
${tables.join('')}};
`;
}

const heading = `// Written by \`npm run tables\` from the files of test/reference, which name every source: change
// those, not this. A test says when it is out of date.

`;

/** As biome writes a string: single quotes unless that costs more escapes. */
const literal = (text: string): string => {
  const escaped = text.replaceAll('\\', '\\\\').replaceAll('\n', '\\n');
  const count = (mark: string): number => text.split(mark).length - 1;
  return count("'") > count('"')
    ? `"${escaped.replaceAll('"', '\\"')}"`
    : `'${escaped.replaceAll("'", "\\'")}'`;
};
