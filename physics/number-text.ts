/**
 * A number for a sentence: three significant digits unless told otherwise, no exponent between
 * 0.001 and a million, no trailing zeros.
 */
export const numberText = (value: number, digits = 3): string => {
  if (value === 0) return '0';
  const size = Math.abs(value);
  if (size < 1e-3 || size >= 1e6) return value.toExponential(digits - 1);
  return String(Number(value.toPrecision(digits)));
};
