import { describe, expect, test } from 'vitest';
import { energyPerVacancy, linesOf } from '../../materials/fluorescence.js';
import { kShell } from '../../materials/index.js';

describe('the K shell', () => {
  test.each([
    // Kα1 lines: Bearden, Rev. Mod. Phys. 39 (1967) 78, recalled.
    [42, 17.479],
    [53, 28.612],
    [56, 32.194],
    [64, 42.996],
    [74, 59.318],
    [82, 74.969],
  ])(
    'of Z = %i emits Kα1 within 0.4 %% of %d keV, the difference of theoretical binding energies',
    (z, keV) => {
      const alpha1 = kShell(z)?.lines.find(({ name }) => name === 'K-L3');
      expect(Math.abs((alpha1?.energy_keV ?? 0) / keV - 1)).toBeLessThan(0.004);
    },
  );

  test.each(Array.from({ length: 82 }, (_, i) => i + 11))(
    'of Z = %i has shares that sum to 1, a yield below 1 and lines below its edge',
    (z) => {
      const shell = kShell(z);
      expect(shell?.lines.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
      expect(shell?.yield).toBeGreaterThan(0);
      expect(shell?.yield).toBeLessThan(1);
      expect(shell?.jumpRatio).toBeGreaterThan(4);
      for (const { energy_keV } of shell?.lines ?? []) {
        expect(energy_keV).toBeGreaterThan(0);
        expect(energy_keV).toBeLessThan(1.06 * (shell?.edge_keV ?? 0));
      }
    },
  );

  test('of iodine: edge 33.169 keV, yield 0.879, lines in proportion 100 : 54 : 28', () => {
    const shell = kShell(53);
    expect(shell?.edge_keV).toBe(33.169);
    expect(shell?.yield).toBeCloseTo(0.879, 3);
    const share = (...names: string[]) =>
      (shell?.lines ?? [])
        .filter(({ name }) => names.includes(name))
        .reduce((sum, l) => sum + l.share, 0);
    expect(share('K-L2') / share('K-L3')).toBeCloseTo(0.54, 2);
    expect(share('K-M2', 'K-M3') / share('K-L3')).toBeCloseTo(0.27, 1);
  });

  test('is absent where the K edge lies below 1 keV', () => {
    for (let z = 1; z <= 10; z++) expect(kShell(z)).toBeUndefined();
  });

  test('yields grow with Z', () => {
    const yields = Array.from({ length: 75 }, (_, i) => kShell(i + 11)?.yield ?? 0);
    expect(yields).toEqual([...yields].sort((a, b) => a - b));
  });
});

describe('a vacancy', () => {
  test('is followed by less fluorescence energy than its binding energy', () => {
    for (let z = 11; z <= 92; z++) {
      const [k, l1, l2, l3] = energyPerVacancy(z);
      expect(k).toBeLessThan((kShell(z)?.edge_keV ?? 0) * 1.06);
      expect(Math.max(l1, l2, l3)).toBeLessThan(k + 1e-12);
    }
  });

  test('in K of lead is followed by L photons worth a tenth of its K photons', () => {
    const own =
      (kShell(82)?.yield ?? 0) * linesOf(82, 0).reduce((s, l) => s + l.share * l.energy_keV, 0);
    const cascade = energyPerVacancy(82)[0] - own;
    expect(cascade / own).toBeGreaterThan(0.03);
    expect(cascade / own).toBeLessThan(0.12);
  });
});
