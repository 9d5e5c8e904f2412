import { type EdgeData, elementTableOf, type VacancyData } from './element-tables.js';
import { kept } from './kept.js';
import { shellNames } from './shells.js';

/** One K line: IUPAC name, photon energy, share of all K photons. */
export interface FluorescenceLine {
  readonly name: string;
  readonly energy_keV: number;
  readonly share: number;
}

/** The K shell: edge, ratio of the photoelectric coefficient above to below it, yield, lines. */
export interface KShell {
  readonly edge_keV: number;
  readonly jumpRatio: number;
  readonly yield: number;
  readonly lines: readonly FluorescenceLine[];
}

/** K lines below this share of all K photons are left out of `kShell` and the rest renormalised. */
const leastLineShare = 1e-3;

/**
 * K-shell data of element z: edge and jump from the attenuation table, yield, line energies
 * (differences of binding energies) and shares (radiative rates) from EADL97 (Cullen et al. 1991).
 * Undefined where the K edge lies below the table's first energy, 1 keV (Z ≤ 10).
 */
export function kShell(z: number): KShell | undefined {
  return kept(kShells, z, () => buildKShell(z) ?? null) ?? undefined;
}

const kShells = new Map<number, KShell | null>();

function buildKShell(z: number): KShell | undefined {
  const table = elementTableOf(z);
  const edge = table.edges.find(({ shell }) => shell === 0);
  if (!edge) return undefined;
  const strong = linesOf(z, 0).filter(({ share }) => share >= leastLineShare);
  const total = strong.reduce((sum, { share }) => sum + share, 0);
  return Object.freeze({
    edge_keV: edge.energy_keV,
    jumpRatio: edge.above_cm2_per_g / edge.below_cm2_per_g,
    yield: table.vacancies[0].yield,
    lines: strong.map((line) => Object.freeze({ ...line, share: line.share / total })),
  });
}

/** Lines that fill a vacancy in K (0), L1 (1), L2 (2) or L3 (3) of element z; shares sum to 1. */
export function linesOf(z: number, vacancy: number): FluorescenceLine[] {
  const { bindingEnergies_keV, vacancies } = elementTableOf(z);
  const { radiative } = vacancies[vacancy];
  const total = totalRate(vacancies[vacancy]);
  return radiative.map(({ fromShell, rate }) => ({
    name: `${shellNames[vacancy]}-${shellNames[fromShell]}`,
    energy_keV: bindingEnergies_keV[vacancy] - bindingEnergies_keV[fromShell],
    share: rate / total,
  }));
}

/**
 * Mean energy X̄ that leaves an atom of element z as K and L fluorescence per photoelectric event at
 * `energy_keV`. Shell shares 1 − 1/J are taken in turn from K, L1, L2, L3 with the jumps J of the
 * attenuation table, which has edges from 1 keV up (K of Z ≤ 10 and L of Z ≤ 28 lie below and yield next
 * to nothing); K includes the L photons that follow it. M and outer shells are neglected.
 */
export function meanFluorescenceEnergy_keV(z: number, energy_keV: number): number {
  const perVacancy = energyPerVacancy(z);
  let remaining = 1;
  let mean = 0;
  for (const { shell, energy_keV: edge_keV, below_cm2_per_g, above_cm2_per_g } of innerEdges(z)) {
    if (energy_keV < edge_keV) continue;
    mean += remaining * (1 - below_cm2_per_g / above_cm2_per_g) * perVacancy[shell];
    remaining *= below_cm2_per_g / above_cm2_per_g;
  }
  return mean;
}

/** Mean fluorescence energy, keV, that follows one vacancy in K, L1, L2, L3, cascades included. */
export function energyPerVacancy(z: number): readonly number[] {
  return kept(vacancyEnergies, z, () => computeEnergyPerVacancy(z));
}

const vacancyEnergies = new Map<number, readonly number[]>();

function computeEnergyPerVacancy(z: number): readonly number[] {
  const { vacancies, vacanciesPerAuger } = elementTableOf(z);
  const own = vacancies.map(
    (vacancy, shell) =>
      vacancy.yield *
      linesOf(z, shell).reduce((sum, line) => sum + line.share * line.energy_keV, 0),
  );
  const [f12 = 0, f13 = 0] = vacancies[1].costerKronig;
  const [f23 = 0] = vacancies[2].costerKronig;
  const l3 = own[3];
  const l2 = own[2] + f23 * l3;
  const l1 = own[1] + f12 * l2 + f13 * l3;
  const lEnergies = [l1, l2, l3];
  const yieldK = vacancies[0].yield;
  const k = lEnergies.reduce((sum, energy, i) => {
    const radiative = yieldK * shareFrom(vacancies[0], i + 1);
    return sum + energy * (radiative + (1 - yieldK) * vacanciesPerAuger[i]);
  }, own[0]);
  return [k, l1, l2, l3];
}

function shareFrom(vacancy: VacancyData, shell: number): number {
  const rate = vacancy.radiative.find(({ fromShell }) => fromShell === shell)?.rate ?? 0;
  return rate === 0 ? 0 : rate / totalRate(vacancy);
}

function totalRate(vacancy: VacancyData): number {
  return vacancy.radiative.reduce((sum, { rate }) => sum + rate, 0);
}

// K, L1, L2, L3 edges, innermost first.
function innerEdges(z: number): readonly EdgeData[] {
  return kept(innerEdgesOf, z, () =>
    elementTableOf(z)
      .edges.filter(({ shell }) => shell < 4)
      .sort((a, b) => a.shell - b.shell),
  );
}

const innerEdgesOf = new Map<number, readonly EdgeData[]>();
