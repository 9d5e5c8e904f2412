import type { Finding } from '../results.js';

/**
 * An answer that was run forward again: what was asked for, what the forward run gives, and how far
 * they are apart. Without a value, the findings name the limit that stops it.
 */
export interface Answer<T> {
  readonly value: T | null;
  readonly target: number | null;
  /** The same quantity from a fresh forward run at the answer. */
  readonly forward: number | null;
  readonly findings: readonly Finding[];
}

export const noAnswer = <T>(target: number | null, findings: readonly Finding[]): Answer<T> => ({
  value: null,
  target,
  forward: null,
  findings,
});

export const blockedBy = (code: string, message: string, more: Partial<Finding> = {}): Finding => ({
  code,
  severity: 'limit',
  message,
  ...more,
});
