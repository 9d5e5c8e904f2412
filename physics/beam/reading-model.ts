import type { Reading, Tube } from '../case/schema.js';
import { airKerma_uGy } from './air-kerma.js';
import { airPath } from './air-path.js';
import { aluminiumForHalfValueLayer_mm } from './aluminium-equivalent.js';
import { attenuate, type MaterialLayer } from './attenuate.js';
import { halfValueLayer_mm } from './half-value-layer.js';
import { kEdges_keV } from './k-edges.js';
import { referenceMaterial } from './reference-materials.js';
import { type Spectrum, scaleSpectrum } from './spectrum.js';
import { tungstenSpectrum } from './tube-spectrum.js';

/** Distance at which the model gives the output. */
const outputDistance_mm = 1000;

/** A reading's beam as the model makes it with output scale 1, before the inherent filter. */
export interface ModelledReading {
  /** Index among the room's readings. */
  readonly index: number;
  readonly reading: Reading;
  readonly beam: Spectrum;
}

/** What the model says at a reading's place with `inherent_mmAl` of aluminium and output scale 1. */
export interface ModelledValues {
  readonly halfValueLayer_mmAl: number;
  readonly airKerma_uGy_per_mAs: number;
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

/** Half-value layer and output of a modelled reading behind an inherent filter. */
export function modelledValues({ beam }: ModelledReading, inherent_mmAl: number): ModelledValues {
  const aluminium = referenceMaterial('aluminium');
  const filtered = attenuate(beam, [{ material: aluminium, thickness_mm: inherent_mmAl }]);
  return {
    // A tube beam is never empty, so a half-value layer exists.
    halfValueLayer_mmAl: halfValueLayer_mm(filtered, aluminium) ?? 0,
    airKerma_uGy_per_mAs: airKerma_uGy(filtered),
  };
}

/** Inherent aluminium that gives the reading its half-value layer; null where there is none. */
export const inherentFor = ({ beam, reading }: ModelledReading): number | null =>
  reading.halfValueLayer_mmAl === null
    ? null
    : aluminiumForHalfValueLayer_mm(beam, reading.halfValueLayer_mmAl);
