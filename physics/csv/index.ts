// Tables the user brings: a general reader, then the tables of the case.

export {
  type BadRow,
  type Columns,
  type CsvTable,
  type NumberColumn,
  readColumns,
  type TextColumn,
} from './read-columns.js';
export { csvRecords } from './records.js';

// Tables of the case.

export { parseControlCurveCsv } from './control-curve.js';
export { parseReadingsCsv } from './readings.js';
export { parseSizesCsv } from './sizes.js';
export { parseSpectrumCsv } from './spectrum.js';
