/** Rows as CSV: comma, decimal point, quotes where a cell needs them, numbers at full precision. */
export const csvText = (
  headings: readonly string[],
  rows: readonly (readonly (string | number | null)[])[],
): string => `${[headings, ...rows].map((row) => row.map(cell).join(',')).join('\n')}\n`;

const cell = (value: string | number | null): string => {
  if (value === null) return '';
  if (typeof value === 'number') return String(value);
  // A leading = + - @ would be taken for a formula by spreadsheets.
  const text = /^[=+\-@\t]/.test(value) ? `'${value}` : value;
  return /[",\n\r]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
};
