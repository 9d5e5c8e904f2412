import { comptonEnergyRatio } from '../../materials/index.js';
import { type AngleDensity, comptonDensity, rayleighDensity } from './angle-density.js';
import { nodesPerKeV, tableStride } from './energy-nodes.js';
import { collision, collisionLength, type EventBuffer, history, interaction } from './events.js';
import { flight, flightLength } from './flight.js';
import type { MatterTables } from './matter-tables.js';
import { nextUniform, type RandomStream } from './random.js';
import type { RayDepth } from './ray-depth.js';
import { quantityCount, type ResponseTable, respond } from './response-table.js';
import { type ScoreLayout, scatterAt } from './score-layout.js';
import { type WorthTable, worthAt } from './worth.js';

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
  readonly worth: WorthTable;
}

/** What both scorers need. Scores are per cm² of detector. */
export interface ForcedTarget {
  readonly scoring: ForcedScoring;
  readonly response: ResponseTable;
  readonly airKerma: Float64Array;
  readonly layout: ScoreLayout;
  readonly scores: Float64Array;
}

/** What one collision sends to the centre: at most one photon per process, three numbers each. */
const sent = { component: 0, energy: 1, weight: 2 } as const;
const sentLength = 3;

/**
 * Next-event estimator. Per collision and process: share · p(Ω) · cosβ/d² · e^−τ · response, with
 * p per sr at the angle to the centre; a K photon already drawn goes isotropically. Collisions of
 * little worth are scored seldom and count for more (Russian roulette by `worth`).
 */
export function forcedScorer(
  target: ForcedTarget,
  matter: MatterTables,
  rayDepth: RayDepth,
  stream: RandomStream,
): EventBuffer['take'] {
  const { scoring, response, layout, scores } = target;
  const { detector_cm, near_cm, densities, worth } = scoring;
  const own = new Float64Array(quantityCount);
  const ray = new Float64Array(flightLength);
  const photons = new Float64Array(3 * sentLength);

  return (values, end) => {
    for (let at = 0; at < end; at += collisionLength) {
      const x = values[at + collision.x];
      const y = values[at + collision.y];
      const z = values[at + collision.z];
      const height = detector_cm - z;
      if (height <= near_cm) continue;
      const distance = Math.sqrt(x * x + y * y + height * height);
      const cosBeta = height / distance;
      const kept = Math.min(1, worthAt(worth, z) * cosBeta * cosBeta * cosBeta);
      if (kept < 1 && nextUniform(stream) > kept) continue;
      ray[flight.x] = x;
      ray[flight.y] = y;
      ray[flight.z] = z;
      ray[flight.u] = -x / distance;
      ray[flight.v] = -y / distance;
      ray[flight.w] = cosBeta;
      const perArea = cosBeta / (distance * distance * kept);
      const count = sendPhotons(values, at, ray, perArea, matter, densities, photons);
      for (let i = 0; i < count * sentLength; i += sentLength) {
        ray[flight.energy] = photons[i + sent.energy];
        rayDepth(ray);
        const arriving = photons[i + sent.weight] * Math.exp(-ray[flight.path]);
        respond(response, ray, own);
        const to = scatterAt(layout, 0, 0, photons[i + sent.component] - 1, 0);
        for (let q = 0; q < quantityCount; q++) scores[to + q] += arriving * own[q];
      }
    }
  };
}

// Fills `photons` with what a collision sends along `ray`; returns how many.
function sendPhotons(
  values: Float64Array,
  at: number,
  ray: Float64Array,
  perArea: number,
  matter: MatterTables,
  densities: readonly AngleDensity[],
  photons: Float64Array,
): number {
  const energy_keV = values[at + collision.energy];
  const substance = values[at + collision.matter];
  const density = densities[substance];
  const isFirst = values[at + collision.history] === history.primary;
  const cosTheta =
    ray[flight.u] * values[at + collision.u] +
    ray[flight.v] * values[at + collision.v] +
    ray[flight.w] * values[at + collision.w];
  const node = energy_keV * nodesPerKeV;
  const entry = substance * tableStride + (node | 0);
  const compton = between(matter.comptonShare, entry, node);
  const rayleigh = between(matter.scatterShare, entry, node) - compton;
  photons[sent.component] = isFirst ? history.firstCompton : history.multiple;
  photons[sent.energy] = energy_keV * comptonEnergyRatio(energy_keV, cosTheta);
  photons[sent.weight] = compton * perArea * comptonDensity(density, energy_keV, cosTheta);
  const second = sentLength;
  photons[second + sent.component] = isFirst ? history.firstRayleigh : history.multiple;
  photons[second + sent.energy] = energy_keV;
  photons[second + sent.weight] =
    rayleigh * perArea * rayleighDensity(density, energy_keV, cosTheta);
  if (values[at + collision.kind] !== interaction.fluorescence) return 2;
  const third = 2 * sentLength;
  photons[third + sent.component] = history.multiple;
  photons[third + sent.energy] = values[at + collision.energyAfter];
  photons[third + sent.weight] = perArea / (4 * Math.PI);
  return 3;
}

const between = (table: Float32Array, entry: number, node: number): number =>
  table[entry] + (node - (node | 0)) * (table[entry + 1] - table[entry]);
