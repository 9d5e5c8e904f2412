import { join } from 'node:path';
import { shellNames } from '../shells.js';
import { readSpecFile, type SpecSection } from './spec-file.js';

/** The radiative filling of a vacancy from an outer shell, with its relative rate. */
export interface RadiativeRate {
  readonly fromShell: number;
  readonly rate: number;
}

/** Relaxation data of one vacancy shell. `costerKronig` are the probabilities towards higher L. */
export interface ShellRelaxation {
  readonly yield: number;
  readonly costerKronig: readonly number[];
  readonly radiative: readonly RadiativeRate[];
}

/** Relaxation data of one element; energies in keV, shells numbered as in `shellNames`. */
export interface ElementRelaxation {
  readonly bindingEnergies_keV: readonly number[];
  /** K, L1, L2, L3. */
  readonly shells: readonly ShellRelaxation[];
  /** Mean number of L1, L2, L3 vacancies that one nonradiative K transition leaves. */
  readonly vacanciesPerAuger: readonly number[];
}

/** Radiative rates below this share of a shell's total are left out (their sum stays below 0.1 %). */
const leastShare = 1e-4;

/** Files read, in the package's own names. */
export const eadlFiles = [
  'EADL97_BindingEnergies.dat',
  'EADL97_KShellConstants.dat',
  'EADL97_LShellConstants.dat',
  'EADL97_KShellRadiativeRates.dat',
  'EADL97_LShellRadiativeRates.dat',
  'EADL97_KShellNonradiativeRates.dat',
] as const;

/** EADL97 (Cullen et al. 1991) relaxation data of element z from the folder that holds the files. */
export function readEadl(folder: string): (z: number) => ElementRelaxation {
  const [binding, kConstants, lConstants, kRates, lRates, auger] = eadlFiles.map((file) =>
    readSpecFile(join(folder, file)),
  );
  return (z) => {
    const bindingRow = rowOf(binding[0], z);
    return {
      bindingEnergies_keV: shellNames.map((_, shell) => bindingRow[shell + 1] ?? 0),
      shells: [
        relaxation(rowOf(kConstants[0], z), kRates[0], z),
        ...lConstants.map((section, i) => relaxation(rowOf(section, z), lRates[i], z)),
      ],
      vacanciesPerAuger: ['L1', 'L2', 'L3'].map((shell) => meanVacancies(auger[0], z, shell)),
    };
  };
}

// A row of constants is z, Coster–Kronig probabilities, fluorescence yield.
function relaxation(constants: readonly number[], rates: SpecSection, z: number): ShellRelaxation {
  const row = rowOf(rates, z);
  const radiative = rates.labels
    .map((label, column) => ({ label, rate: row[column] }))
    .slice(2)
    .map(({ label, rate }) => ({ fromShell: outerShell(label), rate }))
    .filter(({ rate }) => rate > leastShare * row[1]);
  return { yield: constants.at(-1) ?? 0, costerKronig: constants.slice(1, -1), radiative };
}

// Labels read KL3 or L1M2: the vacancy first, the shell that fills it last.
function outerShell(label: string): number {
  const name = label.match(/[A-Z]\d+$/)?.[0];
  return shellNames.indexOf(name ?? '');
}

// Labels read K-L1M2: the two shells that are left vacant.
function meanVacancies(auger: SpecSection, z: number, shell: string): number {
  const row = rowOf(auger, z);
  let vacancies = 0;
  let total = 0;
  auger.labels.slice(2).forEach((label, i) => {
    const left = label.slice(2).match(/[A-Z]\d+/g) ?? [];
    vacancies += row[i + 2] * left.filter((name) => name === shell).length;
    total += row[i + 2];
  });
  return total > 0 ? vacancies / total : 0;
}

function rowOf(section: SpecSection, z: number): readonly number[] {
  const row = section.rows.find((candidate) => candidate[0] === z);
  if (!row) throw new Error(`${section.title}: no row for Z = ${z}`);
  return row;
}
