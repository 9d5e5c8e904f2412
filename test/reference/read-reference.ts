import { readFileSync } from 'node:fs';

/** A row of a reference file: column name → text. */
export type ReferenceRow = Readonly<Record<string, string>>;

/** Rows of a CSV file beside this one: header row, `#` comment lines, fields in double quotes allowed. */
export function readReference(file: string): ReferenceRow[] {
  const lines = readFileSync(new URL(`./${file}`, import.meta.url), 'utf8')
    .split(/\r?\n/)
    .filter((line) => line !== '' && !line.startsWith('#'));
  const [header, ...rows] = lines.map(fieldsOf);
  return rows.map((fields) => Object.fromEntries(header.map((name, i) => [name, fields[i] ?? ''])));
}

function fieldsOf(line: string): string[] {
  return [...line.matchAll(/(?:^|,)(?:"((?:[^"]|"")*)"|([^,]*))/g)].map(
    ([, quoted, plain]) => quoted?.replaceAll('""', '"') ?? plain,
  );
}
