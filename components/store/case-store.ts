import type { CaseFiles, Fault } from '../../physics/case/index.js';
import type { Draft } from './draft.js';
import { type History, historyOf, record, redo, undo } from './history.js';
import { type Json, withValueAt } from './path.js';
import { readDocument } from './stand-in.js';

/** What undo goes back through: the document and the files it names. */
export interface Sheet {
  readonly document: Json;
  readonly files: CaseFiles;
}

/** What the store tells whoever listens. */
export interface StoreState {
  readonly draft: Draft;
  readonly canUndo: boolean;
  readonly canRedo: boolean;
  /** Goes up by one with every change of the draft. */
  readonly revision: number;
}

/** One case being worked on. All methods return at once; listeners hear every change. */
export interface CaseStore {
  readonly state: () => StoreState;
  readonly subscribe: (listener: (state: StoreState) => void) => () => void;
  readonly setAt: (path: string, value: Json | undefined) => void;
  /** A change of the whole document; changes with one `joins` in quick succession undo together. */
  readonly change: (change: (document: Json) => Json, joins?: string) => void;
  readonly addFiles: (files: CaseFiles) => void;
  readonly undo: () => void;
  readonly redo: () => void;
  /** Opens another document; with faults that leave nothing to show it is refused and they return. */
  readonly open: (sheet: Sheet) => readonly Fault[];
}

/**
 * Holds the case that is on the desk, with unlimited undo. `now_ms` is the clock that decides which
 * edits of one field make one step of undo.
 *
 * @throws Error when the first document cannot be shown at all.
 */
export function createCaseStore(first: Sheet, now_ms: () => number): CaseStore {
  const started = draftOf(first, null);
  if (!started.draft) throw new Error(started.faults.map((fault) => fault.path).join(', '));
  let history: History<Sheet> = historyOf(first);
  let draft = started.draft;
  let revision = 0;
  const listeners = new Set<(state: StoreState) => void>();

  const state = (): StoreState => ({
    draft,
    canUndo: history.past.length > 0,
    canRedo: history.future.length > 0,
    revision,
  });
  const go = (next: History<Sheet>) => {
    if (next === history) return;
    history = next;
    draft = draftOf(next.present, draft).draft ?? { ...draft, ...next.present };
    revision += 1;
    for (const listener of listeners) listener(state());
  };
  const put = (key: string | null, document: Json, files: CaseFiles = history.present.files) => {
    if (document === history.present.document && files === history.present.files) return;
    go(record(history, { document, files }, key, now_ms()));
  };

  return {
    state,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    setAt: (path, value) => put(path, withValueAt(history.present.document, path, value)),
    change: (change, joins) => put(joins ?? null, change(history.present.document)),
    addFiles: (files) =>
      put(null, history.present.document, { ...history.present.files, ...files }),
    undo: () => go(undo(history)),
    redo: () => go(redo(history)),
    open: (sheet) => {
      const opened = draftOf(sheet, null);
      if (!opened.draft) return opened.faults;
      put(null, sheet.document, sheet.files);
      return [];
    },
  };
}

/** A draft of a sheet; faulty values are shown, and those last good stand in for them. */
function draftOf(
  sheet: Sheet,
  before: Draft | null,
): { draft: Draft | null; faults: readonly Fault[] } {
  const reading = readDocument(sheet.document, sheet.files, before?.case ?? null);
  if ('unreadable' in reading) return { draft: null, faults: reading.unreadable };
  return { draft: { ...sheet, ...reading }, faults: reading.faults };
}
