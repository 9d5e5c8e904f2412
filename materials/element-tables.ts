import { kept } from './kept.js';
import { unpackDecimals } from './packed-decimals.js';
import { elementTable } from './tables/elements.js';

/** An absorption edge: subshell number (see `shellNames`), photoelectric coefficient below and above. */
export interface EdgeData {
  readonly shell: number;
  readonly energy_keV: number;
  readonly below_cm2_per_g: number;
  readonly above_cm2_per_g: number;
}

/** What follows a vacancy in K, L1, L2 or L3: fluorescence yield, Coster–Kronig, relative line rates. */
export interface VacancyData {
  readonly yield: number;
  readonly costerKronig: readonly number[];
  readonly radiative: readonly { readonly fromShell: number; readonly rate: number }[];
}

/** Everything the packed table holds of one element: published values, energies in keV, cm²/g. */
export interface ElementTable {
  /** Nodes of the photoelectric coefficient, each edge twice. */
  readonly energies_keV: Float64Array;
  readonly photoelectric: Float64Array;
  /** Nodes of coherent and incoherent scattering, which have no edges. */
  readonly scatteringEnergies_keV: Float64Array;
  readonly coherent: Float64Array;
  readonly incoherent: Float64Array;
  /** For the last scattering nodes only: those above the pair threshold. */
  readonly pair: Float64Array;
  readonly edges: readonly EdgeData[];
  readonly bindingEnergies_keV: Float64Array;
  readonly vacancies: readonly VacancyData[];
  readonly vacanciesPerAuger: Float64Array;
  readonly formFactor: Float64Array;
  readonly incoherentScattering: Float64Array;
}

interface TableStart {
  readonly momentumTransfers_per_angstrom: Float64Array;
  readonly recordStarts: readonly number[];
}

let tableStart: TableStart | undefined;
const decoded = new Map<number, ElementTable>();

/** The nodes of both scattering functions, q = sin(θ/2)/λ in 1/Å. */
export function momentumTransferNodes(): Float64Array {
  return start().momentumTransfers_per_angstrom;
}

/** The table of element z (1 to 92), decoded on first use and kept. */
export function elementTableOf(z: number): ElementTable {
  return kept(decoded, z, () => decodeElement(start().recordStarts[z - 1]));
}

function start(): TableStart {
  if (tableStart) return tableStart;
  const read = reader(0);
  const momentumTransfers_per_angstrom = read.list();
  const lengths = read.list();
  const recordStarts = [read.position()];
  for (const length of lengths) recordStarts.push(recordStarts[recordStarts.length - 1] + length);
  tableStart = { momentumTransfers_per_angstrom, recordStarts };
  return tableStart;
}

// Fields in the order that materials/generate/pack.ts writes them.
function decodeElement(recordStart: number): ElementTable {
  const read = reader(recordStart);
  const nodes = momentumTransferNodes().length;
  const energies_keV = read.list();
  const photoelectric = read.values(energies_keV.length);
  const scatteringEnergies_keV = read.list();
  return {
    energies_keV,
    photoelectric,
    scatteringEnergies_keV,
    coherent: read.values(scatteringEnergies_keV.length),
    incoherent: read.values(scatteringEnergies_keV.length),
    pair: read.list(),
    edges: groups(read.list(), 4).map(([shell, energy_keV, below, above]) => ({
      shell,
      energy_keV,
      below_cm2_per_g: below,
      above_cm2_per_g: above,
    })),
    bindingEnergies_keV: read.list(),
    vacancies: Array.from({ length: 4 }, () => ({
      yield: read.values(1)[0],
      costerKronig: [...read.list()],
      radiative: groups(read.list(), 2).map(([fromShell, rate]) => ({ fromShell, rate })),
    })),
    vacanciesPerAuger: read.values(3),
    formFactor: read.values(nodes),
    incoherentScattering: read.values(nodes),
  };
}

function reader(from: number) {
  let at = from;
  const values = (count: number): Float64Array => {
    at += count;
    return unpackDecimals(elementTable, at - count, count);
  };
  return { values, list: () => values(values(1)[0]), position: () => at };
}

function groups(flat: Float64Array, size: number): number[][] {
  return Array.from({ length: flat.length / size }, (_, i) => [
    ...flat.slice(i * size, (i + 1) * size),
  ]);
}
