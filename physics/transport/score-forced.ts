import { comptonEnergyRatio } from '../../materials/index.js';
import { airKermaAt } from './air-kerma.js';
import { type AngleDensity, comptonDensity, rayleighDensity } from './angle-density.js';
import { cutoffEnergy_keV, nodesPerKeV, tableStride } from './energy-nodes.js';
import {
  collision,
  collisionLength,
  crossing,
  crossingLength,
  type EventBuffer,
  face,
  history,
  interaction,
} from './events.js';
import type { MatterTables } from './matter-tables.js';
import type { RayDepth } from './ray-depth.js';
import { fluenceWeight, quantityCount, type ResponseTable, respond } from './response-table.js';
import { type ScoreLayout, scatterAt } from './score-layout.js';

/**
 * Scatter at the field centre by forced detection: every collision sends its expected share of
 * scattered photons to the centre of the detector. Collisions nearer than `near_cm`, where that
 * share has no finite variance, are left to the photons that fly on from them into a square.
 */
export interface ForcedScoring {
  readonly kind: 'forced';
  readonly detector_cm: number;
  readonly near_cm: number;
  /** Half side of the square at the detector for near collisions, and of the one at the skin. */
  readonly halfRegion_cm: number;
  readonly halfSkinRegion_cm: number;
  readonly densities: readonly AngleDensity[];
}

/** What both scorers need. Scores are per cm² of detector. */
export interface ForcedTarget {
  readonly scoring: ForcedScoring;
  readonly response: ResponseTable;
  readonly airKerma: Float64Array;
  readonly layout: ScoreLayout;
  readonly scores: Float64Array;
}

/**
 * Next-event estimator. Per collision and process: share · p(Ω) · cosβ/d² · e^−τ · response, with
 * p per sr at the angle to the centre; a K photon already drawn goes isotropically.
 */
export function forcedScorer(
  target: ForcedTarget,
  matter: MatterTables,
  rayDepth: RayDepth,
): EventBuffer['take'] {
  const { scoring, response, layout, scores } = target;
  const { detector_cm, near_cm, densities } = scoring;
  const own = new Float64Array(quantityCount);
  const from = new Float64Array(3);
  const towards = new Float64Array(3);

  const score = (component: number, energy_keV: number, weight: number): void => {
    if (energy_keV < cutoffEnergy_keV || weight === 0) return;
    const arriving = weight * Math.exp(-rayDepth(from, towards, energy_keV));
    respond(response, energy_keV, towards[2], own);
    const to = scatterAt(layout, 0, 0, component - 1, 0);
    for (let q = 0; q < quantityCount; q++) scores[to + q] += arriving * own[q];
  };

  return (values, end) => {
    for (let at = 0; at < end; at += collisionLength) {
      const height = detector_cm - values[at + collision.z];
      if (height <= near_cm) continue;
      for (let axis = 0; axis < 3; axis++) from[axis] = values[at + collision.x + axis];
      const distance = Math.hypot(from[0], from[1], height);
      towards[0] = -from[0] / distance;
      towards[1] = -from[1] / distance;
      towards[2] = height / distance;
      const cosTheta =
        towards[0] * values[at + collision.u] +
        towards[1] * values[at + collision.v] +
        towards[2] * values[at + collision.w];
      const perArea = towards[2] / (distance * distance);
      const energy_keV = values[at + collision.energy];
      const past = values[at + collision.history];
      const substance = values[at + collision.matter];
      const shares = sharesAt(matter, substance, energy_keV);
      const density = densities[substance];
      const isFirst = past === history.primary;
      score(
        isFirst ? history.firstCompton : history.multiple,
        energy_keV * comptonEnergyRatio(energy_keV, cosTheta),
        shares.compton * perArea * comptonDensity(density, energy_keV, cosTheta),
      );
      score(
        isFirst ? history.firstRayleigh : history.multiple,
        energy_keV,
        shares.rayleigh * perArea * rayleighDensity(density, energy_keV, cosTheta),
      );
      if (values[at + collision.kind] === interaction.fluorescence) {
        score(history.multiple, values[at + collision.energyAfter], perArea / (4 * Math.PI));
      }
    }
  };
}

/** Crossings: photons from near collisions into the central square, and backscatter at the skin. */
export function nearScorer(target: ForcedTarget): EventBuffer['take'] {
  const { scoring, response, airKerma, layout, scores } = target;
  const { detector_cm, near_cm, halfRegion_cm, halfSkinRegion_cm } = scoring;
  const own = new Float64Array(quantityCount);
  const perArea = 1 / (4 * halfRegion_cm * halfRegion_cm);
  const perSkinArea = 1 / (4 * halfSkinRegion_cm * halfSkinRegion_cm);
  return (values, end) => {
    for (let at = 0; at < end; at += crossingLength) {
      const past = values[at + crossing.history];
      if (past === history.primary) continue;
      const which = values[at + crossing.face];
      const w = values[at + crossing.w];
      const energy_keV = values[at + crossing.energy];
      if (which === face.skin && isWithin(values, at, halfSkinRegion_cm, 0)) {
        scores[layout.backscatter] +=
          perSkinArea * airKermaAt(airKerma, energy_keV) * fluenceWeight(-w);
      } else if (
        which === face.detector &&
        detector_cm - values[at + crossing.lastZ] <= near_cm &&
        isWithin(values, at, halfRegion_cm, detector_cm - values[at + crossing.z])
      ) {
        respond(response, energy_keV, w, own);
        const to = scatterAt(layout, 0, 0, past - 1, 0);
        for (let q = 0; q < quantityCount; q++) scores[to + q] += perArea * own[q];
      }
    }
  };
}

// Whether the photon of a crossing, flown on by `height`, meets the central square.
function isWithin(values: Float64Array, at: number, half: number, height: number): boolean {
  const way = height === 0 ? 0 : height / values[at + crossing.w];
  const x = values[at + crossing.x] + way * values[at + crossing.u];
  const y = values[at + crossing.y] + way * values[at + crossing.v];
  return Math.abs(x) < half && Math.abs(y) < half;
}

function sharesAt(matter: MatterTables, substance: number, energy_keV: number) {
  const at = energy_keV * nodesPerKeV;
  const entry = substance * tableStride + (at | 0);
  const between = at - (at | 0);
  const read = (table: Float32Array) => table[entry] + between * (table[entry + 1] - table[entry]);
  const compton = read(matter.comptonShare);
  return { compton, rayleigh: read(matter.scatterShare) - compton };
}
