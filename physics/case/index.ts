// The case file: from text to a `Case`, or to what is wrong with it.

export { defaults } from './defaults.js';
export { type Fault, faultAt, faultLine } from './fault.js';
export { type CaseFiles, referencedFiles } from './files.js';
export { caseHash } from './hash.js';
export { caseJsonSchema } from './json-schema.js';
export { nearestKey } from './nearest-key.js';
export {
  type CaseFaults,
  longestCase,
  type ParsedCase,
  parseCase,
  parseCaseText,
  readCaseText,
} from './parse.js';
export * from './schema.js';
