import { type ParsedCase, parseCase } from '../../physics/case/parse.js';

/** A small invented case: 20 cm of water with a thin iodine slab in the middle. */
export const sampleJson = {
  format: 'stratabeam.case',
  version: 1,
  title: 'Water with iodine (invented)',
  room: {
    filters: [
      { name: 'none', layers: [] },
      { name: '0.1 Cu', layers: [{ material: 'copper', thickness_mm: 0.1 }] },
      { name: '0.3 Cu', layers: [{ material: 'copper', thickness_mm: 0.3 }] },
      { name: '0.9 Cu', layers: [{ material: 'copper', thickness_mm: 0.9 }] },
    ],
    grid: { ratio: 10, strips_per_cm: 40 },
  },
  patient: { layers: [{ name: 'water', material: 'water', thickness_mm: 200 }] },
  task: {
    detail: {
      shape: 'slab',
      inLayer: 'water',
      size_mm: 10,
      length_mm: 10,
      agent: { name: 'iodine', amount: { value: 10, unit: 'mg element/mL' } },
    },
  },
  techniques: [
    { name: 'Current', potential_kV: 80, control: { detectorAirKerma_uGy: 2.5 } },
    {
      name: 'Proposed',
      potential_kV: 70,
      filter: '0.3 Cu',
      control: { detectorAirKerma_uGy: 2.5 },
    },
  ],
};

type Json = Record<string, unknown>;

/** The sample with some of its parts replaced, deeply; arrays are replaced whole. */
export const sampleCase = (changes: Json = {}): ParsedCase => {
  const parsed = parseCase(merged(sampleJson, changes));
  if ('faults' in parsed) throw new Error(JSON.stringify(parsed.faults));
  return parsed;
};

const isObject = (value: unknown): value is Json =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const merged = (base: Json, changes: Json): Json => {
  const result: Json = { ...base };
  for (const [key, value] of Object.entries(changes)) {
    const before = result[key];
    result[key] = isObject(before) && isObject(value) ? merged(before, value) : value;
  }
  return result;
};
