/** Laws of the coefficients, and facts of the trade that need materials only. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { elementTableOf } from '../../materials/element-tables.js';
import {
  absorptionEdges,
  electrons_per_g,
  massAttenuation,
  massAttenuationOn,
  massEnergyAbsorption,
  massEnergyAbsorptionOn,
  materialNames,
  partialCoefficients,
  partialCoefficientsOn,
} from '../../materials/index.js';
import { elementMaterial, known } from './element-material.js';

const elements = fc.integer({ min: 1, max: 92 });
const energies_keV = fc.double({ min: 1, max: 20_000, noNaN: true });
const materials = fc.constantFrom(...materialNames).map(known);

describe('coefficients', () => {
  test('are positive and add up to the total', () => {
    fc.assert(
      fc.property(elements, energies_keV, (z, energy_keV) => {
        const c = partialCoefficients(elementMaterial(z), energy_keV);
        const { coherent_cm2_per_g, incoherent_cm2_per_g, photoelectric_cm2_per_g } = c;
        for (const part of [coherent_cm2_per_g, incoherent_cm2_per_g, photoelectric_cm2_per_g]) {
          expect(part).toBeGreaterThan(0);
        }
        expect(c.massAttenuation_cm2_per_g).toBe(
          coherent_cm2_per_g + incoherent_cm2_per_g + photoelectric_cm2_per_g + c.pair_cm2_per_g,
        );
      }),
    );
  });

  test('return the published value at every published energy', () => {
    for (let z = 1; z <= 92; z++) {
      const table = elementTableOf(z);
      table.energies_keV.forEach((energy_keV, i) => {
        if (table.energies_keV[i + 1] === energy_keV) return;
        const { photoelectric_cm2_per_g } = partialCoefficients(elementMaterial(z), energy_keV);
        expect(photoelectric_cm2_per_g / table.photoelectric[i]).toBeCloseTo(1, 9);
      });
    }
  });

  test('of the photoelectric effect stay between their neighbouring nodes, never across an edge', () => {
    fc.assert(
      fc.property(elements, energies_keV, (z, energy_keV) => {
        const { energies_keV: nodes, photoelectric } = elementTableOf(z);
        const i = nodes.findLastIndex((node) => node <= energy_keV);
        const pair = [photoelectric[i], photoelectric[Math.min(i + 1, nodes.length - 1)]];
        const value = partialCoefficients(elementMaterial(z), energy_keV).photoelectric_cm2_per_g;
        expect(value).toBeGreaterThanOrEqual(Math.min(...pair) * (1 - 1e-9));
        expect(value).toBeLessThanOrEqual(Math.max(...pair) * (1 + 1e-9));
      }),
    );
  });

  test('fall between edges from 5 keV to 1 MeV', () => {
    fc.assert(
      fc.property(elements, fc.double({ min: 5, max: 1000, noNaN: true }), (z, energy_keV) => {
        const element = elementMaterial(z);
        const next = energy_keV * 1.02;
        fc.pre(absorptionEdges(element, energy_keV, next).length === 0);
        expect(massAttenuation(element, next)).toBeLessThan(massAttenuation(element, energy_keV));
      }),
    );
  });

  test.each([0.999, 20_001, Number.NaN, -5])(
    'at %s keV are refused in plain words',
    (energy_keV) => {
      expect(() => massAttenuation(known('water'), energy_keV)).toThrow(/must be 1 to 20000/);
    },
  );
});

describe('on a grid', () => {
  const grid = Float64Array.from({ length: 290 }, (_, i) => 5.25 + i / 2);

  test('every column equals the single values', () => {
    fc.assert(
      fc.property(materials, fc.integer({ min: 0, max: grid.length - 1 }), (material, i) => {
        const single = partialCoefficients(material, grid[i]);
        const parts = partialCoefficientsOn(material, grid);
        expect(parts.coherent[i] / single.coherent_cm2_per_g).toBeCloseTo(1, 12);
        expect(parts.incoherent[i] / single.incoherent_cm2_per_g).toBeCloseTo(1, 12);
        expect(parts.photoelectric[i] / single.photoelectric_cm2_per_g).toBeCloseTo(1, 12);
        expect(massAttenuationOn(material, grid)[i] / single.massAttenuation_cm2_per_g).toBeCloseTo(
          1,
          12,
        );
        const absorbed = massEnergyAbsorption(material, grid[i]) ?? Number.NaN;
        expect(massEnergyAbsorptionOn(material, grid)[i] / absorbed).toBeCloseTo(1, 12);
      }),
    );
  });

  test('a material and a grid give the same array again', () => {
    const water = known('water');
    expect(massAttenuationOn(water, grid)).toBe(massAttenuationOn(water, grid));
    expect(partialCoefficientsOn(water, grid)).toBe(partialCoefficientsOn(water, grid));
    expect(massAttenuationOn(water, grid.slice())).not.toBe(massAttenuationOn(water, grid));
  });
});

describe('facts of the trade (common practice, no source)', () => {
  const linear_per_cm = (name: string, energy_keV: number) =>
    massAttenuation(known(name), energy_keV) * known(name).density_g_per_cm3;

  test('at 1.33 MeV the half-value layer of water is 11.2 cm, the tenth-value layer of lead 36.2 mm', () => {
    expect(Math.abs(Math.LN2 / linear_per_cm('water', 1332.5) / 11.2 - 1)).toBeLessThan(0.02);
    expect(Math.abs((10 * Math.LN10) / linear_per_cm('lead', 1332.5) / 36.2 - 1)).toBeLessThan(
      0.02,
    );
  });

  test('the photoelectric coefficient grows as Z^3.2 to Z^3.6, to one decimal, from carbon to copper at 20 to 100 keV', () => {
    for (const energy_keV of [20, 40, 60, 80, 100]) {
      const [carbon, copper] = [6, 29].map(
        (z) => partialCoefficients(elementMaterial(z), energy_keV).photoelectric_cm2_per_g,
      );
      const power = Math.log(copper / carbon) / Math.log(29 / 6);
      expect(power).toBeGreaterThan(3.15);
      expect(power).toBeLessThan(3.65);
    }
  });

  test.each([
    ['soft tissue', 28.5],
    ['adipose', 23.7],
    ['cortical bone', 55],
  ])('in %s Compton and photoelectric interactions are equal at %d keV', (name, equal_keV) => {
    const excess = (energy_keV: number) => {
      const c = partialCoefficients(known(name), energy_keV);
      return c.incoherent_cm2_per_g - c.photoelectric_cm2_per_g;
    };
    let [low, high] = [10, 100];
    while (high - low > 1e-4) {
      const middle = (low + high) / 2;
      if (excess(middle) < 0) low = middle;
      else high = middle;
    }
    expect(Math.abs(low - equal_keV)).toBeLessThan(0.02 * equal_keV);
  });

  test('per electron incoherent scattering hardly depends on Z: within 7 % of carbon to Ca from 60 keV', () => {
    const perElectron = (z: number, energy_keV: number) =>
      partialCoefficients(elementMaterial(z), energy_keV).incoherent_cm2_per_g /
      electrons_per_g(elementMaterial(z));
    for (const energy_keV of [60, 80, 100, 150]) {
      for (let z = 6; z <= 20; z++) {
        expect(Math.abs(perElectron(z, energy_keV) / perElectron(6, energy_keV) - 1)).toBeLessThan(
          0.07,
        );
      }
    }
  });

  test('pair production needs 1.022 MeV', () => {
    for (const z of [1, 8, 29, 82]) {
      expect(partialCoefficients(elementMaterial(z), 1021.9).pair_cm2_per_g).toBe(0);
      expect(partialCoefficients(elementMaterial(z), 1023).pair_cm2_per_g).toBeGreaterThan(0);
    }
  });
});
