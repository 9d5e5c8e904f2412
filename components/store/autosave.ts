import { type DBSchema, type IDBPDatabase, openDB } from 'idb';
import type { Sheet } from './case-store.js';

interface DeskDatabase extends DBSchema {
  sheets: { key: string; value: Sheet };
}

/** Keeps the sheet on the desk in this browser, and finds it again. */
export interface Autosave {
  /** False when the browser would not keep it. */
  readonly keep: (sheet: Sheet) => Promise<boolean>;
  readonly recover: () => Promise<Sheet | null>;
}

/**
 * Keeping in IndexedDB over one connection, opened when first needed and again after it was lost.
 * Where the browser refuses storage, keeping says so and recovering finds nothing; the desk works
 * all the same.
 */
export function autosave(database: string): Autosave {
  let connection: Promise<IDBPDatabase<DeskDatabase>> | null = null;
  const forget = () => {
    connection = null;
  };
  const connected = (): Promise<IDBPDatabase<DeskDatabase>> => {
    connection ??= openDB<DeskDatabase>(database, 1, {
      upgrade: (fresh) => {
        fresh.createObjectStore('sheets');
      },
      // Another page wants to change the database: it must not wait for this one.
      blocking: (_, __, event) => {
        (event.target as IDBDatabase).close();
        forget();
      },
      terminated: forget,
    });
    return connection;
  };
  const unlessRefused = async <T>(work: () => Promise<T>): Promise<T | null> => {
    try {
      return await work();
    } catch {
      // The next attempt begins afresh, over a connection of its own.
      connection?.then((open) => open.close()).catch(() => undefined);
      forget();
      return null;
    }
  };
  const put = async (sheet: Sheet) => {
    const transaction = (await connected()).transaction('sheets', 'readwrite');
    const stored = transaction.store.put(sheet, 'desk');
    // Committed at once: a page that is going away does not live to hear that the put succeeded.
    transaction.commit();
    await Promise.all([stored, transaction.done]);
    return true;
  };
  return {
    keep: async (sheet) => (await unlessRefused(() => put(sheet))) ?? false,
    recover: async () =>
      (await unlessRefused(async () => (await connected()).get('sheets', 'desk'))) ?? null,
  };
}
