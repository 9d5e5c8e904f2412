/** Factors between units someone may type where another is asked for. */
const lengths_mm: Record<string, number> = { mm: 1, cm: 10, m: 1000, um: 1e-3, µm: 1e-3, μm: 1e-3 };
const kermas_uGy: Record<string, number> = { nGy: 1e-3, uGy: 1, µGy: 1, μGy: 1, mGy: 1e3 };
const times_ms: Record<string, number> = { ms: 1, s: 1000 };
const families = [lengths_mm, kermas_uGy, times_ms];

/**
 * A typed figure in the field's own unit: decimal point or comma, a unit after it if wanted
 * (`2 cm` where mm is asked gives 20). Null when it is not a number, or its unit is another kind.
 */
export function readNumber(text: string, unit: string): number | null {
  const match = /^([+\-−]?(?:\d+(?:[.,]\d*)?|[.,]\d+)(?:e[+-]?\d+)?)\s*(.*)$/i.exec(text.trim());
  if (!match) return null;
  const value = Number(match[1].replace(',', '.').replace('−', '-'));
  const typed = match[2].trim();
  if (typed === '' || typed === unit || typed.replace('kVp', 'kV') === unit) return value;
  const family = families.find(
    (candidate) => Object.hasOwn(candidate, typed) && Object.hasOwn(candidate, unit),
  );
  return family ? Number(((value * family[typed]) / family[unit]).toPrecision(12)) : null;
}
