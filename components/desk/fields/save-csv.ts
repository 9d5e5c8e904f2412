import { fileNameFor } from '../../store/case-files.js';
import { unsavedFault } from '../../store/file-fault.js';
import { saveTable } from '../../store/save-table.js';
import { reportFaults } from './report-faults.js';

/** Saves a CSV table under a name made from `title`; a failure is told at the head of the page. */
export async function saveCsv(
  from: EventTarget,
  title: string,
  text: string,
  save = saveTable,
): Promise<void> {
  const fileName = fileNameFor(title).replace('.case.json', '.csv');
  try {
    await save(text, fileName);
  } catch (error) {
    reportFaults(from, `${fileName} was not saved`, [unsavedFault(fileName, error)]);
  }
}
