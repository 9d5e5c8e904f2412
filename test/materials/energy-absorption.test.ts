import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { integrateFraction } from '../../materials/energy-absorption.js';
import { meanFluorescenceEnergy_keV } from '../../materials/fluorescence.js';
import {
  comptonEnergyFraction,
  comptonEnergyRatio,
  energyAbsorptionCaution,
  kleinNishinaShape,
  massAttenuation,
  massEnergyAbsorption,
  massEnergyAbsorptionOn,
  partialCoefficients,
} from '../../materials/index.js';
import { elementMaterial, known } from './element-material.js';

const elements = fc.integer({ min: 1, max: 92 });
const energies_keV = fc.double({ min: 1, max: 3000, noNaN: true });

describe('μen/ρ', () => {
  test('is positive and below μ/ρ', () => {
    fc.assert(
      fc.property(elements, energies_keV, (z, energy_keV) => {
        const element = elementMaterial(z);
        const absorbed = massEnergyAbsorption(element, energy_keV) ?? Number.NaN;
        expect(absorbed).toBeGreaterThan(0);
        expect(absorbed).toBeLessThan(massAttenuation(element, energy_keV));
      }),
    );
  });

  test('is null above 3 MeV, and the grid form refuses such a grid', () => {
    expect(massEnergyAbsorption(known('water'), 3000)).not.toBeNull();
    expect(massEnergyAbsorption(known('water'), 3000.1)).toBeNull();
    expect(() => massEnergyAbsorptionOn(known('water'), Float64Array.of(3001))).toThrow(/3000 keV/);
  });

  test('drops at an edge, where fluorescence begins to escape, by less than μ/ρ rises', () => {
    const iodine = elementMaterial(53);
    const below = massEnergyAbsorption(iodine, 33.1689) ?? 0;
    const above = massEnergyAbsorption(iodine, 33.169) ?? 0;
    const rise = massAttenuation(iodine, 33.169) / massAttenuation(iodine, 33.1689);
    expect(above / below).toBeGreaterThan(1);
    expect(above / below).toBeLessThan(rise / 2);
  });
});

/** Mean share of energy a free electron gets, by midpoints in cosθ (the code integrates in sin θ/2). */
function freeElectronFraction(energy_keV: number): number {
  const steps = 4000;
  let weight = 0;
  let handedOver = 0;
  for (let i = 0; i < steps; i++) {
    const cosTheta = -1 + (2 * (i + 0.5)) / steps;
    const w = kleinNishinaShape(energy_keV, cosTheta);
    weight += w;
    handedOver += w * (1 - comptonEnergyRatio(energy_keV, cosTheta));
  }
  return handedOver / weight;
}

describe('the energy handed over in Compton scattering', () => {
  test('is that of the free electron at high energy: 0.4404 of 1 MeV (integral of Klein–Nishina)', () => {
    expect(freeElectronFraction(1000)).toBeCloseTo(0.4404, 3);
    expect(comptonEnergyFraction(6, 1000) / freeElectronFraction(1000)).toBeCloseTo(1, 3);
  });

  test('makes μen/ρ of air 1.0 to 1.4 % more than free electrons would at 50 to 100 keV', () => {
    const air = known('air');
    for (const energy_keV of [50, 60, 80, 100]) {
      const bound = massEnergyAbsorption(air, energy_keV) ?? Number.NaN;
      const difference = air.massFractions.reduce((sum, { z, massFraction }) => {
        const { incoherent_cm2_per_g } = partialCoefficients(elementMaterial(z), energy_keV);
        const more = comptonEnergyFraction(z, energy_keV) - freeElectronFraction(energy_keV);
        return sum + massFraction * incoherent_cm2_per_g * more;
      }, 0);
      expect((100 * difference) / bound).toBeGreaterThan(0.95);
      expect((100 * difference) / bound).toBeLessThan(1.45);
    }
  });

  test('is interpolated within 3e-4 of the integral', () => {
    fc.assert(
      fc.property(elements, energies_keV, (z, energy_keV) => {
        const exact = integrateFraction(z, energy_keV, 1500);
        expect(Math.abs(comptonEnergyFraction(z, energy_keV) / exact - 1)).toBeLessThan(3e-4);
      }),
      { numRuns: 60 },
    );
  });
});

describe('the mean fluorescence energy', () => {
  test('is below the photon’s energy and never negative', () => {
    fc.assert(
      fc.property(elements, energies_keV, (z, energy_keV) => {
        const mean = meanFluorescenceEnergy_keV(z, energy_keV);
        expect(mean).toBeGreaterThanOrEqual(0);
        expect(mean).toBeLessThan(energy_keV);
      }),
    );
  });

  test('is nothing below the L edges and grows at each edge above', () => {
    const means = [4, 4.6, 4.9, 5.2, 33.169].map((energy) =>
      meanFluorescenceEnergy_keV(53, energy),
    );
    expect(means[0]).toBe(0);
    expect(means).toEqual([...means].sort((a, b) => a - b));
    expect(means[4]).toBeGreaterThan(20);
  });
});

describe('energyAbsorptionCaution', () => {
  test('is silent for light matter and for tube energies', () => {
    expect(energyAbsorptionCaution(known('water'), 1000)).toBeNull();
    expect(energyAbsorptionCaution(known('lead'), 150)).toBeNull();
  });
  test('names bremsstrahlung and the element above 150 keV', () => {
    expect(energyAbsorptionCaution(known('caesium iodide'), 662)).toMatch(
      /bremsstrahlung from caesium/,
    );
  });
  test('says that nothing is given above 3 MeV', () => {
    expect(energyAbsorptionCaution(known('water'), 5000)).toMatch(/not given above 3000 keV/);
  });
});

test('pair production hands over all but the rest energy of the pair', () => {
  const lead = known('lead');
  const { pair_cm2_per_g } = partialCoefficients(lead, 2500);
  expect(pair_cm2_per_g).toBeGreaterThan(0);
  expect(massEnergyAbsorption(lead, 2500) ?? 0).toBeGreaterThan(pair_cm2_per_g * (1 - 1022 / 2500));
});
