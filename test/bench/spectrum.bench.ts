import { type Spectrum, scaleSpectrum, withFluence } from '../../physics/beam/spectrum.js';
import type { Contest } from './bench.js';

const bins = 200;
const spectrum: Spectrum = {
  edges_keV: Float64Array.from({ length: bins + 1 }, (_, index) => index / 2),
  energies_keV: Float64Array.from({ length: bins }, (_, index) => index / 2 + 0.25),
  fluence_per_mm2: Float64Array.from({ length: bins }, (_, index) => index + 1),
};

const byLoop = (factor: number): Spectrum => {
  const fluence = new Float64Array(bins);
  for (let i = 0; i < bins; i++) fluence[i] = (spectrum.fluence_per_mm2[i] ?? 0) * factor;
  return withFluence(spectrum, fluence);
};

export const contests: readonly Contest[] = [
  {
    title: `scaling a spectrum of ${bins} channels`,
    contenders: [
      { name: 'scaleSpectrum', run: () => scaleSpectrum(spectrum, 1.5) },
      { name: 'a plain loop', run: () => byLoop(1.5) },
    ],
  },
];
