import { type DBSchema, type IDBPDatabase, openDB } from 'idb';
import type { Sheet } from './case-store.js';

/** What is kept in the browser so that a crash loses nothing. */
export interface KeptSheet extends Sheet {
  readonly fileName: string | null;
}

interface DeskDatabase extends DBSchema {
  sheets: { key: string; value: KeptSheet };
}

const open = (): Promise<IDBPDatabase<DeskDatabase>> =>
  openDB<DeskDatabase>('stratabeam', 1, {
    upgrade: (database) => {
      database.createObjectStore('sheets');
    },
  });

/**
 * Keeps the sheet on the desk in this browser (IndexedDB). Where the browser refuses storage, keeping
 * does nothing and recovering finds nothing; the desk works all the same.
 */
export const autosave = {
  keep: async (sheet: KeptSheet): Promise<boolean> => {
    try {
      await (await open()).put('sheets', sheet, 'desk');
      return true;
    } catch {
      return false;
    }
  },
  recover: async (): Promise<KeptSheet | null> => {
    try {
      return (await (await open()).get('sheets', 'desk')) ?? null;
    } catch {
      return null;
    }
  },
};
