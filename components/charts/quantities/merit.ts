import { inGroup } from './quantity.js';

/** SdNR² over what it cost. */
export const meritQuantities = inGroup('merit', [
  {
    id: 'meritKerma',
    name: 'SdNR² per incident air kerma',
    unit: '/mGy',
    of: (e) => e.figureOfMerit.perIncidentAirKerma_per_mGy,
    words:
      'SdNR squared over incident air kerma, both of one frame: does not change with load while noise is quantum noise.',
  },
  {
    id: 'meritKap',
    name: 'SdNR² per kerma–area product',
    unit: '/(Gy cm²)',
    of: (e) => e.figureOfMerit.perKermaAreaProduct_per_Gycm2,
    words: 'SdNR squared over kerma–area product per frame.',
  },
  {
    id: 'meritTube',
    name: 'SdNR² per tube energy',
    unit: '/kJ',
    of: (e) => e.figureOfMerit.perTubeEnergy_per_kJ,
    words: 'SdNR squared over the electrical energy put into the tube per frame.',
  },
]);
