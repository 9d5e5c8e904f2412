/** Detectors against `detectors.csv`, the escape of K photons, and laws of the response. */
import fc from 'fast-check';
import { describe, expect, it, test } from 'vitest';
import { kShell, massAttenuation } from '../../../materials/index.js';
import { energyGrid } from '../../../physics/beam/index.js';
import { type Detector, detectorSchema } from '../../../physics/case/schema.js';
import {
  type DetectorResponse,
  detectorResponse,
  slabEscape,
} from '../../../physics/readout/index.js';
import { readReference } from '../../reference/read-reference.js';
import { material } from '../scatter/stacks.js';

const detectorOf = (entered: Partial<Detector>): DetectorResponse =>
  detectorResponse(detectorSchema.parse(entered), material);

const rows = readReference('detectors.csv');

const nameOf: readonly (readonly [RegExp, string])[] = [
  [/^CsI/, 'caesium iodide'],
  [/^Gd2O2S/, 'gadolinium oxysulfide'],
  [/^a-Se/, 'amorphous selenium'],
  [/^CdTe/, 'cadmium telluride'],
];

describe('absorption (detectors.csv, derived there from NIST/XCOM)', () => {
  const absorption = rows.filter(({ set }) => set === 'absorption');

  test.each(absorption)(
    '$item is $value within $tolerance',
    ({ item, value, conditions, tolerance }) => {
      const name = nameOf.find(([pattern]) => pattern.test(item))?.[1] ?? '';
      const arealDensity_mg_per_cm2 = Number(/areal density (\d+)/.exec(conditions)?.[1]);
      const energy_keV = Number(/ (\d+) keV/.exec(item)?.[1]);
      const own = detectorOf({ material: name, arealDensity_mg_per_cm2 }).efficiency(energy_keV, 1);
      expect(Math.abs(own / Number(value) - 1)).toBeLessThan(Number.parseFloat(tolerance) / 100);
    },
  );
});

describe('K fluorescence (detectors.csv, from xraylib)', () => {
  /** Mean energy of the lines that fill K from one shell. */
  const meanLine_keV = (z: number, shell: string): number => {
    const lines = (kShell(z)?.lines ?? []).filter(({ name }) => name.startsWith(`K-${shell}`));
    const share = lines.reduce((sum, line) => sum + line.share, 0);
    return lines.reduce((sum, line) => sum + line.share * line.energy_keV, 0) / share;
  };

  test.each([
    ['iodine', 53, 28.5, 32.3, 0.882],
    ['caesium', 55, 30.9, 35.0, 0.894],
    ['gadolinium', 64, 42.8, 48.7, 0.932],
    ['selenium', 34, 11.2, 12.5, 0.6],
  ] as const)('of %s: lines within 0.1 keV, yield within 0.01', (_name, z, alpha, beta, yieldK) => {
    expect(Math.abs(meanLine_keV(z, 'L') - alpha)).toBeLessThan(0.1);
    expect(Math.abs(meanLine_keV(z, 'M') - beta)).toBeLessThan(0.1);
    expect(Math.abs((kShell(z)?.yield ?? 0) - yieldK)).toBeLessThan(0.01);
  });
});

describe('escape of a photon born in a slab', () => {
  /** The same by stepping depth and direction. */
  const byBruteForce = (depth: number, lineDepth: number): number => {
    const n = 600;
    let sum = 0;
    let weight = 0;
    for (let i = 0; i < n; i++) {
      const s = (i + 0.5) / n;
      const born = Math.exp(-depth * s);
      weight += born;
      for (let j = 0; j < n; j++) {
        const u = (j + 0.5) / n;
        sum +=
          (born * (Math.exp((-lineDepth * s) / u) + Math.exp((-lineDepth * (1 - s)) / u))) /
          (2 * n);
      }
    }
    return sum / weight;
  };

  it('agrees with stepping depth and direction to 2e-4', () => {
    for (const depth of [0.05, 0.7, 1, 3, 12]) {
      for (const lineDepth of [0.02, 0.4, 1, 2.5, 9]) {
        expect(
          Math.abs(slabEscape(depth, lineDepth) - byBruteForce(depth, lineDepth)),
        ).toBeLessThan(2e-4);
      }
    }
  });

  it('has the half-space value ½[1 − (b/α) ln(1 + α/b)] in a thick slab', () => {
    for (const share of [0.1, 0.5, 1, 4]) {
      const expected = (1 - share * Math.log(1 + 1 / share)) / 2;
      expect(slabEscape(400, 400 * share)).toBeCloseTo(expected, 4);
    }
  });

  it('is a probability, and certain where the line is not absorbed', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e5, noNaN: true }),
        fc.double({ min: 0, max: 1e4, noNaN: true }),
        (depth, lineDepth) => {
          const probability = slabEscape(depth, lineDepth);
          expect(probability).toBeGreaterThanOrEqual(0);
          expect(probability).toBeLessThanOrEqual(1 + 1e-12);
        },
      ),
    );
    expect(slabEscape(2, 0)).toBeCloseTo(1, 12);
  });
});

/** Noise factor of the absorbed energy alone: ε²/(η ε₂). */
const swank = (response: DetectorResponse, energy: number): number =>
  response.energyFraction(energy, 1) ** 2 /
  (response.efficiency(energy, 1) * response.energySquareFraction(energy, 1));

