/** Atomic weights and densities against a second table, test/reference/xraylib-elements.csv. */
import { describe, expect, test } from 'vitest';
import { elementBySymbol, elementByZ, elements } from '../../materials/index.js';
import { readReference } from '../reference/read-reference.js';
import { deviation_percent } from './deviation.js';

const second = readReference('xraylib-elements.csv').map((row) => ({
  z: Number(row.z),
  symbol: row.symbol,
  atomicWeight_g_per_mol: Number(row.atomicWeight_g_per_mol),
  density_g_per_cm3: Number(row.density_g_per_cm3),
}));

/**
 * Where the second table is no judge: Tc and Pm have no standard weight (another isotope stands
 * there), and it repeats the weight of Er for Tm. Carbon is graphite of another density there; At and
 * Fr have no measured density.
 */
const otherWeight = ['Tc', 'Pm', 'Tm'];
const otherDensity = ['C', 'At', 'Fr'];

test.each(second)('Z = $z is $symbol', ({ z, symbol }) => {
  expect(elementByZ(z).symbol).toBe(symbol);
  expect(elementBySymbol(symbol)).toBe(elementByZ(z));
});

test.each(second.filter(({ symbol }) => !otherWeight.includes(symbol)))(
  'the atomic weight of $symbol agrees with $atomicWeight_g_per_mol within 0.3 %',
  ({ z, atomicWeight_g_per_mol }) => {
    const off = deviation_percent(elementByZ(z).atomicWeight_g_per_mol, atomicWeight_g_per_mol);
    expect(Math.abs(off)).toBeLessThan(0.3);
  },
);

test.each(second.filter(({ symbol }) => !otherDensity.includes(symbol)))(
  'the density of $symbol agrees with $density_g_per_cm3 g/cm³ within 1 %',
  ({ z, density_g_per_cm3 }) => {
    const off = deviation_percent(elementByZ(z).density_g_per_cm3, density_g_per_cm3);
    expect(Math.abs(off)).toBeLessThan(1);
  },
);

describe('elements', () => {
  test('are 92, ascending in weight but for the four pairs every chemist knows', () => {
    expect(elements).toHaveLength(92);
    const falls = elements.filter(
      ({ z, atomicWeight_g_per_mol: weight }) =>
        z > 1 && weight < elementByZ(z - 1).atomicWeight_g_per_mol,
    );
    // Ar/K, Co/Ni, Te/I and Th/Pa.
    expect(falls.map(({ symbol }) => symbol)).toEqual(['K', 'Ni', 'I', 'Pa']);
  });

  test.each([0, 93, 1.5, Number.NaN])('there is no element of Z = %s, and it says so', (z) => {
    expect(() => elementByZ(z)).toThrow(/must be a whole number from 1 to 92/);
  });

  test('symbols need their capitals', () => {
    expect(elementBySymbol('cu')).toBeUndefined();
  });
});
