import { expect, it } from 'vitest';
import { readReference } from '../../reference/read-reference.js';
import { deviation } from './slab-runs.js';
import { stackNumbers, type UnitNumber, waterNumbers } from './unit-numbers.js';

const photons = 400_000;

/** Fails with every number beside its reference, standard errors included. */
function expectAgreement(numbers: readonly UnitNumber[]): void {
  const lines = numbers.map(({ name, expected, expectedError, found }) => {
    const off = deviation(found, expected, expectedError);
    return {
      line: `${name}: ${found.value} (${found.standardError}), ${expected}: ${off} s.e.`,
      off,
    };
  });
  const far = lines.filter(({ off }) => !(Math.abs(off) < 4)).map(({ line }) => line);
  expect(far).toEqual([]);
  const chiSquare = lines.reduce((sum, { off }) => sum + off * off, 0);
  // Wilson & Hilferty 1931: the value that χ² of n terms exceeds once in a thousand times.
  const n = lines.length;
  const limit = n * (1 - 2 / (9 * n) + 3.09 * Math.sqrt(2 / (9 * n))) ** 3;
  expect(chiSquare, lines.map(({ line }) => line).join('\n')).toBeLessThan(limit);
}

it('water slabs give the separately computed scatter, imparted energy and first collisions', () => {
  expectAgreement(waterNumbers(photons, 11));
});

it('the seven-layer stack gives the separately computed energy by layer, K photons or not', () => {
  expectAgreement(stackNumbers(photons, 31));
});

it('all of them agree within 4 standard errors in the long run that is kept', () => {
  const rows = readReference('transport-unit-numbers.csv');
  expectAgreement(
    rows.map(({ item, expected, expectedError, found, foundError }) => ({
      name: item,
      expected: Number(expected),
      expectedError: Number(expectedError),
      found: { value: Number(found), standardError: Number(foundError) },
    })),
  );
  expect(rows).toHaveLength(31);
});
