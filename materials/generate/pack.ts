import { packDecimals } from '../packed-decimals.js';
import { shellNames } from '../shells.js';
import type { ElementRelaxation } from './eadl.js';
import {
  momentumTransfers_per_angstrom,
  type ScatteringFunctions,
} from './scattering-functions.js';
import type { ElementCrossSections } from './xcom.js';

export const range_keV = { from: 1, to: 20_000 };

/**
 * The whole table as one packed text, in the order that materials/element-tables.ts reads:
 * momentum transfers, then the length of each element's record, then the records.
 */
export function packTable(
  crossSections: readonly ElementCrossSections[],
  relaxation: (z: number) => ElementRelaxation,
  scattering: readonly ScatteringFunctions[],
): string {
  const common = commonEnergies(crossSections);
  const records: number[][] = [];
  for (let z = 1; z <= 92; z++) {
    records.push(elementRecord(crossSections[z], common, relaxation(z), scattering[z]));
  }
  return packDecimals([
    ...listed(momentumTransfers_per_angstrom),
    ...listed(records.map((record) => record.length)),
    ...records.flat(),
  ]);
}

/**
 * Energies that most elements have. Coherent and incoherent scattering have no edges, and their values
 * in the rows around one are interpolated; a few would bend a spline by several per cent (Fr at
 * 2.9999 keV, Pa at 5.1807 keV), so both processes keep the common rows only.
 */
function commonEnergies(crossSections: readonly ElementCrossSections[]): ReadonlySet<number> {
  const elements = new Map<number, number>();
  for (const { rows } of crossSections) {
    for (const energy of new Set(rows.map((row) => row.energy_keV))) {
      elements.set(energy, (elements.get(energy) ?? 0) + 1);
    }
  }
  return new Set([...elements].filter(([, n]) => 2 * n > crossSections.length).map(([e]) => e));
}

function elementRecord(
  { rows, edges }: ElementCrossSections,
  common: ReadonlySet<number>,
  relaxation: ElementRelaxation,
  { formFactor, incoherent }: ScatteringFunctions,
): number[] {
  const kept = rows.filter(
    (row) => row.energy_keV >= range_keV.from && row.energy_keV <= range_keV.to,
  );
  const smooth = kept.filter(
    (row, i) => common.has(row.energy_keV) && row.energy_keV !== kept[i - 1]?.energy_keV,
  );
  const shells = matchShells(
    edges.map((edge) => edge.energy_keV),
    relaxation.bindingEnergies_keV,
  );
  return [
    ...listed(kept.map((row) => row.energy_keV)),
    ...kept.map((row) => row.photoelectric),
    ...listed(smooth.map((row) => row.energy_keV)),
    ...smooth.map((row) => row.coherent),
    ...smooth.map((row) => row.incoherent),
    ...listed(kept.map((row) => row.pair).filter((pair) => pair > 0)),
    ...listed(edges.flatMap((edge, i) => [shells[i], edge.energy_keV, edge.below, edge.above])),
    ...listed(
      relaxation.bindingEnergies_keV.slice(
        0,
        1 + relaxation.bindingEnergies_keV.findLastIndex((e) => e > 0),
      ),
    ),
    ...relaxation.shells.flatMap((shell) => [
      shell.yield,
      ...listed(shell.costerKronig),
      ...listed(shell.radiative.flatMap(({ fromShell, rate }) => [fromShell, rate])),
    ]),
    ...relaxation.vacanciesPerAuger,
    ...formFactor,
    ...incoherent,
  ];
}

/**
 * Names the edges of the attenuation table: each belongs to the shell whose EADL97 binding energy is
 * nearest. The two tables differ by up to a few per cent in outer shells, so the order is checked too.
 */
export function matchShells(
  edges_keV: readonly number[],
  bindingEnergies_keV: readonly number[],
): number[] {
  const shells = edges_keV.map((edge) => {
    const distance = bindingEnergies_keV.map((e) =>
      e > 0 ? Math.abs(Math.log(e / edge)) : Infinity,
    );
    return distance.indexOf(Math.min(...distance));
  });
  shells.forEach((shell, i) => {
    if (i > 0 && shell >= shells[i - 1]) {
      const list = edges_keV.map((edge, j) => `${shellNames[shells[j]]} ${edge}`).join(', ');
      throw new Error(`edges do not match the binding energies one to one: ${list}`);
    }
  });
  return shells;
}

function listed(values: readonly number[]): number[] {
  return [values.length, ...values];
}
