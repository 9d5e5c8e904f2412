import { describe, expect, it } from 'vitest';
import { energyBalance } from '../../../physics/transport/index.js';
import { readReference } from '../../reference/read-reference.js';
import { case2Values, flyCase2 } from './tg195.js';

describe('AAPM Report 195 case 2 (recalled values)', () => {
  const run = flyCase2(200_000, 7);
  const [body, ...cubes] = case2Values(run);

  it('gives the energy imparted to the body within 0.5 %', () => {
    expect(body.tolerance).toBe(0.005);
    expect(body.found_eV.value / body.expected_eV).toBeGreaterThan(1 - body.tolerance);
    expect(body.found_eV.value / body.expected_eV).toBeLessThan(1 + body.tolerance);
  });

  it('gives the energy in each 3 cm cube within 4 standard errors of this short run', () => {
    expect(cubes).toHaveLength(9);
    for (const { item, expected_eV, found_eV } of cubes) {
      const off = (found_eV.value - expected_eV) / (found_eV.standardError ?? 0);
      expect(Math.abs(off), `${item}: ${found_eV.value}, ${expected_eV}`).toBeLessThan(4);
    }
  });

  it('gave body and cubes within their tolerances in the long run that is kept', () => {
    const rows = readReference('transport-tg195.csv');
    expect(rows).toHaveLength(10);
    for (const { item, expected_eV, found_eV, tolerance } of rows) {
      const ratio = Number(found_eV) / Number(expected_eV);
      expect(Math.abs(ratio - 1), item).toBeLessThan(Number(tolerance));
    }
  });

  it('loses no energy', () => {
    expect(energyBalance(run.input, run.scores).sum).toBeCloseTo(1, 10);
  });
});
