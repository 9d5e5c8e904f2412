/** Absorption edges against Bearden & Burr, Rev. Mod. Phys. 39 (1967) 125: test/reference/edges.csv. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  absorptionEdges,
  elementByZ,
  massAttenuation,
  mixture,
  namedMaterial,
} from '../../materials/index.js';
import { readReference } from '../reference/read-reference.js';
import { deviation_percent } from './deviation.js';
import { elementMaterial } from './element-material.js';

const published = readReference('edges.csv');
const kEdges = published
  .filter(({ set }) => set === 'K edge')
  .map(({ conditions, value }) => ({ z: Number(conditions.slice(2)), energy_keV: Number(value) }));

test.each(kEdges)('the K edge of Z = $z lies within 10 eV of $energy_keV keV', (edge) => {
  const [k] = absorptionEdges(elementMaterial(edge.z), 1, 150).filter(({ shell }) => shell === 'K');
  expect(Math.abs(k.energy_keV - edge.energy_keV)).toBeLessThanOrEqual(0.01);
});

test('iodine attenuates 6.553 below and 35.82 cm²/g above its K edge', () => {
  const row = published.find(({ item }) => item === 'mu/rho iodine jump at K edge');
  const [below, above] = (row?.value ?? '').split(' -> ').map(Number);
  const iodine = elementMaterial(53);
  const [k] = absorptionEdges(iodine, 33, 34);
  const justBelow = massAttenuation(iodine, k.energy_keV * (1 - 1e-9));
  expect(Math.abs(deviation_percent(justBelow, below))).toBeLessThan(1);
  expect(Math.abs(deviation_percent(massAttenuation(iodine, k.energy_keV), above))).toBeLessThan(1);
});

describe('absorptionEdges', () => {
  test('lists the edges of every element of a material in order of energy', () => {
    const iodide = namedMaterial('caesium iodide');
    const edges = iodide ? absorptionEdges(iodide, 5, 150) : [];
    expect(edges.map(({ z, shell }) => `${elementByZ(z).symbol} ${shell}`)).toEqual([
      'Cs L3',
      'I L1',
      'Cs L2',
      'Cs L1',
      'I K',
      'Cs K',
    ]);
  });

  test('names lead’s shells from K to M5 as the tables of binding energies do', () => {
    const shells = absorptionEdges(elementMaterial(82), 1, 150).map(({ shell }) => shell);
    expect(shells).toEqual(['M5', 'M4', 'M3', 'M2', 'M1', 'L3', 'L2', 'L1', 'K']);
  });

  test('takes both ends of its range in', () => {
    const iodine = elementMaterial(53);
    expect(absorptionEdges(iodine, 33.169, 33.169)).toHaveLength(1);
    expect(absorptionEdges(iodine, 33.17, 150)).toEqual([]);
  });
});

test('the upper value holds at an edge, and the coefficient is continuous from above', () => {
  fc.assert(
    fc.property(fc.integer({ min: 11, max: 92 }), (z) => {
      const element = elementMaterial(z);
      for (const { energy_keV } of absorptionEdges(element, 1.001, 150)) {
        const at = massAttenuation(element, energy_keV);
        expect(at).toBeGreaterThan(massAttenuation(element, energy_keV * (1 - 1e-9)));
        const above = massAttenuation(element, energy_keV * (1 + 1e-9));
        expect(Math.abs(above / at - 1)).toBeLessThan(1e-6);
      }
    }),
  );
});

test('an edge of a trace shows in a mixture by its share', () => {
  const water = namedMaterial('water');
  if (!water) throw new Error('water is a named material');
  const solution = mixture('solution', [
    { material: water, massFraction: 0.99 },
    { material: elementMaterial(53), massFraction: 0.01 },
  ]);
  const step = massAttenuation(solution, 33.169) - massAttenuation(solution, 33.168999);
  expect(step).toBeCloseTo(0.01 * (35.82 - 6.553), 3);
});
