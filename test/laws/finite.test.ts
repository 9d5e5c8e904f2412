import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseCase } from '../../physics/case/parse.js';
import { weigh } from '../../physics/weigh.js';
import { sampleJson } from '../physics/sample-case.js';

const materials = ['water', 'cortical bone', 'lead', 'aluminium', 'air', 'lung', 'barium'];

const anyLayer = fc.record({
  material: fc.constantFrom(...materials),
  thickness_mm: fc.double({ min: 0.1, max: 300, noNaN: true }),
});

const anyDetail = fc.oneof(
  fc.record({
    shape: fc.constantFrom('vessel', 'slab', 'coat'),
    agent: fc.constantFrom(
      { name: 'iodine', amount: { value: 350, unit: 'mg element/mL' } },
      { name: 'barium sulfate', amount: { value: 250, unit: '% w/v' } },
      { name: 'carbon dioxide', amount: { value: 0, unit: 'mg element/mL' } },
    ),
  }),
  fc.record({
    shape: fc.constant('insert'),
    material: fc.constantFrom('air', 'lead', 'cortical bone', 'water'),
  }),
);

const anyCase = fc
  .record({
    layers: fc.array(anyLayer, { minLength: 1, maxLength: 4 }),
    detail: anyDetail,
    share: fc.double({ min: 0.05, max: 1, noNaN: true }),
    potential_kV: fc.integer({ min: 21, max: 150 }),
    load_mAs: fc.double({ min: 1e-3, max: 1e4, noNaN: true }),
    reference: fc.constantFrom('layer', 'blood', 'air'),
  })
  .map(({ layers, detail, share, potential_kV, load_mAs, reference }) => ({
    ...sampleJson,
    room: {
      ...sampleJson.room,
      geometry: { sourceToDetector_mm: 3000 },
      // Few settings, so that looking for the nearest allowed one is quick.
      tube: { potential_kV: { min: 20, max: 150, step: 65 } },
    },
    patient: { layers: layers.map((layer, i) => ({ name: `layer ${i}`, ...layer })) },
    task: {
      detail: {
        ...detail,
        inLayer: 'layer 0',
        size_mm: share * layers[0].thickness_mm,
        length_mm: 10,
        reference,
      },
    },
    techniques: [
      { name: 'Current', potential_kV, control: { tubeLoad_mAs: load_mAs } },
      { name: 'Proposed', potential_kV, filter: '0.9 Cu', control: { detectorAirKerma_uGy: 1 } },
    ],
  }));

const numbers = (value: unknown, path: string): [string, number][] =>
  typeof value === 'number'
    ? [[path, value]]
    : value && typeof value === 'object'
      ? Object.entries(value).flatMap(([key, part]) => numbers(part, `${path}.${key}`))
      : [];

describe('an answer', () => {
  it('never holds a number that is not finite, whatever lies in the beam', () => {
    fc.assert(
      fc.property(anyCase, (json) => {
        const parsed = parseCase(json);
        if ('faults' in parsed) return;
        const answer = weigh(parsed);
        expect(numbers(answer, 'answer').filter(([, value]) => !Number.isFinite(value))).toEqual(
          [],
        );
        // What cannot be computed is said, not left out in silence.
        if (answer.evaluations.length < 2) {
          expect(answer.findings.some(({ severity }) => severity === 'limit')).toBe(true);
        }
      }),
      { numRuns: 15, seed: 20261201 },
    );
  }, 60_000);
});
