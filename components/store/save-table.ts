import { fileSave } from 'browser-fs-access';
import { unlessLeft } from './unless-left.js';

/**
 * Writes a CSV table as a file; false when the person thinks better of it.
 *
 * @throws whatever the browser throws when the file cannot be written.
 */
export async function saveTable(
  text: string,
  fileName: string,
  write: typeof fileSave = fileSave,
): Promise<boolean> {
  // Spreadsheets take the mark as UTF-8; without it they read µ as two letters.
  const blob = new Blob(['\ufeff', text], { type: 'text/csv' });
  const saved = await unlessLeft(async () => {
    await write(blob, { fileName, extensions: ['.csv'], id: 'stratabeam' });
    return true;
  });
  return saved ?? false;
}
