/** Computed against expected, in per cent of expected. */
export function deviation_percent(computed: number, expected: number): number {
  return 100 * (computed / expected - 1);
}

/** Half a unit in the last digit of a published number, in per cent of it: what rounding may hide. */
export function rounding_percent(published: string): number {
  const digits = published.replace(/e.*$/i, '').replace(/^-/, '');
  const decimals = digits.includes('.') ? digits.split('.')[1].length : 0;
  return (100 * 0.5 * 10 ** -decimals) / Math.abs(Number(digits));
}

/** The value below which a share of the numbers lies. */
export function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))];
}
