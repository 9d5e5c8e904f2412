import type { MaterialLayer } from '../../../physics/beam/index.js';
import {
  airKerma_uGy,
  airPath,
  attenuate,
  halfValueLayer_mm,
  scaleSpectrum,
  tungstenSpectrum,
} from '../../../physics/beam/index.js';
import type { Reading } from '../../../physics/case/schema.js';
import { aluminium, copper } from './helpers.js';

/** The tube as entered, before its readings correct it. */
export const tube = {
  anodeAngle_deg: 12,
  ripple_percent: 0,
  outputFactor: 0.87,
  inherentFilter: [{ material: 'aluminium', thickness_mm: 2.5 }],
};
export const filters: ReadonlyMap<string, readonly MaterialLayer[]> = new Map([
  ['none', []],
  ['0.2 Cu', [{ material: copper, thickness_mm: 0.2 }]],
]);
export const vacuum = { air: false };

/** What a tube is in truth, whatever is entered for it. */
export interface Truth {
  readonly anodeAngle_deg: number;
  readonly inherent_mmAl: number;
  readonly potentialError: number;
  readonly ripple_percent: number;
  readonly output: number;
}
/** A tube the model does not quite describe: steeper anode, rippling and 1.5 % high in potential. */
export const steep: Truth = {
  anodeAngle_deg: 16,
  inherent_mmAl: 3,
  potentialError: 0.015,
  ripple_percent: 5,
  output: 0.8,
};
/** The same tube as far as the model can describe it. */
export const exact: Truth = { ...steep, anodeAngle_deg: 12, potentialError: 0, ripple_percent: 0 };

/** What a meter would read on that tube, in vacuum unless in air; uncertain to 3 %. */
export function readingOf(
  truth: Truth,
  potential_kV: number,
  filter = 'none',
  distance_mm = 1000,
  air = false,
): Reading {
  const bare = tungstenSpectrum({
    potential_kV: potential_kV * (1 + truth.potentialError),
    anodeAngle_deg: truth.anodeAngle_deg,
    ripple_percent: truth.ripple_percent,
  });
  const behind = attenuate(bare, [
    { material: aluminium, thickness_mm: truth.inherent_mmAl },
    ...(filters.get(filter) ?? []),
    ...(air ? [airPath(distance_mm)] : []),
  ]);
  const beam = scaleSpectrum(behind, truth.output * (1000 / distance_mm) ** 2);
  return {
    potential_kV,
    filter,
    halfValueLayer_mmAl: halfValueLayer_mm(beam, aluminium),
    airKerma_uGy_per_mAs: airKerma_uGy(beam),
    distance_mm,
    relativeUncertainty_percent: 3,
  };
}
