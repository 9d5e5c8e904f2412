import type { Json } from '../../store/path.js';

/** Where a case begins that is not opened from a file: a water slab, one vessel, two techniques. */
export const newCase: Json = {
  format: 'stratabeam.case',
  version: 1,
  title: 'New case',
  question: '',
  room: {
    filters: [
      { name: 'none', layers: [] },
      { name: '0.2 Cu', layers: [{ material: 'copper', thickness_mm: 0.2 }] },
    ],
    grid: { ratio: 10, strips_per_cm: 40 },
  },
  patient: { layers: [{ name: 'body', material: 'water', thickness_mm: 200 }] },
  task: {
    detail: {
      shape: 'vessel',
      inLayer: 'body',
      size_mm: 5,
      agent: { name: 'iodine', amount: { value: 20, unit: 'mg element/mL' } },
    },
  },
  techniques: [
    { name: 'Current', potential_kV: 80, control: { detectorAirKerma_uGy: 2.5 } },
    {
      name: 'Proposed',
      potential_kV: 70,
      filter: '0.2 Cu',
      control: { detectorAirKerma_uGy: 2.5 },
    },
  ],
};
