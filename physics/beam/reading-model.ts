import type { Reading, Tube } from '../case/schema.js';
import { airKerma_uGy } from './air-kerma.js';
import { airPath } from './air-path.js';
import { aluminiumForHalfValueLayer_mm } from './aluminium-equivalent.js';
import { attenuate, type MaterialLayer } from './attenuate.js';
import { halfValueLayer_mm } from './half-value-layer.js';
import { kEdges_keV } from './k-edges.js';
import { referenceMaterial } from './reference-materials.js';
import { type Spectrum, scaleSpectrum } from './spectrum.js';
import { outputDistance_mm, tungstenSpectrum } from './tube-spectrum.js';

/** A reading's beam as the model makes it with output scale 1, before the inherent filter. */
export interface ModelledReading {
  /** Index among the room's readings. */
  readonly index: number;
  readonly reading: Reading;
  readonly beam: Spectrum;
}

/**
 * The beam that reaches a reading's meter: the tube's spectrum at its potential behind the named
 * filter, by the inverse square of its distance and, with air, the air on the way.
 */
export function modelReading(
  tube: Pick<Tube, 'anodeAngle_deg' | 'ripple_percent'>,
  reading: Reading,
  index: number,
  filterLayers: readonly MaterialLayer[],
  air: boolean,
): ModelledReading {
  const layers = air ? [...filterLayers, airPath(reading.distance_mm)] : filterLayers;
  const bare = tungstenSpectrum({
    potential_kV: reading.potential_kV,
    anodeAngle_deg: tube.anodeAngle_deg,
    ripple_percent: tube.ripple_percent,
    extraEdges_keV: kEdges_keV(filterLayers.map(({ material }) => material)),
  });
  const inverseSquare = (outputDistance_mm / reading.distance_mm) ** 2;
  return { index, reading, beam: scaleSpectrum(attenuate(bare, layers), inverseSquare) };
}

/** First half-value layer at a reading's place behind an inherent filter, mm Al. */
export const modelledHalfValueLayer_mmAl = (
  modelled: ModelledReading,
  inherent_mmAl: number,
): number =>
  // A tube beam is never empty, so a half-value layer exists.
  halfValueLayer_mm(behindInherent(modelled, inherent_mmAl), referenceMaterial('aluminium')) ?? 0;

/** Output at a reading's place behind an inherent filter, with output scale 1. */
export const modelledOutput_uGy_per_mAs = (
  modelled: ModelledReading,
  inherent_mmAl: number,
): number => airKerma_uGy(behindInherent(modelled, inherent_mmAl));

const behindInherent = ({ beam }: ModelledReading, inherent_mmAl: number): Spectrum =>
  attenuate(beam, [{ material: referenceMaterial('aluminium'), thickness_mm: inherent_mmAl }]);

/** Inherent aluminium that gives the reading its half-value layer; null where there is none. */
export const inherentFor = ({ beam, reading }: ModelledReading): number | null =>
  reading.halfValueLayer_mmAl === null
    ? null
    : aluminiumForHalfValueLayer_mm(beam, reading.halfValueLayer_mmAl);
