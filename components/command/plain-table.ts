/** A table for people: text columns to the left, number columns to the right, two blanks between. */
export interface PlainTable {
  readonly title?: string;
  readonly headings: readonly string[];
  readonly rows: readonly (readonly string[])[];
  /** How many columns from the left hold words. */
  readonly wordColumns?: number;
}

export const plainTableText = ({ title, headings, rows, wordColumns = 1 }: PlainTable): string => {
  const lines = [headings, ...rows];
  const widths = headings.map((_, column) =>
    Math.max(...lines.map((cells) => width(cells[column] ?? ''))),
  );
  const line = (cells: readonly string[]): string =>
    widths
      .map((wide, column) => {
        const cell = cells[column] ?? '';
        const blanks = ' '.repeat(wide - width(cell));
        return column < wordColumns ? cell + blanks : blanks + cell;
      })
      .join('  ')
      .trimEnd();
  const rule = '─'.repeat(widths.reduce((sum, wide) => sum + wide, 2 * (widths.length - 1)));
  const body = [line(headings), rule, ...rows.map(line)];
  return `${[...(title ? [title, ''] : []), ...body].join('\n')}\n`;
};

// Combining marks (as in x̄) take no room; every other character used takes one place.
const width = (text: string): number => [...text.replace(/\p{M}/gu, '')].length;
