/** One line of a table, split into cells, with its number in the file (from 1). */
export interface CsvRecord {
  readonly line: number;
  readonly cells: readonly string[];
}

/** A text as records, and the separator that splits it. */
export interface CsvText {
  readonly separator: '\t' | ';' | ',';
  readonly records: readonly CsvRecord[];
}

/**
 * Splits a table into records. Lines that are empty or begin with `#` are skipped. The separator is
 * the first of tab, semicolon and comma that the first record holds. Cells may stand in double
 * quotes, a doubled quote inside standing for one; a cell does not run over several lines.
 */
export function csvRecords(text: string): CsvText {
  const lines = text
    .replace(/^\uFEFF/, '')
    .split(/\r\n|\n|\r/)
    .map((content, i) => ({ content, line: i + 1 }))
    .filter(({ content }) => content.trim() !== '' && !content.trimStart().startsWith('#'));
  const heading = lines[0]?.content ?? '';
  const separator = heading.includes('\t') ? '\t' : heading.includes(';') ? ';' : ',';
  return {
    separator,
    records: lines.map(({ content, line }) => ({ line, cells: splitCells(content, separator) })),
  };
}

function splitCells(content: string, separator: string): string[] {
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (let i = 0; i < content.length; i++) {
    const character = content[i];
    if (quoted && character === '"' && content[i + 1] === '"') {
      cell += '"';
      i++;
    } else if (character === '"' && (quoted || cell.trim() === '')) {
      quoted = !quoted;
    } else if (character === separator && !quoted) {
      cells.push(cell.trim());
      cell = '';
    } else {
      cell += character;
    }
  }
  cells.push(cell.trim());
  return cells;
}
