import { layoutOf } from './batch.js';
import type { TransportInput } from './input.js';
import { quantitiesPerSide, quantityNames } from './response-table.js';
import { components, scatterAt } from './score-layout.js';

/** Scores of a run's batches in batch order. */
export interface TransportScores {
  /** Photons flown so far. */
  readonly photons: number;
  /** False while batches are still out: a partial result, to be shown as such. */
  readonly isComplete: boolean;
  readonly batches: readonly { readonly photons: number; readonly scores: Float64Array }[];
}

/** A Monte Carlo value with its statistical standard error; null when one batch is all there is. */
export interface Estimated {
  readonly value: number;
  readonly standardError: number | null;
}

/**
 * A linear combination of scores per emitted photon, with its standard error from the spread of the
 * batches (batch means weighted by their photons).
 */
export function estimated(
  scores: TransportScores,
  combine: (batch: Float64Array) => number,
): Estimated {
  const { batches, photons } = scores;
  const sums = batches.map((batch) => combine(batch.scores));
  const value = sums.reduce((total, sum) => total + sum, 0) / photons;
  if (batches.length < 2) return { value, standardError: null };
  const spread = batches.reduce(
    (total, batch, i) => total + (batch.photons / photons) * (sums[i] / batch.photons - value) ** 2,
    0,
  );
  return { value, standardError: Math.sqrt(spread / (batches.length - 1)) };
}

/** Which scatter-to-primary ratio: every part has a default. */
export interface SprChoice {
  readonly quantity?: (typeof quantityNames)[number];
  readonly behindGrid?: boolean;
  /** Index of the gap scored. */
  readonly gap?: number;
  /** Index of the field scored, ascending; the last is infinite. */
  readonly field?: number;
  /** One component alone; all when left out. */
  readonly component?: (typeof components)[number];
}

/** Scatter over exact primary on the axis; of detector signal unless another quantity is chosen. */
export function scatterToPrimary(
  input: TransportInput,
  scores: TransportScores,
  choice: SprChoice = {},
): Estimated {
  const layout = layoutOf(input);
  const { gap = 0, field = 0, quantity = 'signal', behindGrid = false } = choice;
  const at = quantityNames.indexOf(quantity) + (behindGrid ? quantitiesPerSide : 0);
  const primary = input.primary.atDetector[at];
  const wanted = components.flatMap((name, component) =>
    choice.component === undefined || choice.component === name
      ? [scatterAt(layout, gap, field, component, at)]
      : [],
  );
  return estimated(
    scores,
    (batch) => wanted.reduce((sum, place) => sum + batch[place], 0) / primary,
  );
}

/**
 * B: air kerma of all photons at the skin over that of the primary, which has passed any support. As in
 * the estimate it counts scatter both ways: back from the patient, forward from a support before it.
 */
export function backscatterFactor(
  input: TransportInput,
  scores: TransportScores,
  field = 0,
): Estimated {
  const { backscatter } = layoutOf(input);
  const kerma = input.primary.kermaAtSkin;
  const excess = estimated(scores, (batch) => batch[backscatter + field] / kerma);
  return { value: 1 + excess.value, standardError: excess.standardError };
}

/** Energy absorbed in a layer of the patient per emitted photon, keV. */
export function layerEnergy_keV(
  input: TransportInput,
  scores: TransportScores,
  layer: number,
): Estimated {
  const { absorbed } = layoutOf(input);
  const { regions } = input.layers[layer];
  return estimated(scores, (batch) =>
    regions.reduce((sum, region) => sum + batch[absorbed + region], 0),
  );
}

/** Energy absorbed in all layers of the patient per emitted photon, keV. */
export function impartedEnergy_keV(input: TransportInput, scores: TransportScores): Estimated {
  const { absorbed } = layoutOf(input);
  const regions = input.layers.flatMap((layer) => layer.regions);
  return estimated(scores, (batch) =>
    regions.reduce((sum, region) => sum + batch[absorbed + region], 0),
  );
}

/** Energy absorbed in each tally box per emitted photon, keV. */
export function boxEnergies_keV(input: TransportInput, scores: TransportScores): Estimated[] {
  const { boxes } = layoutOf(input);
  return input.boxes.map((_, box) => estimated(scores, (batch) => batch[boxes + box]));
}
