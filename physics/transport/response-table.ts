import { type Material, massEnergyAbsorption } from '../../materials/index.js';
import { flight } from './flight.js';

/**
 * What a photon scores where it meets the detector plane, as functions of its energy and the cosine
 * of its angle to the normal: absorbed share η, energy fraction ε, energy-square fraction ε₂.
 */
export interface DetectorFunctions {
  efficiency(energy_keV: number, cosBeta: number): number;
  energyFraction(energy_keV: number, cosBeta: number): number;
  energySquareFraction(energy_keV: number, cosBeta: number): number;
}

/** Transmission of the grid for a photon of this energy and direction. */
export type GridFunction = (energy_keV: number, cosBeta: number) => number;

/** A detector that absorbs every photon and adds its energy. */
export const idealDetector: DetectorFunctions = {
  efficiency: () => 1,
  energyFraction: () => 1,
  energySquareFraction: () => 1,
};

/** Scored quantities: E·ε, E²·ε₂, η and E·(μen/ρ)air/cosβ; first without, then behind the grid. */
export const quantityNames = ['signal', 'noise', 'counts', 'airKerma'] as const;
export const quantitiesPerSide = quantityNames.length;
export const quantityCount = 2 * quantitiesPerSide;

/** Scores at nodes of energy (every 0.25 keV) and angle (β ∝ j²), all quantities of a node together. */
export interface ResponseTable {
  readonly energyNodes: number;
  readonly values: Float64Array;
}

const nodesPerKeV = 4;
const angleSteps = 48;
const angleNodes = angleSteps + 1;
const steepest_rad = (89.5 * Math.PI) / 180;
const perRootBeta = angleSteps / Math.sqrt(Math.PI / 2);

/**
 * Fluence counts a passage 1/cosβ, which has no finite variance. Within this cosine of the plane
 * every passage counts 2/cosine instead: the mean, for a field isotropic across that band.
 */
export const grazingCosine = 0.02;

/** 1/cosβ with the grazing band at its mean. */
export const fluenceWeight = (cosBeta: number): number =>
  cosBeta < grazingCosine ? 2 / grazingCosine : 1 / cosBeta;

/** All quantities of one photon at perpendicular or oblique incidence, kerma not yet over cosβ. */
export function respondExactly(
  detector: DetectorFunctions,
  grid: GridFunction | null,
  air: Material,
  energy_keV: number,
  cosBeta: number,
): number[] {
  const plain = [
    energy_keV * detector.energyFraction(energy_keV, cosBeta),
    energy_keV * energy_keV * detector.energySquareFraction(energy_keV, cosBeta),
    detector.efficiency(energy_keV, cosBeta),
    energy_keV * (massEnergyAbsorption(air, Math.max(1, energy_keV)) ?? 0),
  ];
  const passed = grid === null ? 1 : grid(energy_keV, cosBeta);
  return [...plain, ...plain.map((value) => value * passed)];
}

/** Tabulates detector and grid up to the greatest energy of the beam. */
export function responseTable(
  detector: DetectorFunctions,
  grid: GridFunction | null,
  air: Material,
  greatestEnergy_keV: number,
): ResponseTable {
  const energyNodes = Math.ceil(greatestEnergy_keV * nodesPerKeV) + 2;
  const values = new Float64Array(energyNodes * angleNodes * quantityCount);
  let at = 0;
  for (let i = 0; i < energyNodes; i++) {
    const energy_keV = Math.max(1, i / nodesPerKeV);
    for (let j = 0; j < angleNodes; j++) {
      const beta = Math.min(steepest_rad, (j / perRootBeta) ** 2);
      values.set(respondExactly(detector, grid, air, energy_keV, Math.cos(beta)), at);
      at += quantityCount;
    }
  }
  return { energyNodes, values };
}

/**
 * Scores of a photon in flight (its energy and direction are read), interpolated, kerma over cosβ;
 * written to `scores`.
 */
export function respond(table: ResponseTable, photon: Float64Array, scores: Float64Array): void {
  const { values } = table;
  const cosBeta = photon[flight.w];
  const energyAt = photon[flight.energy] * nodesPerKeV;
  const energyNode = energyAt | 0;
  const angleAt = Math.sqrt(Math.acos(Math.min(1, cosBeta))) * perRootBeta;
  const angleNode = Math.min(angleSteps - 1, angleAt | 0);
  const f = energyAt - energyNode;
  const g = angleAt - angleNode;
  const lower = (energyNode * angleNodes + angleNode) * quantityCount;
  const upper = lower + angleNodes * quantityCount;
  for (let q = 0; q < quantityCount; q++) {
    const below = values[lower + q];
    const above = values[upper + q];
    const low = below + g * (values[lower + quantityCount + q] - below);
    const high = above + g * (values[upper + quantityCount + q] - above);
    scores[q] = low + f * (high - low);
  }
  const fluence = fluenceWeight(cosBeta);
  scores[quantitiesPerSide - 1] *= fluence;
  scores[quantityCount - 1] *= fluence;
}
