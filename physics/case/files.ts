import {
  type BadRow,
  parseControlCurveCsv,
  parseSizesCsv,
  parseSpectrumCsv,
} from '../csv/index.js';
import { withValue } from './context-defaults.js';
import { type Fault, faultAt } from './fault.js';
import { type Path, printedPath, valueAt } from './printed.js';

/** Texts of the files that a case names, by the name it uses. */
export type CaseFiles = Readonly<Record<string, string>>;

/** A place where a case may name a CSV file, and where the rows read from it go. */
interface FilePlace {
  readonly namedAt: Path;
  readonly rowsAt: Path;
  readonly read: (text: string) => TableRead;
}

interface TableRead {
  readonly rows: readonly unknown[];
  readonly badRows: readonly BadRow[];
  readonly assumedUnits: readonly string[];
}

const readSizes = (text: string): TableRead => {
  const table = parseSizesCsv(text);
  const rows = table.rows.map(({ thickness_mm, weight }) => ({
    name: `${thickness_mm} mm`,
    thickness_mm,
    ...(weight === null ? {} : { weight }),
  }));
  return { ...table, rows };
};

const readSpectrum = (text: string): TableRead => {
  const table = parseSpectrumCsv(text);
  const rows = table.rows.map(({ energy_keV, fluence }) => [energy_keV, fluence] as const);
  return { ...table, rows: table.fluenceIs === 'per bin' ? perKeVRows(rows) : rows };
};

/** Fluence per bin to fluence per keV; each row owns the energies halfway to its neighbours. */
const perKeVRows = (rows: readonly (readonly [number, number])[]): [number, number][] => {
  const sorted = rows.toSorted(([a], [b]) => a - b);
  const last = sorted.length - 1;
  return sorted.map(([energy_keV, fluence], index) => {
    const low = sorted[Math.max(0, index - 1)][0];
    const high = sorted[Math.min(last, index + 1)][0];
    const neighbours = index === 0 || index === last ? 1 : 2;
    const width_keV = (high - low) / neighbours;
    return [energy_keV, width_keV > 0 ? fluence / width_keV : fluence];
  });
};

/** Every place of a case that names a file without holding its rows yet. */
const filePlaces = (input: unknown): FilePlace[] => {
  const places: FilePlace[] = [
    { namedAt: ['patient', 'sizes', 'file'], rowsAt: ['patient', 'sizes'], read: readSizes },
    { namedAt: ['room', 'source', 'file'], rowsAt: ['room', 'source', 'rows'], read: readSpectrum },
  ];
  const techniques = valueAt(input, ['techniques']);
  const count = Array.isArray(techniques) ? techniques.length : 0;
  for (let index = 0; index < count; index++) {
    const control = ['techniques', index, 'control'];
    places.push({
      namedAt: [...control, 'curve'],
      rowsAt: [...control, 'rows'],
      read: parseControlCurveCsv,
    });
  }
  return places.filter(
    ({ namedAt, rowsAt }) =>
      typeof valueAt(input, namedAt) === 'string' && !Array.isArray(valueAt(input, rowsAt)),
  );
};

/** Names of the files that must be handed to `parseCase` with a case. */
export const referencedFiles = (input: unknown): string[] => [
  ...new Set(filePlaces(input).map(({ namedAt }) => valueAt(input, namedAt) as string)),
];

/** The case with the rows of its files in place; files not handed in or not readable are faults. */
export const withFiles = (
  input: unknown,
  files: CaseFiles,
): { readonly input: unknown; readonly faults: readonly Fault[] } => {
  const faults: Fault[] = [];
  let filled = input;
  for (const { namedAt, rowsAt, read } of filePlaces(input)) {
    const name = valueAt(input, namedAt) as string;
    const table = Object.hasOwn(files, name) ? read(files[name]) : noTable;
    if (table === noTable) {
      const remedy = 'put the file beside the case file, or write its rows into the case';
      faults.push(faultAt(namedAt, name, 'must be a file handed in with the case', remedy));
    } else {
      faults.push(...tableFaults(namedAt, name, table));
    }
    filled = withValue(filled, rowsAt, table.rows);
  }
  return { input: filled, faults };
};

const noTable: TableRead = { rows: [], badRows: [], assumedUnits: [] };

const tableFaults = (path: Path, name: string, table: TableRead): Fault[] => {
  const faults = [
    ...table.badRows.map(({ line, reason }) => ({
      value: `${name}, line ${line}`,
      rule: `must be readable, but ${reason}`,
      remedy: 'correct the line or take it out',
    })),
    ...table.assumedUnits.map((column) => ({
      value: name,
      rule: `must name the unit of ${column} in its heading`,
      remedy: `write the heading as in ${column}`,
    })),
  ];
  if (faults.length === 0 && table.rows.length === 0) {
    const rule = 'must hold at least one row below its heading';
    faults.push({ value: name, rule, remedy: 'enter the rows' });
  }
  return faults.map((fault) => ({ path: printedPath(path), ...fault }));
};
