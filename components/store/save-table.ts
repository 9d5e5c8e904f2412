import { fileSave } from 'browser-fs-access';

/** Writes a CSV table as a file; false when the person thinks better of it. */
export async function saveTable(text: string, fileName: string): Promise<boolean> {
  // Spreadsheets take the mark as UTF-8; without it they read µ as two letters.
  const blob = new Blob(['\ufeff', text], { type: 'text/csv' });
  try {
    await fileSave(blob, { fileName, extensions: ['.csv'], id: 'stratabeam' });
    return true;
  } catch {
    return false;
  }
}
