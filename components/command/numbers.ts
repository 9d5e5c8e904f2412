import { numberText } from '../../physics/number-text.js';

/** A number in a table: significant digits, a dash where there is none. */
export const shown = (value: number | null | undefined, digits = 4): string => {
  if (value === null || value === undefined) return '–';
  if (value === 0) return '0';
  const size = Math.abs(value);
  if (size < 1e-3 || size >= 1e6) return value.toExponential(digits - 1).replace('e+', 'e');
  // Trailing zeros stay, so that a column has one precision; beyond the point only.
  return size >= 10 ** digits ? numberText(value, digits) : value.toPrecision(digits);
};