describe('the Swank factor of caesium iodide', () => {
  const solid600 = detectorOf({ material: 'caesium iodide', arealDensity_mg_per_cm2: 271 });

  it('is 1 below the K edges: nothing escapes, and what is left is light', () => {
    expect(swank(solid600, 32)).toBeCloseTo(1, 12);
  });

  /*
   * Published values hold fluorescence and light together. Light alone is what is measured below the
   * edge, 0.91 (high resolution) and 0.93 (high light) by Zhao, Ristic & Rowlands 2004.
   */
  it('lies in 0.80–0.88 at 35–45 keV, 600 µm, with light of 0.91–0.93 (Swank 1973, Hajdok 2008, recalled, ± 0.04)', () => {
    for (const energy of [36.5, 38, 40, 42, 45]) {
      for (const light of [0.91, 0.93]) {
        expect(swank(solid600, energy) * light).toBeGreaterThan(0.8 - 0.04);
        expect(swank(solid600, energy) * light).toBeLessThan(0.88 + 0.04);
      }
    }
  });

  it('lies in 0.85–0.92 at 60–80 keV (as above, recalled, ± 0.04)', () => {
    for (const energy of [60, 70, 80]) {
      expect(swank(solid600, energy) * 0.92).toBeGreaterThan(0.85 - 0.04);
      expect(swank(solid600, energy) * 0.92).toBeLessThan(0.92 + 0.04);
    }
  });

  it('of 500 µm amorphous selenium is 0.95–0.99 at 30–80 keV before light (Fahrig 1995, recalled, ± 0.03)', () => {
    const selenium = detectorOf({ material: 'amorphous selenium', arealDensity_mg_per_cm2: 214 });
    for (const energy of [30, 50, 80]) {
      expect(swank(selenium, energy)).toBeGreaterThan(0.95 - 0.03);
      expect(swank(selenium, energy)).toBeLessThan(0.99 + 0.03);
    }
  });
});

describe('a detector response', () => {
  const csi = detectorOf({});
  const names = [...nameOf.map(([, name]) => name), 'water', 'ideal'];

  it('never has ε above η, nor ε₂ above ε, nor a noise factor above 1', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...names.map((name) => detectorOf({ material: name }))),
        fc.double({ min: 5, max: 150, noNaN: true }),
        fc.double({ min: 0.01, max: 1, noNaN: true }),
        (response, energy, cosBeta) => {
          const eta = response.efficiency(energy, cosBeta);
          const epsilon = response.energyFraction(energy, cosBeta);
          const epsilon2 = response.energySquareFraction(energy, cosBeta);
          expect(eta).toBeLessThanOrEqual(1);
          expect(epsilon).toBeLessThanOrEqual(eta);
          expect(epsilon2).toBeLessThanOrEqual(epsilon);
          expect(epsilon2).toBeGreaterThan(0);
          expect(epsilon ** 2).toBeLessThanOrEqual(eta * epsilon2 * (1 + 1e-12));
        },
      ),
    );
  });

  it('absorbs more of a slanted photon, and at 1/cosβ as a thicker slab would', () => {
    const thick = detectorOf({ arealDensity_mg_per_cm2: 400 });
    expect(csi.efficiency(80, 0.5)).toBeCloseTo(thick.efficiency(80, 1), 10);
    expect(csi.efficiency(80, 0.5)).toBeGreaterThan(csi.efficiency(80, 1));
  });

  it('is the same from its table as computed directly, to 5e-5', () => {
    const { energies_keV } = energyGrid(150, csi.edges_keV);
    const { eta, epsilon, epsilon2 } = csi.on(energies_keV);
    energies_keV.forEach((energy, i) => {
      expect(Math.abs(csi.efficiency(energy, 1) / eta[i] - 1)).toBeLessThan(5e-5);
      expect(Math.abs(csi.energyFraction(energy, 1) / epsilon[i] - 1)).toBeLessThan(5e-5);
      expect(Math.abs(csi.energySquareFraction(energy, 1) / epsilon2[i] - 1)).toBeLessThan(5e-5);
    });
    expect(csi.on(energies_keV)).toBe(csi.on(energies_keV));
  });

  it('answers above 150 keV too', () => {
    const expected = -Math.expm1(-massAttenuation(material('caesium iodide'), 662) * 0.2);
    expect(csi.efficiency(662, 1)).toBeCloseTo(expected, 12);
  });

  it('counts a photon once above the threshold and not at all below, whatever its energy', () => {
    const counting = detectorOf({
      material: 'cadmium telluride',
      response: 'counting',
      countingThreshold_keV: 25,
    });
    const integrating = detectorOf({ material: 'cadmium telluride' });
    for (const energy of [26, 40, 90]) {
      const eta = integrating.efficiency(energy, 0.7);
      expect(energy * counting.energyFraction(energy, 0.7)).toBeCloseTo(eta, 12);
      expect(energy ** 2 * counting.energySquareFraction(energy, 0.7)).toBeCloseTo(eta, 12);
    }
    expect(counting.energyFraction(24.9, 1)).toBe(0);
    expect(counting.efficiency(24.9, 1)).toBe(0);
    expect(counting.edges_keV).toContain(25);
  });

  it('that is ideal absorbs everything at any angle, without light noise', () => {
    const ideal = detectorOf({ material: 'ideal' });
    expect([
      ideal.efficiency(60, 0.3),
      ideal.energyFraction(60, 0.3),
      ideal.energySquareFraction(60, 0.3),
      ideal.opticalSwank,
    ]).toEqual([1, 1, 1, 1]);
  });

  it('names the K edges an energy grid must hold', () => {
    expect(csi.edges_keV.map((edge) => Math.round(10 * edge))).toEqual([332, 360]);
  });
});
