import {
  type CaseFiles,
  type Fault,
  type ParsedCase,
  parseCase,
} from '../../physics/case/index.js';
import type { Case } from '../../physics/case/schema.js';
import { type Json, valueAtPath, withValueAt } from './path.js';

/** A case to compute with, and the faults of the document it was read from. */
export interface Reading extends ParsedCase {
  readonly faults: readonly Fault[];
}

/** How often taking out faulty values may show new faults before we give up. */
const rounds = 6;

/**
 * Reads a document even when it has faults: every faulty value is replaced by the one last good at
 * its place, or left to its default, and what is then a sound case is what results are for.
 * `unreadable` holds the faults when no such case can be had.
 */
export function readDocument(
  document: Json,
  files: CaseFiles,
  lastGood: Case | null,
): Reading | { readonly unreadable: readonly Fault[] } {
  const first = parseCase(document, files);
  if (!('faults' in first)) return { ...first, faults: [] };
  let mended = document;
  let faults = first.faults;
  for (let round = 0; round < rounds; round += 1) {
    for (const { path } of faults) mended = standIn(mended, path, round === 0 ? lastGood : null);
    const again = parseCase(mended, files);
    if (!('faults' in again)) return { ...again, faults: first.faults };
    faults = again.faults;
  }
  return { unreadable: first.faults };
}

/**
 * One faulty value put right: the last good one, or its key taken away. Part of something that was
 * last good as none at all, such as a pair half entered, goes back to none.
 */
function standIn(document: Json, path: string, lastGood: Case | null): Json {
  const good = lastGood ? valueAtPath(lastGood, path) : undefined;
  const parent = path.replace(/(\.[^.[\]]+|\[\d+\])$/, '');
  if (lastGood && valueAtPath(lastGood, parent) === null)
    return withValueAt(document, parent, null);
  const missing = valueAtPath(document, parent) === undefined;
  if (good === undefined && missing) return document;
  return withValueAt(document, path, good);
}
