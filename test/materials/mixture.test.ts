import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  massAttenuation,
  massEnergyAbsorption,
  materialFromFractions,
  materialNames,
  mixture,
} from '../../materials/index.js';
import { known } from './element-material.js';

const materials = fc.constantFrom(...materialNames).map(known);
const energies_keV = fc.double({ min: 1, max: 20_000, noNaN: true });
const shares = fc.double({ min: 0.001, max: 0.999, noNaN: true });

describe('a mixture', () => {
  test('attenuates as its parts by mass, at every energy', () => {
    fc.assert(
      fc.property(materials, materials, shares, energies_keV, (a, b, share, energy_keV) => {
        const mixed = mixture('mixed', [
          { material: a, massFraction: share },
          { material: b, massFraction: 1 - share },
        ]);
        const expected =
          share * massAttenuation(a, energy_keV) + (1 - share) * massAttenuation(b, energy_keV);
        expect(massAttenuation(mixed, energy_keV) / expected).toBeCloseTo(1, 12);
      }),
    );
  });

  test('absorbs energy as its parts by mass, to 3 MeV', () => {
    fc.assert(
      fc.property(materials, materials, shares, energies_keV, (a, b, share, energy_keV) => {
        const mixed = mixture('mixed', [
          { material: a, massFraction: share },
          { material: b, massFraction: 1 - share },
        ]);
        const parts = [a, b].map((part) => massEnergyAbsorption(part, energy_keV));
        const whole = massEnergyAbsorption(mixed, energy_keV);
        if (energy_keV > 3000) expect([whole, ...parts]).toEqual([null, null, null]);
        const expected = share * (parts[0] ?? 1) + (1 - share) * (parts[1] ?? 1);
        expect((whole ?? 1) / expected).toBeCloseTo(1, 12);
      }),
    );
  });

  test('without a density adds volumes; with one takes it', () => {
    const parts = [
      { material: known('water'), massFraction: 1 },
      { material: known('lead'), massFraction: 3 },
    ];
    expect(mixture('slurry', parts).density_g_per_cm3).toBeCloseTo(4 / (1 + 3 / 11.35), 12);
    expect(mixture('slurry', parts, 2.5).density_g_per_cm3).toBe(2.5);
  });

  test('of nothing is refused', () => {
    expect(() => mixture('nothing', [], 1)).toThrow(/must name at least one element/);
  });
});

describe('a user’s material', () => {
  const foam = {
    name: 'pad foam',
    density_g_per_cm3: 0.05,
    massFractions: { H: 0.08, C: 0.61, N: 0.06, O: 0.25 },
  };

  test('keeps its name, density and shares and says that it was entered', () => {
    const material = materialFromFractions(foam);
    expect(material).toMatchObject({
      name: 'pad foam',
      density_g_per_cm3: 0.05,
      provenance: 'entered',
    });
    expect(
      material.massFractions.map(({ z, massFraction }) => [z, +massFraction.toFixed(12)]),
    ).toEqual([
      [1, 0.08],
      [6, 0.61],
      [7, 0.06],
      [8, 0.25],
    ]);
  });

  test.each([
    [
      { ...foam, massFractions: { H: 0.5, Zz: 0.5 } },
      /pad foam: massFractions: "Zz": is no element/,
    ],
    [{ ...foam, massFractions: { H: 0.5, O: 0.1 } }, /sum 0\.6000: must be 1 within 0\.02/],
    [
      { ...foam, massFractions: { H: 1.1, O: -0.1 } },
      /massFractions\.O: -0\.1: must be 0 or positive/,
    ],
    [{ ...foam, massFractions: { H: Number.NaN } }, /must be/],
    [{ ...foam, massFractions: {} }, /must name at least one element/],
    [{ ...foam, density_g_per_cm3: -2 }, /density_g_per_cm3: -2: must be above 0/],
  ])('%j is refused with value, rule and remedy', (entered, words) => {
    expect(() => materialFromFractions(entered)).toThrow(words);
  });
});
