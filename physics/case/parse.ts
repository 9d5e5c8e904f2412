import type { z } from 'zod';
import { assumedPaths } from './assumed.js';
import { withContextDefaults } from './context-defaults.js';
import { deepFrozen } from './deep-frozen.js';
import type { Fault } from './fault.js';
import { type CaseFiles, withFiles } from './files.js';
import { issueFaults } from './issue-faults.js';
import { plainJsonFaults } from './plain-json.js';
import { readJson } from './read-json.js';
import { crossRules } from './rules/index.js';
import { type Case, caseSchema } from './schema.js';
import { upgraded } from './upgrade.js';

/** A case ready to compute with, deeply frozen, and the paths that took a default. */
export interface ParsedCase {
  readonly case: Case;
  readonly assumed: readonly string[];
}

/** Every thing wrong with the case, at least one. */
export interface CaseFaults {
  readonly faults: readonly Fault[];
}

/** Longest case file read, in characters; a real one takes a hundredth of it. */
export const longestCase = 5_000_000;

/**
 * A case file's data into a `Case`: upgraded to the current version, its files read, defaults
 * filled in and every rule checked. Never throws; bad input gives all its faults at once.
 *
 * @param json the data, as `JSON.parse` gives it; it is not changed.
 * @param files texts of the files the case names (`referencedFiles` lists them), by name.
 */
export const parseCase = (json: unknown, files: CaseFiles = {}): ParsedCase | CaseFaults => {
  const unsafe = plainJsonFaults(json);
  if (unsafe.some(({ path }) => path === 'case')) return { faults: unsafe };
  const current = upgraded(json);
  if ('fault' in current) return { faults: [current.fault] };
  const read = withFiles(current.input, files);
  const input = withContextDefaults(read.input);
  const parsed = caseSchema.safeParse(input);
  const sections = parsed.success ? parsed.data : readableSections(input);
  const issues = parsed.success ? [] : issueFaults(caseSchema, input, parsed.error.issues);
  const faults = firstPerPath([...unsafe, ...read.faults, ...issues, ...crossFaults(sections)]);
  if (!parsed.success || faults.length > 0) return { faults };
  return {
    case: deepFrozen(parsed.data),
    assumed: assumedPaths(caseSchema, read.input, parsed.data),
  };
};

/** The same from the text of a case file. */
export const parseCaseText = (text: string, files: CaseFiles = {}): ParsedCase | CaseFaults => {
  const read = readCaseText(text);
  return 'fault' in read ? { faults: [read.fault] } : parseCase(read.value, files);
};

/** The data in the text of a case file, or why there is none. */
export const readCaseText = (
  text: string,
): { readonly value: unknown } | { readonly fault: Fault } => {
  if (text.length <= longestCase) return readJson(text);
  const rule = `must be at most ${longestCase / 1e6} million characters`;
  const value = `${(text.length / 1e6).toFixed(1)} million characters`;
  return { fault: { path: 'case', value, rule, remedy: 'hand in a case file' } };
};

type Sections = Partial<Case>;

/** The top-level parts of a faulty case that are sound in themselves. */
const readableSections = (input: unknown): Sections =>
  Object.fromEntries(
    Object.entries<z.ZodType>(caseSchema.shape).flatMap(([key, schema]) => {
      const result = schema.safeParse((input as Record<string, unknown> | null)?.[key]);
      return result.success ? [[key, result.data]] : [];
    }),
  );

const crossFaults = (sections: Sections): Fault[] =>
  crossRules.flatMap(({ needs, faults }) =>
    needs.every((key) => sections[key] !== undefined) ? faults(sections as Case) : [],
  );

/** One fault for a value at a place: the first found says best what is wrong there. */
const firstPerPath = (faults: readonly Fault[]): Fault[] =>
  faults.filter(
    (fault, index) =>
      faults.findIndex(({ path, value }) => path === fault.path && value === fault.value) === index,
  );
