import { expect, it } from 'vitest';
import { readReference } from '../../reference/read-reference.js';
import { flyScatterRows, scatterRows } from './scatter-rows.js';

const tolerance = 0.03;

it('scatter of some water and PMMA slabs is within 3 % of the separately computed rows', () => {
  const rows = scatterRows().filter(
    ({ material, thickness_cm, energy_keV }) =>
      (material === 'water' && thickness_cm === 20 && energy_keV === 80) ||
      (material === 'pmma' && thickness_cm === 10 && [30, 60, 120].includes(energy_keV)),
  );
  expect(rows).toHaveLength(16);
  for (const row of flyScatterRows(rows, 150_000, 51)) {
    const { item, found, expected, foundByCount, expectedByCount } = row;
    // A short run: three standard errors are allowed beside the tolerance.
    const error = 3 * (found.standardError ?? 0);
    expect(Math.abs(found.value - expected), item).toBeLessThan(tolerance * expected + error);
    const countError = 3 * (foundByCount.standardError ?? 0);
    expect(Math.abs(foundByCount.value - expectedByCount), `${item} by count`).toBeLessThan(
      tolerance * expectedByCount + countError,
    );
  }
});

it('scatter of all slabs is within 3 % in the long run that is kept', () => {
  const rows = readReference('transport-scatter-spr.csv');
  expect(rows).toHaveLength(scatterRows().length);
  for (const { item, expected, found } of rows) {
    expect(Math.abs(Number(found) / Number(expected) - 1), item).toBeLessThan(tolerance);
  }
});
