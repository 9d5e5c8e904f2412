import type { CaseFiles, Fault } from '../../physics/case/index.js';
import { sharedWith } from '../../physics/case/shared-with.js';
import type { Draft } from './draft.js';
import { type History, historyOf, mapSteps, record, redo, undo } from './history.js';
import { type Json, withValueAt } from './path.js';
import { readDocument } from './stand-in.js';

/** A case on the desk: the document, the files it names, and the name it is saved under, if any. */
export interface Sheet {
  readonly document: Json;
  readonly files: CaseFiles;
  readonly fileName: string | null;
}

/** What undo goes back through: a sheet, what was read from it, and with which opening it came. */
interface Step {
  readonly sheet: Sheet;
  readonly draft: Draft;
  readonly opening: number;
}

/** What the store tells whoever listens. */
export interface StoreState {
  readonly draft: Draft;
  readonly fileName: string | null;
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
  /** The name the case on the desk was saved under, before and after what may be undone. */
  readonly named: (fileName: string) => void;
  readonly undo: () => void;
  readonly redo: () => void;
  /** Opens another document; with faults that leave nothing to show it is refused and they return. */
  readonly open: (sheet: Sheet) => readonly Fault[];
}

/**
 * Holds the case that is on the desk, with unlimited undo. `now_ms` is the clock that decides which
 * edits of one field make one step of undo.
 *
 * @throws Error when the first document cannot be shown at all; `canStand` tells beforehand.
 */
export function createCaseStore(first: Sheet, now_ms: () => number): CaseStore {
  const started = opened(first);
  if ('unreadable' in started)
    throw new Error(started.unreadable.map((fault) => fault.path).join(', '));
  let openings = 0;
  let history: History<Step> = historyOf({ sheet: first, draft: started, opening: openings });
  let revision = 0;
  const listeners = new Set<(state: StoreState) => void>();

  const state = (): StoreState => ({
    draft: history.present.draft,
    fileName: history.present.sheet.fileName,
    canUndo: history.past.length > 0,
    canRedo: history.future.length > 0,
    revision,
  });
  const go = (next: History<Step>) => {
    if (next === history) return;
    history = next;
    revision += 1;
    for (const listener of listeners) listener(state());
  };
  const put = (key: string | null, changed: Partial<Sheet>) => {
    const { sheet: before, draft, opening } = history.present;
    const sheet = { ...before, ...changed };
    if (sheet.document === before.document && sheet.files === before.files) return;
    go(record(history, { sheet, draft: edited(sheet, draft), opening }, key, now_ms()));
  };

  return {
    state,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    setAt: (path, value) =>
      put(path, { document: withValueAt(history.present.sheet.document, path, value) }),
    change: (change, joins) =>
      put(joins ?? null, { document: change(history.present.sheet.document) }),
    addFiles: (files) => put(null, { files: { ...history.present.sheet.files, ...files } }),
    named: (fileName) => {
      const { opening } = history.present;
      history = mapSteps(history, (step) =>
        step.opening === opening ? { ...step, sheet: { ...step.sheet, fileName } } : step,
      );
    },
    undo: () => go(undo(history)),
    redo: () => go(redo(history)),
    open: (sheet) => {
      const draft = opened(sheet);
      if ('unreadable' in draft) return draft.unreadable;
      openings += 1;
      go(record(history, { sheet, draft, opening: openings }, null, now_ms()));
      return [];
    },
  };
}

/** Whether a sheet leaves something to show, so that a store may start from it. */
export const canStand = (sheet: Sheet): boolean => !('unreadable' in opened(sheet));

/** A sheet read by itself: nothing of the case before it may stand in for its faulty values. */
function opened({ document, files }: Sheet): Draft | { readonly unreadable: readonly Fault[] } {
  const reading = readDocument(document, files, null);
  return 'unreadable' in reading ? reading : { document, files, ...reading };
}

/** A sheet read after an edit, which leaves other parts of the case the very objects they were: values last good stand in for faulty ones, all of them if need be. */
function edited({ document, files }: Sheet, before: Draft): Draft {
  const reading = readDocument(document, files, before.case);
  return 'unreadable' in reading
    ? { ...before, document, files, faults: reading.unreadable }
    : { document, files, ...reading, case: sharedWith(before.case, reading.case) };
}
