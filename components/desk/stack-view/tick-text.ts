const superscript = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** A power of ten as it stands under a scale: 0.01, 0.1, 1, 10, 100, 10⁶, 10⁻⁵. */
export function raisedPower(value: number): string {
  const power = Math.round(Math.log10(value));
  if (Math.abs(power) <= 2) return String(Number((10 ** power).toPrecision(1)));
  return `10${String(power)
    .replace('-', '⁻')
    .replace(/\d/g, (digit) => superscript[Number(digit)])}`;
}
