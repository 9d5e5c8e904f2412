import type { Case, Fault } from '../../physics/case/index.js';

import { type Json, valueAtPath } from './path.js';

/**
 * A case being worked on: the document as the user has it, faulty values included, and the last
 * reading of it that had no fault. Fields show the document; results belong to the case.
 */
export interface Draft {
  readonly document: Json;
  /** Texts of files the case names (control curve, sizes, spectrum), by name. */
  readonly files: Readonly<Record<string, string>>;
  readonly case: Case;
  readonly assumed: readonly string[];
  readonly faults: readonly Fault[];
}

/** What a field at `path` shows: what was entered, else what the case assumes there. */
export const shownAt = (draft: Draft, path: string): Json | undefined => {
  const entered = valueAtPath(draft.document, path);
  return entered === undefined ? valueAtPath(draft.case, path) : entered;
};

/** The fault standing at a path or below it. */
export const faultAt = (draft: Draft, path: string): Fault | undefined =>
  draft.faults.find((fault) => fault.path === path) ??
  draft.faults.find(
    (fault) => fault.path.startsWith(`${path}.`) || fault.path.startsWith(`${path}[`),
  );

/** Whether the value at a path is assumed, because the case is silent there. */
export const isAssumed = (draft: Draft, path: string): boolean =>
  draft.assumed.some(
    (entry) => entry === path || path.startsWith(`${entry}.`) || path.startsWith(`${entry}[`),
  ) && valueAtPath(draft.document, path) === undefined;

/** The list shown at a path: as entered, faulty items included, else as the case assumes it. */
export const listAt = (draft: Draft, path: string): readonly Json[] => {
  const shown = shownAt(draft, path);
  return Array.isArray(shown) ? shown : [];
};
