import { unitFactor } from './units.js';

/** A heading read for a column: how its numbers convert, and whether it named a unit. */
export interface HeadingMatch {
  readonly factor: number;
  readonly unitNamed: boolean;
}

/** `halfValueLayer`, `half-value layer` and `Half Value Layer` are one. */
export const plainName = (text: string): string =>
  text
    .replace(/([a-z]{2})([A-Z])/g, '$1 $2')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, ' ')
    .trim();

/**
 * Whether `heading` names a column whose numbers are kept in `unit`. The unit stands in brackets,
 * `distance (cm)` or `distance [cm]`, or after the name, `distance_cm`, `distance cm`; a heading
 * without one is taken to mean the unit the column is kept in.
 *
 * @param isName tells a column's name by its plain form; every name is right for a mapped heading
 * @param unit null for a column of words
 * @returns null when it names something else, or a unit of something else
 */
export function matchHeading(
  heading: string,
  isName: (plain: string) => boolean,
  unit: string | null,
): HeadingMatch | null {
  if (unit !== null) {
    for (const [name, written] of nameAndUnit(heading)) {
      const factor = isName(plainName(name)) ? unitFactor(written, unit) : null;
      if (factor !== null) return { factor, unitNamed: true };
    }
  }
  if (!isName(plainName(heading))) return null;
  // A unit in brackets that measures something else is not to be passed over.
  if (unit !== null && bracketed.test(heading)) return null;
  if (unit === null || unit === 'number') return { factor: 1, unitNamed: true };
  // A heading may be nothing but its unit: `kVp`.
  const own = unitFactor(heading, unit);
  return { factor: own ?? 1, unitNamed: own !== null };
}

const bracketed = /^(.*?)\s*[([](.*)[)\]]\s*$/;

function nameAndUnit(heading: string): [name: string, unit: string][] {
  const parts = bracketed.exec(heading);
  if (parts) return [[parts[1], parts[2]]];
  return [...heading.matchAll(/[\s_]+/g)].map(({ index, 0: gap }) => [
    heading.slice(0, index),
    heading.slice(index + gap.length),
  ]);
}
