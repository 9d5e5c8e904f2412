import type { Estimated } from '../transport/index.js';

/** How an estimate stands against transport. */
export type Verdict = 'agrees' | 'differs' | 'undecided';

export interface Judged {
  /** Estimate less transport, in percent of transport. */
  readonly difference_percent: number | null;
  /** The same in standard errors. */
  readonly z: number | null;
  /** Null where there is no estimate to judge. */
  readonly verdict: Verdict | null;
}

/** Standard errors taken as what chance explains: one row in 40 goes further, on either side. */
export const sureStandardErrors = 2;

/**
 * Undecided while two standard errors do not fit into the tolerance. Then the estimate agrees
 * inside the tolerance, and differs where the difference exceeds it by two standard errors; between
 * the two more photons must decide.
 */
export const judge = (
  estimate: number,
  { value, standardError }: Estimated,
  tolerance_percent: number,
): Judged => {
  const difference = estimate - value;
  if (value === 0 || standardError === null) {
    return { difference_percent: null, z: null, verdict: 'undecided' };
  }
  const allowed = (Math.abs(value) * tolerance_percent) / 100;
  const error = sureStandardErrors * standardError;
  const excess = Math.abs(difference) - allowed;
  return {
    difference_percent: (100 * difference) / value,
    z: standardError > 0 ? difference / standardError : null,
    verdict:
      error > allowed
        ? 'undecided'
        : excess <= 0
          ? 'agrees'
          : excess > error
            ? 'differs'
            : 'undecided',
  };
};

/**
 * Photons after which a verdict falls if value and estimate stay as they are, from the error so far (which
 * falls with the square root): two standard errors must fit into the tolerance and, where the
 * difference exceeds it, into the excess. Null while nothing is known, and on the very edge.
 */
export const photonsToDecide = (
  estimate: number,
  { value, standardError }: Estimated,
  tolerance_percent: number,
  photons: number,
): number | null => {
  if (value === 0 || standardError === null) return null;
  const allowed = (Math.abs(value) * tolerance_percent) / 100;
  const excess = Math.abs(estimate - value) - allowed;
  const room = excess > 0 ? Math.min(allowed, excess) : allowed;
  const needed = photons * ((sureStandardErrors * standardError) / room) ** 2;
  return Number.isFinite(needed) ? needed : null;
};
