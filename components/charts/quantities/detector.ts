import { inGroup } from './quantity.js';

/** What reaches the detector, and the noise it leaves. */
export const detectorQuantities = inGroup('detector', [
  {
    id: 'detectorAirKerma',
    name: 'Detector air kerma',
    unit: 'µGy',
    per: 'per frame',
    of: (e) => e.detector.airKerma_uGy,
    words: 'Primary and scatter behind the grid, before the detector cover, at the field centre.',
  },
  {
    id: 'absorbedFraction',
    name: 'Absorbed in the detector',
    unit: '',
    of: (e) => e.detector.absorbedFraction,
    words:
      'Share of the energy of the primary photons behind the grid that enters the signal; in a counting detector, of their number.',
  },
  {
    id: 'noise',
    name: 'Noise',
    unit: '',
    of: (e) => e.noise.total,
    words:
      'Standard deviation of the mean over the detail’s area, relative to the whole signal: quantum, electronic, structure and background together, of one displayed frame.',
  },
  {
    id: 'sdnr',
    name: 'SdNR',
    unit: '',
    of: (e) => e.sdnr,
    words: 'Detected contrast of the detail, as a size, over the noise of the mean over its area.',
  },
]);
