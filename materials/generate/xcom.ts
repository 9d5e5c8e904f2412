import { readSpecFile } from './spec-file.js';

/** One node of an XCOM element table; energies in keV, coefficients in cm²/g. */
export interface CrossSectionRow {
  readonly energy_keV: number;
  readonly coherent: number;
  readonly incoherent: number;
  readonly photoelectric: number;
  readonly pair: number;
}

/** An absorption edge: the photoelectric coefficient just below and just above it, cm²/g. */
export interface EdgeRow {
  readonly energy_keV: number;
  readonly below: number;
  readonly above: number;
}

export interface ElementCrossSections {
  readonly rows: readonly CrossSectionRow[];
  readonly edges: readonly EdgeRow[];
}

/**
 * XCOM element tables (Berger & Hubbell 1987) by atomic number. An energy given twice is an edge
 * only where the photoelectric coefficient changes; other repeats are dropped.
 */
export function readXcom(path: string): ElementCrossSections[] {
  return [{ rows: [], edges: [] }, ...readSpecFile(path).map((section) => sortOut(section.rows))];
}

function sortOut(table: readonly (readonly number[])[]): ElementCrossSections {
  const rows: CrossSectionRow[] = [];
  const edges: EdgeRow[] = [];
  for (const [energy_keV, coherent, incoherent, , photoelectric, pair] of table) {
    const row = { energy_keV, coherent, incoherent, photoelectric, pair };
    const previous = rows.at(-1);
    if (previous?.energy_keV === energy_keV) {
      if (previous.photoelectric === photoelectric) continue;
      if (previous.photoelectric > photoelectric || previous.coherent !== coherent) {
        throw new Error(
          `${energy_keV} keV: a doubled row must differ by an upward photoelectric step`,
        );
      }
      edges.push({ energy_keV, below: previous.photoelectric, above: photoelectric });
    }
    rows.push(row);
  }
  return { rows, edges };
}
