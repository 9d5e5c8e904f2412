/**
 * The tube model against its own published form: intermediate and point values, and whole beams
 * evaluated separately with 0.5 keV midpoints from 5.25 keV and xraylib's attenuation. Another table of
 * attenuation may move a half-value layer by 0.3 % and an air kerma by 0.5 %.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { massAttenuation } from '../../../materials/index.js';
import { bremsstrahlung, electronRange_g_per_cm2 } from '../../../physics/beam/bremsstrahlung.js';
import { characteristicLine } from '../../../physics/beam/characteristic-lines.js';
import {
  airKerma_uGy,
  beamQuality,
  halfValueLayer_mm,
  tungstenSpectrum,
} from '../../../physics/beam/index.js';
import { kLines } from '../../../physics/beam/tungsten-coefficients.js';
import { aluminium, expectPrinted, expectWithin, material, tubeBeam } from './helpers.js';

describe('point values of the closed form', () => {
  test('every intermediate value at 100 kV, 12°, 30.25 keV is as printed', () => {
    const terms = bremsstrahlung(100, 12)(30.25, 22.2381);
    expectPrinted(electronRange_g_per_cm2(100), '0.029570', 'R0');
    expectPrinted(terms.yieldFactor, '1.03659', 'Y');
    expectPrinted(terms.depth_g_per_cm2, '0.003790', 'ζ');
    expectPrinted(terms.shape, '1.62148', 'κ');
    expectPrinted(terms.escapeProbability, '0.69642', 'escape');
    expectPrinted(terms.photons_per_keV_sr_electron, '1.6646e-5', 'N');
  });

  test.each([
    [80, 12, 20.25, 63.6052, '1.6286e-5'],
    [80, 12, 60.25, 3.6732, '3.671e-6'],
    [80, 12, 70.25, 10.933, '1.6824e-6'],
    [150, 16, 45.25, 7.7174, '1.8539e-5'],
  ])('bremsstrahlung at %f kV, %f°, %f keV is as printed', (kV, angle, energy, m, printed) => {
    expectPrinted(bremsstrahlung(kV, angle)(energy, m).photons_per_keV_sr_electron, printed, 'N');
  });

  test.each([
    [80, 12, '2.2931e-6'],
    [150, 16, '6.5799e-5'],
  ])('the Kα1 line at %f kV, %f° is as printed', (kV, angle, printed) => {
    expectPrinted(characteristicLine(kV, angle)(kLines[0].share, 3.823), printed, 'Kα1');
  });

  test.each([
    [30.25, 22.2381],
    [20.25, 63.6052],
    [60.25, 3.6732],
    [70.25, 10.933],
    [59.318, 3.823],
    [45.25, 7.7174],
  ])(
    "tungsten's attenuation at %f keV is within 0.1 % of the value used for the point values",
    (energy, m) => {
      expectWithin(massAttenuation(material('tungsten'), energy), m, 0.1, 'm');
    },
  );

  test('the shares of the K lines sum to the K photons within their printed digits', () => {
    const sum = kLines.reduce((total, { share }) => total + share, 0);
    expect(Math.abs(sum - 1)).toBeLessThan(0.006);
  });
});

describe('beams evaluated separately', () => {
  test.each([
    { kV: 40, angle: 12, al: 2.5, cu: 0, values: [1.3783, 1.7145, 28.123, 19.121, 1.9872e5] },
    { kV: 60, angle: 12, al: 3.0, cu: 0, values: [2.2995, 3.112, 36.83, 40.695, 6.4823e5] },
    { kV: 80, angle: 12, al: 2.5, cu: 0, values: [2.7275, 4.082, 43.005, 82.445, 1.5182e6] },
    { kV: 100, angle: 12, al: 2.5, cu: 0.1, values: [5.4667, 7.2013, 54.562, 66.116, 1.7133e6] },
    { kV: 120, angle: 10, al: 3.0, cu: 0.2, values: [7.9547, 9.4977, 63.855, 66.985, 1.9494e6] },
    { kV: 150, angle: 16, al: 4.0, cu: 0, values: [6.3111, 9.0596, 63.47, 187.007, 4.7505e6] },
  ])('$kV kV, $angle°, $al mm Al, $cu mm Cu', ({ kV, angle, al, cu, values }) => {
    const quality = beamQuality(tubeBeam(kV, angle, al, cu), kV);
    const [first, second, mean, kerma, fluence] = values;
    expectWithin(quality.halfValueLayers[0].first_mm, first, 0.3, 'HVL1');
    expectWithin(quality.halfValueLayers[0].second_mm, second, 0.3, 'HVL2');
    expectWithin(quality.meanEnergy_keV, mean, 0.3, 'mean energy');
    expectWithin(quality.airKerma_uGy_per_mAs, kerma, 0.5, 'air kerma');
    expectWithin(quality.fluence_per_mm2_per_mAs, fluence, 0.5, 'fluence');
  });
});

describe('ripple', () => {
  test.each([
    [5, -4.2, -2.5],
    [10, -8.4, -4.9],
    [13, -10.8, -6.3],
    [25, -20.3, -11.2],
  ])('%f %% changes output by %f %% and half-value layer by %f %%', (ripple, output, layer) => {
    const steady = tubeBeam(80, 12, 2.5);
    const rippling = tubeBeam(80, 12, 2.5, 0, ripple);
    const layerOf = (beam: typeof steady) => halfValueLayer_mm(beam, aluminium) ?? Number.NaN;
    const change = (a: number, b: number) => Number((100 * (a / b - 1)).toFixed(1));
    expect(change(airKerma_uGy(rippling), airKerma_uGy(steady))).toBe(output);
    expect(change(layerOf(rippling), layerOf(steady))).toBe(layer);
  });

  test('of nothing is constant potential to the last bit', () => {
    expect(tubeBeam(80, 12, 2.5, 0, 0).fluence_per_mm2).toEqual(
      tubeBeam(80, 12, 2.5).fluence_per_mm2,
    );
  });
});

describe('around the K edge of tungsten', () => {
  test('no K lines stand below 69.7 kV and five from there on', () => {
    const lines = (kV: number) => tungstenSpectrum({ potential_kV: kV, anodeAngle_deg: 12 });
    expect([...lines(69.69).energies_keV]).not.toContain(59.318);
    expect([...lines(69.7).energies_keV.slice(-5)]).toEqual(kLines.map((line) => line.energy_keV));
  });

  test.each([69.5, 69.525, 69.6, 69.62, 69.63, 69.64, 69.65, 69.69, 69.7, 69.71, 70])(
    'the beam at %f kV is finite and nowhere negative',
    (potential_kV) => {
      const { fluence_per_mm2 } = tungstenSpectrum({ potential_kV, anodeAngle_deg: 12 });
      expect(fluence_per_mm2.every((f) => Number.isFinite(f) && f >= 0)).toBe(true);
    },
  );

  test('the lines set in smoothly: output at 69.7 kV continues that at 69.6 kV', () => {
    const output = (kV: number) => airKerma_uGy(tubeBeam(kV, 12, 2.5));
    const step = output(69.7) / output(69.69) - 1;
    expect(Math.abs(step)).toBeLessThan(0.001);
  });
});

test('any setting of the model has a finite beam, nowhere negative, empty at and above the potential', () => {
  fc.assert(
    fc.property(
      fc.double({ min: 20, max: 150, noNaN: true }),
      fc.double({ min: 6, max: 22, noNaN: true }),
      fc.double({ min: 0, max: 100, noNaN: true }),
      (potential_kV, anodeAngle_deg, ripple_percent) => {
        const beam = tungstenSpectrum({ potential_kV, anodeAngle_deg, ripple_percent });
        expect(beam.fluence_per_mm2.every((f) => Number.isFinite(f) && f >= 0)).toBe(true);
        expect(beam.edges_keV[beam.edges_keV.length - 1]).toBe(potential_kV);
        expect(beam.energies_keV.every((energy) => energy < potential_kV)).toBe(true);
      },
    ),
    { numRuns: 60 },
  );
});

test('a setting outside the model is refused in words', () => {
  expect(() => tungstenSpectrum({ potential_kV: 160, anodeAngle_deg: 12 })).toThrow(/20 to 150/);
  expect(() => tungstenSpectrum({ potential_kV: 80, anodeAngle_deg: 30 })).toThrow(/6 to 22/);
  expect(() => tungstenSpectrum({ potential_kV: Number.NaN, anodeAngle_deg: 12 })).toThrow(
    /20 to 150/,
  );
});
