import { layoutOf } from './batch.js';
import { face } from './events.js';
import type { TransportInput } from './input.js';
import { escapeCount, unscattered } from './kernel.js';
import {
  backscatterFactor,
  type Estimated,
  estimated,
  layerEnergy_keV,
  scatterToPrimary,
  type TransportScores,
} from './scores.js';

/** Where the emitted energy went, as fractions of it. `sum` is 1 but for rounding. */
export interface EnergyBalance {
  /** In the patient and everything else on the way. */
  readonly absorbed: number;
  readonly escapedEntrance: number;
  readonly escapedSide: number;
  readonly transmittedPrimary: number;
  readonly transmittedScatter: number;
  readonly sum: number;
}

/** Energy absorbed in one layer of the patient. */
export interface TransportLayer {
  readonly layer: string;
  /** Mean absorbed dose per incident air kerma at the skin on the axis, without backscatter. */
  readonly absorbedDose_mGy_per_mGyIncident: number;
  readonly absorbedDose_standardError: number | null;
  readonly energyPerPhoton_keV: number;
  /** Of `energyPerPhoton_keV`. */
  readonly standardError: number | null;
}

/** What the estimate of section `weigh` says of the same stack and beam, to stand beside. */
export interface TransportEstimate {
  readonly spr: number | null;
  readonly sprBehindGrid: number | null;
  readonly backscatterFactor: number | null;
  /** Absorbed over incident energy by layer. */
  readonly layerAbsorbedFraction: readonly number[] | null;
}

/** The answer to `transport`: Monte Carlo beside the estimate, every value with its standard error. */
export interface Transport {
  readonly technique: string;
  readonly size: string;
  readonly photons: number;
  readonly seed: number;
  /** False for what the batches so far say of a run under way. */
  readonly isComplete: boolean;
  /** Scatter over primary of detector signal at the field centre, without grid. */
  readonly spr: Estimated;
  /** Behind the grid; null without one. */
  readonly sprBehindGrid: Estimated | null;
  readonly scatterFraction: number;
  readonly components: {
    readonly firstCompton: Estimated;
    readonly firstRayleigh: Estimated;
    readonly multiple: Estimated;
  };
  readonly energyBalance: EnergyBalance;
  readonly backscatterFactor: Estimated;
  readonly layers: readonly TransportLayer[];
  readonly estimate: TransportEstimate | null;
  readonly photonsPerSecond: number | null;
}

/** What the caller knows of a run that the run does not. */
export interface TransportLabels {
  readonly technique: string;
  readonly size: string;
  readonly hasGrid: boolean;
  readonly estimate: TransportEstimate | null;
  /** Measured by the host, which has a clock; null when it did not. */
  readonly photonsPerSecond: number | null;
}

/** Reads the scores of the run's first field and gap. */
export function transportResult(
  input: TransportInput,
  scores: TransportScores,
  { technique, size, hasGrid, estimate, photonsPerSecond }: TransportLabels,
): Transport {
  const spr = scatterToPrimary(input, scores);
  const component = (name: 'firstCompton' | 'firstRayleigh' | 'multiple'): Estimated =>
    scatterToPrimary(input, scores, { component: name });
  return {
    technique,
    size,
    photons: scores.photons,
    seed: input.seed,
    isComplete: scores.isComplete,
    spr,
    sprBehindGrid: hasGrid ? scatterToPrimary(input, scores, { behindGrid: true }) : null,
    scatterFraction: spr.value / (1 + spr.value),
    components: {
      firstCompton: component('firstCompton'),
      firstRayleigh: component('firstRayleigh'),
      multiple: component('multiple'),
    },
    energyBalance: energyBalance(input, scores),
    backscatterFactor: backscatterFactor(input, scores),
    layers: input.layers.map((_, layer) => transportLayer(input, scores, layer)),
    estimate,
    photonsPerSecond,
  };
}

function transportLayer(
  input: TransportInput,
  scores: TransportScores,
  layer: number,
): TransportLayer {
  const { name, mass_g_per_cm2, area_cm2 } = input.layers[layer];
  const energy = layerEnergy_keV(input, scores, layer);
  const perEnergy = 1 / (mass_g_per_cm2 * area_cm2 * input.primary.kermaAtSkin);
  return {
    layer: name,
    absorbedDose_mGy_per_mGyIncident: energy.value * perEnergy,
    absorbedDose_standardError:
      energy.standardError === null ? null : energy.standardError * perEnergy,
    energyPerPhoton_keV: energy.value,
    standardError: energy.standardError,
  };
}

/** Where the emitted energy went: nothing may be missing. */
export function energyBalance(input: TransportInput, scores: TransportScores): EnergyBalance {
  const layout = layoutOf(input);
  const total = (from: number, to = from + 1): number =>
    estimated(scores, (batch) => batch.subarray(from, to).reduce((sum, part) => sum + part, 0))
      .value;
  const emitted = total(layout.emitted);
  const share = (from: number, to?: number): number => total(from, to) / emitted;
  return {
    absorbed: share(layout.absorbed, layout.escaped),
    escapedEntrance: share(layout.escaped + face.entrance),
    escapedSide: share(layout.escaped + face.side),
    transmittedPrimary: share(layout.escaped + unscattered),
    transmittedScatter: share(layout.escaped + face.detector),
    sum: share(layout.absorbed, layout.escaped + escapeCount),
  };
}
