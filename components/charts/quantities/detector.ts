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
    words: 'Share of the primary photons’ energy that the detector absorbs.',
  },
  {
    id: 'noise',
    name: 'Noise',
    unit: '',
    of: (e) => e.noise.total,
    words:
      'Relative standard deviation of the signal over the detail: quantum, electronic, structure and background together.',
  },
  {
    id: 'sdnr',
    name: 'SdNR',
    unit: '',
    of: (e) => e.sdnr,
    words: 'Signal difference to noise ratio of the detail over its own area.',
  },
]);
