import { type Case, caseSchema } from '../../../physics/case/schema.js';

/** An invented case for component tests; it describes no real room, patient or protocol. */
export const sampleDocument = {
  format: 'stratabeam.case',
  version: 1,
  title: 'Aortography, abdomen (invented)',
  question: 'May the adult run move from 80 kV to 70 kV with 0.2 mm copper?',
  room: {
    name: 'Room A (invented)',
    tube: { potential_kV: { min: 50, max: 125, step: 1 } },
    filters: [
      { name: 'none', layers: [] },
      { name: '0.2 Cu', layers: [{ material: 'copper', thickness_mm: 0.2 }] },
      { name: '0.9 Cu', layers: [{ material: 'copper', thickness_mm: 0.9 }] },
    ],
    support: [{ material: 'carbon fibre', thickness_mm: 2, side: 'entrance' }],
    geometry: { sourceToDetector_mm: 1150 },
    grid: { ratio: 10, strips_per_cm: 40 },
    readings: [
      { potential_kV: 60, halfValueLayer_mmAl: 2.24, airKerma_uGy_per_mAs: 33.1 },
      { potential_kV: 80, halfValueLayer_mmAl: 2.95, airKerma_uGy_per_mAs: 62 },
    ],
  },
  patient: {
    layers: [
      { name: 'front', material: 'adipose', thickness_mm: 20, growthShare: 0.3 },
      { name: 'abdomen', material: 'soft tissue', thickness_mm: 170, growthShare: 0.7 },
      { name: 'spine', material: 'cortical bone', thickness_mm: 12, growthShare: 0 },
    ],
    sizes: [
      { name: 'median', thickness_mm: 202, weight: 3 },
      { name: 'large', thickness_mm: 290, weight: 1 },
    ],
  },
  task: {
    detail: {
      shape: 'vessel',
      inLayer: 'abdomen',
      depthInLayer_mm: 85,
      size_mm: 6,
      reference: 'blood',
      agent: { name: 'iodine', amount: { value: 120, unit: 'mg element/mL' }, carrier: 'blood' },
    },
  },
  techniques: [
    {
      name: 'Current',
      potential_kV: 80,
      filter: 'none',
      acquisition: {
        mode: 'subtraction',
        frames: 12,
        frameRate_per_s: 3,
        maskFrames: 1,
        fixed: { exposureTime_ms: 80 },
      },
      control: { detectorAirKerma_uGy: 2.5 },
    },
    {
      name: 'Proposed',
      potential_kV: 70,
      filter: '0.2 Cu',
      acquisition: {
        mode: 'subtraction',
        frames: 12,
        frameRate_per_s: 3,
        maskFrames: 1,
        fixed: { exposureTime_ms: 80 },
      },
      control: { detectorAirKerma_uGy: 2.5 },
    },
  ],
};

export const sampleCase: Case = caseSchema.parse(sampleDocument);
