import type { Fault } from '../../physics/case/index.js';

const reasonOf = (error: unknown): string =>
  error instanceof Error ? error.message || error.name : String(error);

/** The fault of a file that the browser could not read. */
export const unreadFault = (fileName: string, error: unknown): Fault => ({
  path: fileName,
  value: reasonOf(error),
  rule: 'must be a file the browser can read',
  remedy: 'see that it is still there and may be read, then open it again',
});

/** The fault of a file that the browser could not write. */
export const unsavedFault = (fileName: string, error: unknown): Fault => ({
  path: fileName,
  value: reasonOf(error),
  rule: 'must be a file the browser can write',
  remedy: 'save again under another name or in another folder',
});
