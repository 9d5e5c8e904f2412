import type { Fault } from '../../../physics/case/index.js';
import { chooseFiles, fileNameFor, readHanded, saveCase } from '../../store/case-files.js';
import type { CaseStore, Sheet } from '../../store/case-store.js';
import { unreadFault, unsavedFault } from '../../store/file-fault.js';
import { valueAtPath } from '../../store/path.js';
import type { FaultReport } from '../fields/report-faults.js';

/** Where the desk tells what became of a file. */
export interface FileTold {
  readonly status: (words: string) => void;
  /** Why a file was not opened or saved; null when it was. */
  readonly refused: (report: FaultReport | null) => void;
}

/** Opening and saving on the desk. Every promise resolves: what fails is told. */
export interface DeskFiles {
  readonly choose: () => Promise<void>;
  readonly handed: (files: readonly File[]) => Promise<void>;
  readonly open: (sheet: Sheet) => void;
  readonly save: () => Promise<void>;
}

/** The dialogs of the browser; others in tests. */
const browserDialogs = { chooseFiles, saveCase };

export function deskFiles(store: CaseStore, told: FileTold, dialogs = browserDialogs): DeskFiles {
  const refuse = (name: string, was: string, faults: readonly Fault[]) =>
    told.refused({ heading: `${name} was not ${was}`, faults });
  const open = (sheet: Sheet) => {
    const faults = store.open(sheet);
    if (faults.length > 0) return refuse(sheet.fileName ?? 'The case', 'opened', faults);
    told.refused(null);
    told.status(sheet.fileName ? `opened ${sheet.fileName}` : '');
  };
  const handed = async (files: readonly File[]) => {
    try {
      const got = await readHanded(files);
      if (got.kind === 'case') open(got.sheet);
      if (got.kind === 'tables') store.addFiles(got.files);
      if (got.kind === 'faults') refuse(got.fileName, 'opened', got.faults);
    } catch (error) {
      const name = files.map((file) => file.name).join(', ');
      refuse(name, 'opened', [unreadFault(name, error)]);
    }
  };
  return {
    open,
    handed,
    choose: async () => {
      try {
        const files = await dialogs.chooseFiles();
        if (files) await handed(files);
      } catch (error) {
        refuse('The file', 'opened', [unreadFault('files', error)]);
      }
    },
    save: async () => {
      const { draft, fileName } = store.state();
      const name = fileName ?? fileNameFor(String(valueAtPath(draft.document, 'title') ?? ''));
      try {
        const saved = await dialogs.saveCase(draft.document, name);
        if (saved === null) return;
        store.named(saved);
        told.refused(null);
        told.status(`saved ${saved}`);
      } catch (error) {
        refuse(name, 'saved', [unsavedFault(name, error)]);
      }
    },
  };
}
