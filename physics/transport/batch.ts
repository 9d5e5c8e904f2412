import { collisionLength, crossingLength, drain, type EventBuffer, eventBuffer } from './events.js';
import { regionCount } from './geometry.js';
import type { TransportInput } from './input.js';
import { escapeCount, flyPhotons } from './kernel.js';
import { meanDeposits_keV } from './mean-deposit.js';
import { type RandomStream, randomStream, splitmix32 } from './random.js';
import { rayDepth } from './ray-depth.js';
import { boxScorer } from './score-boxes.js';
import { displacementScorer, nestFields } from './score-displacement.js';
import { forcedScorer } from './score-forced.js';
import { type ScoreLayout, scoreLayout } from './score-layout.js';
import { nearScorer } from './score-near.js';

/** Where the scores of a run's batches stand. */
export function layoutOf(input: TransportInput): ScoreLayout {
  const { scoring, geometry, boxes } = input;
  const isPencil = scoring?.kind === 'displacement';
  return scoreLayout({
    gaps: isPencil ? scoring.gaps_cm.length : 1,
    fields: isPencil ? scoring.halfFields_cm.length + 1 : 1,
    regions: regionCount(geometry),
    boxes: boxes.length,
  });
}

/**
 * Flies one batch: photons with the random stream of `batch`. The scores (sums over the photons)
 * depend on the input and the batch number alone.
 */
export function transportBatch(
  input: TransportInput,
  batch: { readonly index: number; readonly photons: number },
): Float64Array {
  const layout = layoutOf(input);
  const scores = new Float64Array(layout.length);
  const { crossings, collisions } = scorers(input, batch.index, layout, scores);
  scores[layout.emitted] = flyPhotons(input, randomStream(input.seed, batch.index), batch.photons, {
    absorbed_keV: scores.subarray(layout.absorbed, layout.escaped),
    escaped_keV: scores.subarray(layout.escaped, layout.escaped + escapeCount),
    crossings,
    everyEnd: false,
    collisions,
  });
  drain(crossings);
  if (collisions) drain(collisions);
  if (input.scoring?.kind === 'displacement') nestFields(layout, scores);
  return scores;
}

function scorers(
  input: TransportInput,
  batch: number,
  layout: ScoreLayout,
  scores: Float64Array,
): { crossings: EventBuffer; collisions: EventBuffer | null } {
  const { scoring, response, airKerma, matter, geometry, boxes } = input;
  const takers: EventBuffer['take'][] = [];
  if (boxes.length > 0)
    takers.push(boxScorer(boxes, meanDeposits_keV(matter), layout.boxes, scores));
  if (scoring === null) {
    return { crossings: eventBuffer(crossingLength, ignore), collisions: collisionsTo(takers) };
  }
  if (scoring.kind === 'displacement') {
    const take = displacementScorer(scoring, response, airKerma, layout, scores);
    return { crossings: eventBuffer(crossingLength, take), collisions: collisionsTo(takers) };
  }
  const target = { scoring, response, airKerma, layout, scores };
  takers.push(
    forcedScorer(target, matter, rayDepth(geometry, matter), rouletteStream(input, batch)),
  );
  return {
    crossings: eventBuffer(crossingLength, nearScorer(target)),
    collisions: collisionsTo(takers),
  };
}

const ignore = (): void => undefined;

/** Draws of the scorer come from a stream of their own and leave the photons' paths as they are. */
const rouletteStream = (input: TransportInput, batch: number): RandomStream =>
  randomStream(splitmix32(input.seed, -1), batch);

function collisionsTo(takers: readonly EventBuffer['take'][]): EventBuffer | null {
  if (takers.length === 0) return null;
  return eventBuffer(collisionLength, (values, end) => {
    for (const take of takers) take(values, end);
  });
}
