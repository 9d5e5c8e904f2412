import { airKermaAt } from './air-kerma.js';
import { crossing, crossingLength, type EventBuffer, face } from './events.js';
import { flightLength } from './flight.js';
import { fluenceWeight, quantityCount, type ResponseTable, respond } from './response-table.js';
import { componentCount, type ScoreLayout, scatterAt } from './score-layout.js';

/**
 * Fields and gaps scored from one pencil. In laterally infinite slabs the scatter that a field
 * sends to its centre equals the scatter that a pencil sends into the field (translation and
 * mirror invariance), so exit displacements give every field size and, projected on, every gap.
 */
export interface DisplacementScoring {
  readonly kind: 'displacement';
  readonly gaps_cm: Float64Array;
  /** Half widths, ascending; the infinite field is always added. */
  readonly halfFields_cm: Float64Array;
  /** Width over height of every field. */
  readonly aspectRatio: number;
}

/**
 * Adds crossings to the scores, each in the smallest field that holds it; `nestFields` then makes
 * them totals. Air kerma over all scattered passages through the skin counts into the
 * backscatter factor, downward ones (support above the patient) as upward ones.
 */
export function displacementScorer(
  scoring: DisplacementScoring,
  response: ResponseTable,
  airKerma: Float64Array,
  layout: ScoreLayout,
  scores: Float64Array,
): EventBuffer['take'] {
  const { gaps_cm } = scoring;
  const own = new Float64Array(quantityCount);
  const photon = new Float64Array(flightLength);
  return (values, end) => {
    for (let at = 0; at < end; at += crossingLength) {
      const past = values[at + crossing.history];
      const x = values[at + crossing.x];
      const y = values[at + crossing.y];
      const w = values[at + crossing.w];
      const energy_keV = values[at + crossing.energy];
      if (values[at + crossing.face] === face.skin) {
        const kerma = airKermaAt(airKerma, energy_keV) * fluenceWeight(Math.abs(w));
        scores[layout.backscatter + smallestField(scoring, x, y)] += kerma;
      } else if (values[at + crossing.face] === face.detector) {
        for (let i = 0; i < photon.length; i++) photon[i] = values[at + crossing.x + i];
        respond(response, photon, own);
        const acrossX = values[at + crossing.u] / w;
        const acrossY = values[at + crossing.v] / w;
        for (let gap = 0; gap < gaps_cm.length; gap++) {
          const way = gaps_cm[gap];
          const field = smallestField(scoring, x + way * acrossX, y + way * acrossY);
          const to = scatterAt(layout, gap, field, past - 1, 0);
          for (let q = 0; q < quantityCount; q++) scores[to + q] += own[q];
        }
      }
    }
  };
}

function smallestField(scoring: DisplacementScoring, x: number, y: number): number {
  const { halfFields_cm, aspectRatio } = scoring;
  const reach = Math.max(Math.abs(x), Math.abs(y) * aspectRatio);
  let field = 0;
  while (field < halfFields_cm.length && reach >= halfFields_cm[field]) field++;
  return field;
}

/** Turns scores per smallest field into scores within each field. */
export function nestFields(layout: ScoreLayout, scores: Float64Array): void {
  const perField = componentCount * quantityCount;
  for (let field = 1; field < layout.fields; field++) {
    scores[layout.backscatter + field] += scores[layout.backscatter + field - 1];
    for (let gap = 0; gap < layout.gaps; gap++) {
      const at = scatterAt(layout, gap, field, 0, 0);
      for (let i = 0; i < perField; i++) scores[at + i] += scores[at - perField + i];
    }
  }
}
