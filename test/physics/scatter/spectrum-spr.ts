import type { Spectrum } from '../../../physics/beam/index.js';
import type { DetectorResponse, GridTable } from '../../../physics/readout/index.js';
import { responsesOn, type ScatterResponses } from '../../../physics/scatter/index.js';
import { linearCoefficients, slabsOf } from '../../../physics/scatter/slabs.js';
import type { Stack } from '../../../physics/stack/stack.js';

/** Signal scatter-to-primary ratio of a beam, without and behind the grid. */
export function spectrumSpr(
  stack: Stack,
  responses: ScatterResponses,
  skin: Spectrum,
  detector: DetectorResponse,
  grid: GridTable,
): { open: number; behindGrid: number } {
  const on = responsesOn(responses, skin.energies_keV);
  const depth = new Float64Array(skin.energies_keV.length);
  for (const { material, thickness_cm } of slabsOf(stack)) {
    const { attenuation } = linearCoefficients(material, skin.energies_keV);
    for (let i = 0; i < depth.length; i++) depth[i] += attenuation[i] * thickness_cm;
  }
  const sums = { primary: 0, scatter: 0, primaryBehind: 0, scatterBehind: 0 };
  skin.energies_keV.forEach((energy, i) => {
    const signal =
      skin.fluence_per_mm2[i] * Math.exp(-depth[i]) * energy * detector.energyFraction(energy, 1);
    const behind = signal * grid.primary(energy);
    sums.primary += signal;
    sums.scatter += signal * on.withoutGrid.signal[i];
    sums.primaryBehind += behind;
    sums.scatterBehind += behind * (on.behindGrid?.signal[i] ?? 0);
  });
  return { open: sums.scatter / sums.primary, behindGrid: sums.scatterBehind / sums.primaryBehind };
}
