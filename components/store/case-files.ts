import { fileOpen, fileSave } from 'browser-fs-access';
import { type Fault, longestCase, readCaseText } from '../../physics/case/index.js';
import type { Sheet } from './case-store.js';
import type { Json } from './path.js';
import { unlessLeft } from './unless-left.js';

/** What came out of files handed in: a case with its tables, tables alone, or faults. */
export type Handed =
  | { readonly kind: 'case'; readonly sheet: Sheet }
  | { readonly kind: 'tables'; readonly files: Readonly<Record<string, string>> }
  | { readonly kind: 'faults'; readonly fileName: string; readonly faults: readonly Fault[] };

const isTable = (file: File): boolean => file.name.toLowerCase().endsWith('.csv');

/** Reads files that were chosen or dropped: one case, and CSV tables it may name. */
export async function readHanded(files: readonly File[]): Promise<Handed> {
  const tables = Object.fromEntries(
    await Promise.all(
      files.filter(isTable).map(async (file) => [file.name, await file.text()] as const),
    ),
  );
  const cases = files.filter((file) => !isTable(file));
  if (cases.length === 0) return { kind: 'tables', files: tables };
  const [file] = cases;
  const refuse = (faults: readonly Fault[]): Handed => ({
    kind: 'faults',
    fileName: file.name,
    faults,
  });
  if (cases.length > 1) {
    const rule = 'must be one case at a time';
    return refuse([
      { path: 'files', value: `${cases.length} files`, rule, remedy: 'choose one case file' },
    ]);
  }
  // Bytes bound characters, so a hopelessly long file is not even read.
  const text = file.size > 4 * longestCase ? ' '.repeat(longestCase + 1) : await file.text();
  const read = readCaseText(text);
  if ('fault' in read) return refuse([read.fault]);
  return {
    kind: 'case',
    sheet: { document: read.value as Json, files: tables, fileName: file.name },
  };
}

/**
 * Asks for files through the browser; null when the person thinks better of it.
 *
 * @throws whatever the browser throws when it cannot ask.
 */
export const chooseFiles = (): Promise<File[] | null> =>
  unlessLeft(() =>
    fileOpen({
      description: 'Case file and its tables',
      extensions: ['.json', '.csv'],
      multiple: true,
      id: 'stratabeam',
    }),
  );

/** `Aortography, abdomen` → `aortography-abdomen.case.json`. */
export function fileNameFor(title: string): string {
  const plain = title
    .normalize('NFKD')
    .replace(/[^\w\s-]/g, '')
    .trim()
    .toLowerCase();
  return `${plain.replace(/[\s_]+/g, '-').slice(0, 60) || 'untitled'}.case.json`;
}

/**
 * Writes the document as a case file.
 *
 * @returns the name it was saved under, where the person may choose one; null when they think better.
 * @throws whatever the browser throws when the file cannot be written.
 */
export function saveCase(
  document: Json,
  fileName: string,
  write: typeof fileSave = fileSave,
): Promise<string | null> {
  const blob = new Blob([`${JSON.stringify(document, null, 2)}\n`], { type: 'application/json' });
  return unlessLeft(async () => {
    const handle = await write(blob, { fileName, extensions: ['.json'], id: 'stratabeam' });
    return handle?.name ?? fileName;
  });
}
