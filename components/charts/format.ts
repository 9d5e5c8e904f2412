/**
 * Numbers as they stand on paper: three significant digits, plain decimals between 0.001 and
 * 99 999, a true minus sign, and a dash where there is no value. Units are written beside, never
 * here.
 */

const superscript = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const raised = (exponent: number): string =>
  String(exponent)
    .replace(/-/g, '⁻')
    .replace(/\d/g, (digit) => superscript[Number(digit)]);

/** `value` to `digits` significant digits: 1.42, 0.0713, 12 300, 4.1 × 10⁻⁵, –. */
export function formatNumber(value: number | null | undefined, digits = 3): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '–';
  if (value === 0) return '0';
  const rounded = Number(value.toPrecision(digits));
  const size = Math.abs(rounded);
  if (size < 1e-3 || size >= 1e5) {
    const exponent = Math.floor(Math.log10(size));
    const mantissa = (rounded / 10 ** exponent).toFixed(digits - 1);
    return `${mantissa} × 10${raised(exponent)}`.replace('-', '−');
  }
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(size)));
  return rounded.toFixed(decimals).replace('-', '−');
}

/** A ratio about one: ×0.50, ×1.08, ×12.4, –. */
export function formatRatio(ratio: number | null | undefined): string {
  if (ratio === null || ratio === undefined || !Number.isFinite(ratio)) return '–';
  if (Math.abs(ratio) >= 0.095 && Math.abs(ratio) < 10)
    return `×${ratio.toFixed(2)}`.replace('-', '−');
  return `×${formatNumber(ratio)}`;
}

/** A value as it was entered, or as it is typed into a field: without zeros nobody wrote. */
export const formatEntry = (value: number): string => String(Number(value.toPrecision(12)));

/** Shares as whole or tenth percent: 25 %, 0.4 %. */
export const formatPercent = (fraction: number): string =>
  `${formatNumber(100 * fraction, Math.abs(fraction) < 0.1 ? 2 : 3)} %`;
