import { airKermaAt } from './air-kerma.js';
import { crossing, crossingLength, type EventBuffer, face } from './events.js';
import { flightLength } from './flight.js';
import { fluenceWeight, quantityCount, respond } from './response-table.js';
import type { ForcedTarget } from './score-forced.js';
import { scatterAt } from './score-layout.js';

/** Crossings: photons from near collisions into the central square, and scatter at the skin, both ways. */
export function nearScorer(target: ForcedTarget): EventBuffer['take'] {
  const { scoring, response, airKerma, layout, scores } = target;
  const { detector_cm, near_cm, halfRegion_cm, halfSkinRegion_cm } = scoring;
  const own = new Float64Array(quantityCount);
  const photon = new Float64Array(flightLength);
  const perArea = 1 / (4 * halfRegion_cm * halfRegion_cm);
  const perSkinArea = 1 / (4 * halfSkinRegion_cm * halfSkinRegion_cm);
  return (values, end) => {
    for (let at = 0; at < end; at += crossingLength) {
      const past = values[at + crossing.history];
      const which = values[at + crossing.face];
      const w = values[at + crossing.w];
      const energy_keV = values[at + crossing.energy];
      if (which === face.skin && isWithin(values, at, halfSkinRegion_cm, 0)) {
        scores[layout.backscatter] +=
          perSkinArea * airKermaAt(airKerma, energy_keV) * fluenceWeight(Math.abs(w));
      } else if (
        which === face.detector &&
        detector_cm - values[at + crossing.lastZ] <= near_cm &&
        isWithin(values, at, halfRegion_cm, detector_cm - values[at + crossing.z])
      ) {
        for (let i = 0; i < photon.length; i++) photon[i] = values[at + crossing.x + i];
        respond(response, photon, own);
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
