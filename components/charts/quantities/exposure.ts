import { inGroup } from './quantity.js';

/** What the generator delivers. */
export const exposureQuantities = inGroup('exposure', [
  {
    id: 'tubeLoad',
    name: 'Tube load',
    unit: 'mAs',
    per: 'per frame',
    of: (e) => e.exposure.tubeLoad_mAs,
    words:
      'Tube current times exposure time with which the control reaches what it holds, or as its curve sets it.',
  },
  {
    id: 'tubeCurrent',
    name: 'Tube current',
    unit: 'mA',
    of: (e) => e.exposure.tubeCurrent_mA,
    words: 'Tube load divided by exposure time, as the acquisition fixes one of the two.',
  },
  {
    id: 'exposureTime',
    name: 'Exposure time',
    unit: 'ms',
    per: 'per frame',
    of: (e) => e.exposure.exposureTime_ms,
    words: 'Tube load divided by tube current, as the acquisition fixes one of the two.',
  },
  {
    id: 'power',
    name: 'Power',
    unit: 'kW',
    of: (e) => e.exposure.power_kW,
    words: 'Tube current times potential.',
  },
]);
