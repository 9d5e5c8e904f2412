const plain = /^[+-]?(\d+\.?\d*|\.\d+)([eE][+-]?\d+)?$/;

/**
 * A number written with a decimal point, or with a decimal comma where the comma does not separate
 * cells. Null for anything else: thousands separators are not guessed at.
 *
 * @example parseDecimal('2,95', ';') // 2.95
 */
export function parseDecimal(cell: string, separator: string): number | null {
  const text = separator !== ',' && !cell.includes('.') ? cell.replace(',', '.') : cell;
  if (!plain.test(text)) return null;
  const value = Number(text);
  return Number.isFinite(value) ? value : null;
}
