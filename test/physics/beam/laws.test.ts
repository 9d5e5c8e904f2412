import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  airKerma_uGy,
  attenuate,
  beamQuality,
  homogeneityCoefficient,
  type Spectrum,
  scaleSpectrum,
  tungstenSpectrum,
} from '../../../physics/beam/index.js';
import { aluminium, material, tubeBeam } from './helpers.js';

const potentials = fc.double({ min: 40, max: 150, noNaN: true });
const angles = fc.double({ min: 6, max: 22, noNaN: true });
const thickness = fc.double({ min: 0, max: 20, noNaN: true });
const filters = fc
  .constantFrom('aluminium', 'copper', 'water', 'tin', 'cortical bone', 'iodine', 'air')
  .map(material);

describe('laws of attenuation', () => {
  const beam = tungstenSpectrum({ potential_kV: 120, anodeAngle_deg: 12 });

  test('no layers change nothing', () => {
    expect(attenuate(beam, [])).toBe(beam);
  });

  test('thickness splits multiply at each energy', () => {
    fc.assert(
      fc.property(filters, thickness, thickness, (filter, a, b) => {
        const whole = attenuate(beam, [{ material: filter, thickness_mm: a + b }]);
        const split = attenuate(attenuate(beam, [{ material: filter, thickness_mm: a }]), [
          { material: filter, thickness_mm: b },
        ]);
        expectChannels(
          split,
          whole,
          (one, other) => Math.abs(one - other) <= 1e-12 * other + 1e-290,
        );
      }),
    );
  });

  test('more filter never raises the fluence of any channel', () => {
    fc.assert(
      fc.property(filters, thickness, thickness, (filter, a, b) => {
        const thin = attenuate(beam, [{ material: filter, thickness_mm: a }]);
        const thick = attenuate(beam, [{ material: filter, thickness_mm: a + b }]);
        expectChannels(thick, thin, (behindThick, behindThin) => behindThick <= behindThin);
      }),
    );
  });

  test('the order of layers does not matter beyond rounding', () => {
    fc.assert(
      fc.property(filters, filters, thickness, thickness, (first, second, a, b) => {
        const layers = [
          { material: first, thickness_mm: a },
          { material: second, thickness_mm: b },
        ];
        expectChannels(
          attenuate(beam, layers),
          attenuate(beam, layers.toReversed()),
          (one, other) => Math.abs(one - other) <= 1e-12 * other + 1e-290,
        );
      }),
    );
  });

  function expectChannels(
    a: Spectrum,
    b: Spectrum,
    holds: (x: number, y: number) => boolean,
  ): void {
    const broken = [...a.fluence_per_mm2].findIndex((f, i) => !holds(f, b.fluence_per_mm2[i]));
    const at = `channel at ${a.energies_keV[broken]} keV: ${a.fluence_per_mm2[broken]}, ${b.fluence_per_mm2[broken]}`;
    expect(broken, at).toBe(-1);
  }
});

describe('laws of quality', () => {
  test('a tube beam behind aluminium is less homogeneous than one energy', () => {
    fc.assert(
      fc.property(
        potentials,
        angles,
        fc.double({ min: 1, max: 10, noNaN: true }),
        (kV, angle, al) => {
          const homogeneity = homogeneityCoefficient(tubeBeam(kV, angle, al)) ?? Number.NaN;
          expect(homogeneity).toBeLessThan(1);
          expect(homogeneity).toBeGreaterThan(0.4);
        },
      ),
      { numRuns: 50 },
    );
  });

  test('scaling the fluence changes no ratio, and kerma and fluence in proportion', () => {
    fc.assert(
      fc.property(potentials, fc.double({ min: 1e-6, max: 1e6, noNaN: true }), (kV, factor) => {
        const beam = tubeBeam(kV, 12, 2.5);
        const plain = beamQuality(beam, kV);
        const scaled = beamQuality(scaleSpectrum(beam, factor), kV);
        const close = (a: number | null, b: number | null) =>
          expect(Math.abs((a ?? Number.NaN) / (b ?? Number.NaN) - 1)).toBeLessThan(1e-9);
        close(scaled.halfValueLayers[0].first_mm, plain.halfValueLayers[0].first_mm);
        close(scaled.halfValueLayers[1].tenth_mm, plain.halfValueLayers[1].tenth_mm);
        close(scaled.homogeneityCoefficient, plain.homogeneityCoefficient);
        close(scaled.meanEnergy_keV, plain.meanEnergy_keV);
        close(scaled.effectiveEnergy_keV, plain.effectiveEnergy_keV);
        close(scaled.airKerma_uGy_per_mAs, plain.airKerma_uGy_per_mAs * factor);
        close(scaled.fluence_per_mm2_per_mAs, plain.fluence_per_mm2_per_mAs * factor);
      }),
      { numRuns: 50 },
    );
  });

  test('output rises with potential at any angle', () => {
    fc.assert(
      fc.property(fc.double({ min: 40, max: 145, noNaN: true }), angles, (kV, angle) => {
        const layers = [{ material: aluminium, thickness_mm: 2.5 }];
        const output = (potential_kV: number) =>
          airKerma_uGy(
            attenuate(tungstenSpectrum({ potential_kV, anodeAngle_deg: angle }), layers),
          );
        expect(output(kV + 5)).toBeGreaterThan(output(kV));
      }),
      { numRuns: 50 },
    );
  });
});
