import type { Evaluation } from '../../physics/results.js';
import type { SpineLayout } from './spine-layout.js';

/** Decades of photon fluence between full ink and bare paper. */
const decades = 4;
const darkest = 0.62;

export interface FluencePoint {
  readonly y: number;
  readonly fluence_per_mm2: number;
}

/**
 * Primary photons per mm² and frame where the beam meets tube, skin, every layer's exit face and the
 * detector, from the evaluation's transmissions by number and the inverse square law.
 */
export function fluenceAlong(
  evaluation: Evaluation,
  layout: SpineLayout,
  geometry: { readonly sourceToSkin_mm: number; readonly exitToDetector_mm: number; readonly layers_mm: readonly number[]; readonly parallel: boolean },
): FluencePoint[] {
  const atOneMetre = evaluation.beam.fluence_per_mm2_per_mAs * evaluation.exposure.tubeLoad_mAs;
  const spread = (distance_mm: number) => (geometry.parallel ? 1 : (1000 / distance_mm) ** 2);
  const skin = geometry.sourceToSkin_mm;
  const points = [{ y: layout.patient.top, fluence_per_mm2: atOneMetre * spread(skin) }];
  let depth = 0;
  let transmission = 1;
  evaluation.transmission.layers.forEach((layer, i) => {
    depth += geometry.layers_mm[i] ?? 0;
    transmission = layer.cumulativeByNumber;
    points.push({ y: layout.layers[i]?.bottom ?? layout.patient.bottom, fluence_per_mm2: atOneMetre * transmission * spread(skin + depth) });
  });
  const detector = atOneMetre * transmission * spread(skin + depth + geometry.exitToDetector_mm);
  return [...points, { y: layout.detector.top, fluence_per_mm2: detector }];
}

/**
 * Ink density by the logarithm of photons per mm²: `most` is the fluence of full ink, and every
 * factor of ten below it takes the same step toward bare paper.
 */
export const inkDensity = (fluence_per_mm2: number, most: number): number => {
  if (!(fluence_per_mm2 > 0) || !(most > 0)) return 0;
  return darkest * Math.max(0.04, 1 + Math.log10(fluence_per_mm2 / most) / decades);
};
