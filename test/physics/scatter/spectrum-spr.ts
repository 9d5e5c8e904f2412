import { massEnergyAbsorptionOn } from '../../../materials/index.js';
import type { Spectrum } from '../../../physics/beam/index.js';
import type { DetectorResponse, GridTable } from '../../../physics/readout/index.js';
import {
  type DetectorScatter,
  responsesOn,
  type ScatterResponses,
} from '../../../physics/scatter/index.js';
import { linearCoefficients, slabsOf } from '../../../physics/scatter/slabs.js';
import type { Stack } from '../../../physics/stack/stack.js';
import { material } from './stacks.js';

/** Scatter-to-primary ratios without grid and behind it. */
export interface SpectrumSpr {
  readonly open: number;
  readonly behindGrid: number;
}

/** Scatter over primary of a beam, of detector signal or of air kerma at the detector. */
export function spectrumSpr(
  stack: Stack,
  responses: ScatterResponses,
  skin: Spectrum,
  detector: DetectorResponse,
  grid: GridTable,
  quantity: 'signal' | 'airKerma' = 'signal',
): SpectrumSpr {
  const energies = skin.energies_keV;
  const on = responsesOn(responses, energies);
  const inAir = massEnergyAbsorptionOn(material('air'), energies);
  const depth = new Float64Array(energies.length);
  for (const { material: matter, thickness_cm } of slabsOf(stack)) {
    const { attenuation } = linearCoefficients(matter, energies);
    for (let i = 0; i < depth.length; i++) depth[i] += attenuation[i] * thickness_cm;
  }
  const primary = energies.map((energy, i) => {
    const score = quantity === 'signal' ? detector.energyFraction(energy, 1) : inAir[i];
    return skin.fluence_per_mm2[i] * Math.exp(-depth[i]) * energy * score;
  });
  const behind = primary.map((value, i) => value * grid.primary(energies[i]));
  const ratio = (weights: Float64Array, scatter: DetectorScatter | null) => {
    const total = weights.reduce((sum, weight) => sum + weight, 0);
    return (
      weights.reduce((sum, weight, i) => sum + weight * (scatter?.[quantity][i] ?? 0), 0) / total
    );
  };
  return {
    open: ratio(primary, on.withoutGrid),
    behindGrid: ratio(behind, on.behindGrid),
  };
}
