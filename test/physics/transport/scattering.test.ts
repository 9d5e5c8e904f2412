import { describe, expect, it } from 'vitest';
import {
  formFactorSquaredPerGram,
  kleinNishinaShape,
  kShell,
  massAttenuation,
  partialCoefficients,
  scatteringFunctionPerGram,
} from '../../../materials/index.js';
import {
  angleDensity,
  comptonDensity,
  rayleighDensity,
} from '../../../physics/transport/angle-density.js';
import {
  quantileCount,
  rowCount,
  rowEnergies_keV,
} from '../../../physics/transport/angle-quantiles.js';
import { nodesPerKeV, tableStride } from '../../../physics/transport/energy-nodes.js';
import { matterTables } from '../../../physics/transport/matter-tables.js';
import { meanDeposits_keV } from '../../../physics/transport/mean-deposit.js';
import { named } from './slab-runs.js';

const water = named('water');
const iodine = named('iodine');
const matter = matterTables([water, iodine], true);
const hc_keV_angstrom = 12.398419843;

/** ∫ f dcosθ by midpoints, many of them near forward where form factors are steep. */
function overCosine(from: number, to: number, f: (cosTheta: number) => number): number {
  const steps = 4000;
  const a = Math.sqrt(1 - to);
  const b = Math.sqrt(1 - from);
  let sum = 0;
  for (let i = 0; i < steps; i++) {
    const root = a + ((b - a) * (i + 0.5)) / steps;
    sum += f(1 - root * root) * 2 * root;
  }
  return (sum * (b - a)) / steps;
}

const momentum = (energy_keV: number, cosTheta: number): number =>
  (Math.sqrt((1 - cosTheta) / 2) * energy_keV) / hc_keV_angstrom;
const compton = (energy_keV: number) => (cosTheta: number) =>
  kleinNishinaShape(energy_keV, cosTheta) *
  scatteringFunctionPerGram(water, momentum(energy_keV, cosTheta));
const rayleigh = (energy_keV: number) => (cosTheta: number) =>
  (1 + cosTheta * cosTheta) * formFactorSquaredPerGram(water, momentum(energy_keV, cosTheta));

describe('angles', () => {
  for (const row of [20, 40, 52, rowCount - 1]) {
    const energy_keV = rowEnergies_keV[row];
    for (const [process, shape, cosines] of [
      ['Compton', compton(energy_keV), matter.comptonCosines],
      ['Rayleigh', rayleigh(energy_keV), matter.rayleighCosines],
    ] as const) {
      it(`${process} quantiles at ${energy_keV.toFixed(1)} keV hold equal shares of the cross section`, () => {
        const whole = overCosine(-1, 1, shape);
        for (const k of [1, 16, 128, 224, 255]) {
          const cosine = cosines[row * quantileCount + k];
          expect(overCosine(cosine, 1, shape) / whole).toBeCloseTo(k / 256, 3);
        }
      });
    }
  }

  it('densities for forced detection integrate to one and follow the cross section', () => {
    const density = angleDensity(water);
    for (const energy_keV of [12.3, 33, 60, 141.7]) {
      for (const [found, shape] of [
        [comptonDensity, compton(energy_keV)],
        [rayleighDensity, rayleigh(energy_keV)],
      ] as const) {
        const at = (cosTheta: number) => found(density, energy_keV, cosTheta);
        expect(2 * Math.PI * overCosine(-1, 1, at)).toBeCloseTo(1, 3);
        const whole = 2 * Math.PI * overCosine(-1, 1, shape);
        for (const cosTheta of [-0.8, 0, 0.7, 0.95]) {
          expect(at(cosTheta) / (shape(cosTheta) / whole)).toBeCloseTo(1, 2);
        }
      }
    }
  });
});

describe('coefficients', () => {
  const at = (table: Float32Array, substance: number, energy_keV: number) =>
    table[substance * tableStride + Math.round(energy_keV * nodesPerKeV)];

  it('are those of the materials at the nodes', () => {
    for (const energy_keV of [1, 20, 60, 150]) {
      const expected = massAttenuation(water, energy_keV) * water.density_g_per_cm3;
      expect(at(matter.attenuation_per_cm, 0, energy_keV) / expected).toBeCloseTo(1, 6);
      const parts = partialCoefficients(water, energy_keV);
      expect(at(matter.comptonShare, 0, energy_keV)).toBeCloseTo(
        parts.incoherent_cm2_per_g / parts.massAttenuation_cm2_per_g,
        6,
      );
    }
  });

  it('let vacuum, the last of them, stop nothing', () => {
    expect(matter.names.at(-1)).toBe('vacuum');
    expect(at(matter.attenuation_per_cm, 2, 60)).toBe(0);
  });

  it('give K photons above the edge with probability (1 − 1/J)·ω, none below', () => {
    const shell = kShell(53);
    if (!shell) throw new Error('iodine has a K shell');
    const { emission } = matter.fluorescence;
    expect(emission[Math.floor(shell.edge_keV * nodesPerKeV)]).toBe(0);
    const expected = shell.yield * (1 - 1 / shell.jumpRatio);
    expect(emission[Math.ceil(shell.edge_keV * nodesPerKeV)]).toBeCloseTo(expected, 5);
    expect(emission[600]).toBeCloseTo(expected, 5);
  });

  it('give the mean energy a collision leaves: Compton recoil, and all but K photons otherwise', () => {
    const deposits = meanDeposits_keV(matter);
    const shape = compton(60);
    const recoil = (cosTheta: number) => 60 - 60 / (1 + (60 / 510.99895) * (1 - cosTheta));
    const meanRecoil = overCosine(-1, 1, (c) => shape(c) * recoil(c)) / overCosine(-1, 1, shape);
    const parts = partialCoefficients(water, 60);
    const expected =
      (parts.incoherent_cm2_per_g * meanRecoil + parts.photoelectric_cm2_per_g * 60) /
      parts.massAttenuation_cm2_per_g;
    expect(at(deposits, 0, 60) / expected).toBeCloseTo(1, 2);
    expect(at(deposits, 1, 60)).toBeLessThan(0.65 * 60);
  });
});
