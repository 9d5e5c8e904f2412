import type { Provenance } from '../../materials/index.js';
import { provenanceOf, type ReferenceRow } from './reference-rows.js';

/** `unconfirmed source`: a legal limit quoted from memory, whatever its number. */
export type Verdict = 'met' | 'short' | 'unconfirmed source';

/** `data carried`: a value that Stratabeam was given, beside the text it was taken from. */
export type CheckKind = 'computed' | 'data carried';

/** A published value beside what Stratabeam computes, or carries. */
export interface CheckRow {
  readonly id: string;
  readonly kind: CheckKind;
  readonly unit: string;
  readonly expected: number;
  /** Null where nothing could be computed; then the check falls short. */
  readonly computed: number | null;
  /** Greatest difference allowed, relative to `expected` or in its unit. */
  readonly tolerance: number;
  readonly toleranceIs: 'relative' | 'absolute';
  readonly verdict: Verdict;
  readonly source: string;
  readonly provenance: Provenance;
  /** Why the tolerance is what it is, where that needs saying. */
  readonly note?: string;
}

/** How near a computed value must come. */
export interface Tolerance {
  readonly relative?: number;
  readonly absolute?: number;
  /** Rounding of the published number is allowed on top: half a unit in its last digit. */
  readonly rounding?: boolean;
  readonly note?: string;
}

/** The row of a reference value, its verdict decided. */
export const checkRow = (
  row: ReferenceRow,
  computed: number | null,
  tolerance: Tolerance,
  expectedText = row.value,
): CheckRow => {
  const expected = Number(expectedText);
  const rounding = tolerance.rounding ? lastDigit(expectedText) / 2 : 0;
  const isRelative = tolerance.relative !== undefined;
  const allowed = isRelative
    ? (tolerance.relative ?? 0) + (expected === 0 ? 0 : rounding / Math.abs(expected))
    : (tolerance.absolute ?? 0) + rounding;
  const bound = isRelative ? allowed * Math.abs(expected) : allowed;
  // Twelve digits are far beyond any published value; this only forgives binary arithmetic.
  const slack = 1e-12 * Math.max(1, Math.abs(expected));
  const isMet = computed !== null && Math.abs(computed - expected) <= bound + slack;
  return {
    id: [`${row.table}: ${row.set}`, row.item, row.conditions].filter(Boolean).join(', '),
    kind: 'computed',
    unit: row.unit,
    expected,
    computed: computed !== null && Number.isFinite(computed) ? computed : null,
    tolerance: allowed,
    toleranceIs: isRelative ? 'relative' : 'absolute',
    verdict: isMet ? 'met' : 'short',
    source: row.source,
    provenance: provenanceOf(row),
    ...(tolerance.note ? { note: tolerance.note } : {}),
  };
};

/** The same of data that nothing is computed from here: it shows only that it was entered right. */
export const carried = (row: CheckRow): CheckRow => ({ ...row, kind: 'data carried' });

/** One unit in the last digit a number is printed with: 0.01 for `2.50`, 1e-9 for `3.671e-6`. */
export const lastDigit = (printed: string): number => {
  const [digits, exponent = '0'] = printed.toLowerCase().split('e');
  const decimals = digits.split('.')[1]?.length ?? 0;
  return 10 ** (Number(exponent) - decimals);
};
