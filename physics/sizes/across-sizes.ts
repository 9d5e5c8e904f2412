import type { Case, Size } from '../case/schema.js';
import type { Comparison, Evaluation } from '../results.js';
import { sizesOf } from '../stack/sizes.js';

/** What a weighed case holds at one size of its mix, technique by technique; null where nothing. */
export interface AtSize {
  readonly size: Size;
  /** Of all patients, 0 to 1. */
  readonly share: number;
  readonly evaluations: readonly (Evaluation | null)[];
  /** Of each technique with Current; null for Current itself. */
  readonly comparisons: readonly (Comparison | null)[];
}

/** A weighed case size by size. */
export const acrossSizes = (
  c: Case,
  evaluations: readonly Evaluation[],
  comparisons: readonly Comparison[],
): AtSize[] => {
  const sizes = sizesOf(c.patient);
  const total = sizes.reduce((sum, { weight }) => sum + weight, 0);
  return sizes.map((size) => ({
    size,
    share: total > 0 ? size.weight / total : 1 / sizes.length,
    evaluations: c.techniques.map(
      ({ name }) =>
        evaluations.find((one) => one.technique === name && one.size === size.name) ?? null,
    ),
    comparisons: c.techniques.map(
      ({ name }) => comparisons.find((one) => one.to === name && one.size === size.name) ?? null,
    ),
  }));
};
