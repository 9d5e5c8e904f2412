import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  airKerma_uGy,
  attenuate,
  calibrate,
  halfValueLayer_mm,
  tungstenSpectrum,
} from '../../../physics/beam/index.js';
import type { Reading } from '../../../physics/case/schema.js';
import type { Calibration } from '../../../physics/results.js';
import { aluminium, expectWithin } from './helpers.js';
import { exact, filters, readingOf, steep, tube, vacuum } from './synthetic-room.js';

/** Model over measurement minus one in percent, of a reading the calibration has not seen. */
function heldOut(calibration: Calibration, reading: Reading) {
  const bare = tungstenSpectrum({
    potential_kV: reading.potential_kV,
    anodeAngle_deg: tube.anodeAngle_deg,
  });
  const beam = attenuate(bare, [
    { material: aluminium, thickness_mm: calibration.inherentFilter_mmAl },
    ...(filters.get(reading.filter) ?? []),
  ]);
  const scale =
    calibration.outputFactor * (reading.potential_kV / 80) ** calibration.outputExponent;
  return {
    layer_percent:
      100 * ((halfValueLayer_mm(beam, aluminium) ?? 0) / (reading.halfValueLayer_mmAl ?? 0) - 1),
    output_percent: 100 * ((airKerma_uGy(beam) * scale) / (reading.airKerma_uGy_per_mAs ?? 0) - 1),
  };
}

describe('a synthetic room (16°, 3.0 mm Al, kV +1.5 %, 5 % ripple, output ×0.8) read as 12° constant potential', () => {
  const potentials = [60, 70, 80, 90, 100, 110, 120];

  test('at 80 kV only: half-value layer −1.1 to +1.8 %, output −3.7 to +3.0 % over 60 to 120 kV', () => {
    const calibration = calibrate(tube, [readingOf(steep, 80)], filters, vacuum);
    const off = potentials.map((kV) => heldOut(calibration, readingOf(steep, kV)));
    const layers = off.map(({ layer_percent }) => Number(layer_percent.toFixed(1)));
    const outputs = off.map(({ output_percent }) => Number(output_percent.toFixed(1)));
    expect([Math.min(...layers), Math.max(...layers)]).toEqual([-1.1, 1.8]);
    expect([Math.min(...outputs), Math.max(...outputs)]).toEqual([-3.7, 3.0]);
    expect(calibration.outputExponent).toBe(0);
  });

  test('at 60, 80, 100 and 120 kV: half-value layers within 1.5 %, outputs within 0.1 %', () => {
    const readings = [60, 80, 100, 120].map((kV) => readingOf(steep, kV));
    const { residuals, findings } = calibrate(tube, readings, filters, vacuum);
    expect(residuals).toHaveLength(8);
    for (const { path, quantity, relative_percent } of residuals) {
      const bound = quantity === 'halfValueLayer_mmAl' ? 1.5 : 0.1;
      expect(Math.abs(relative_percent), path).toBeLessThanOrEqual(bound);
    }
    expect(findings).toEqual([]);
  });

  test.each([
    { fitted: [60, 80, 100], held: 120, filter: 'none' },
    { fitted: [80, 100, 120], held: 60, filter: 'none' },
    { fitted: [60, 80, 120], held: 100, filter: '0.2 Cu' },
    { fitted: [80], held: 100, filter: 'none' },
    { fitted: [80], held: 70, filter: '0.2 Cu' },
  ])(
    'a reading at $held kV through $filter is met within 4 % from readings at $fitted kV',
    ({ fitted, held, filter }) => {
      const readings = fitted.map((kV) => readingOf(steep, kV));
      const off = heldOut(
        calibrate(tube, readings, filters, vacuum),
        readingOf(steep, held, filter),
      );
      expect(Math.abs(off.layer_percent)).toBeLessThanOrEqual(4);
      expect(Math.abs(off.output_percent)).toBeLessThanOrEqual(4);
    },
  );
});

describe('a room the model describes exactly', () => {
  test.each([
    ['one reading', [80]],
    ['readings at two potentials', [70, 90]],
    ['readings at four potentials', [60, 80, 100, 120]],
  ])('is found again from %s', (_, potentials) => {
    const readings = potentials.map((kV) => readingOf(exact, kV));
    const { outputFactor, outputExponent, inherentFilter_mmAl, residuals } = calibrate(
      tube,
      readings,
      filters,
      vacuum,
    );
    expectWithin(inherentFilter_mmAl, 3, 1e-4, 't');
    expectWithin(outputFactor, 0.8, 1e-4, 'g');
    expect(Math.abs(outputExponent)).toBeLessThan(1e-6);
    expect(residuals.every(({ relative_percent }) => Math.abs(relative_percent) < 1e-3)).toBe(true);
  });

  test('is found again through a filter, at another distance and in air', () => {
    const readings = [readingOf(exact, 90, '0.2 Cu', 650, true)];
    const { outputFactor, inherentFilter_mmAl, residuals } = calibrate(tube, readings, filters);
    expectWithin(inherentFilter_mmAl, 3, 1e-4, 't');
    expectWithin(outputFactor, 0.8, 1e-4, 'g');
    expect(residuals.map(({ path }) => path)).toEqual([
      'room.readings[0].halfValueLayer_mmAl',
      'room.readings[0].airKerma_uGy_per_mAs',
    ]);
  });

  test('meets the unfiltered reading where a filtered one stands at the same potential', () => {
    const soft = readingOf(exact, 80);
    const hard = readingOf(exact, 80, '0.2 Cu');
    const off = { ...hard, halfValueLayer_mmAl: (hard.halfValueLayer_mmAl ?? 0) * 1.03 };
    const { inherentFilter_mmAl } = calibrate(tube, [off, soft], filters, vacuum);
    expectWithin(inherentFilter_mmAl, 3, 1e-4, 't');
  });

  test('keeps the entered output when only half-value layers are read', () => {
    const readings = [{ ...readingOf(exact, 80), airKerma_uGy_per_mAs: null }];
    const { outputFactor, inherentFilter_mmAl } = calibrate(tube, readings, filters, vacuum);
    expect(outputFactor).toBe(0.87);
    expectWithin(inherentFilter_mmAl, 3, 1e-4, 't');
  });

  test('keeps the entered filtration, as aluminium, when only outputs are read', () => {
    const readings = [60, 80, 100].map((kV) => ({
      ...readingOf(exact, kV),
      halfValueLayer_mmAl: null,
    }));
    const entered = { ...tube, inherentFilter: [{ material: 'copper', thickness_mm: 0.1 }] };
    const { inherentFilter_mmAl, outputExponent } = calibrate(entered, readings, filters, vacuum);
    expect(inherentFilter_mmAl).toBeGreaterThan(2.5);
    expect(inherentFilter_mmAl).toBeLessThan(4.5);
    expect(Number.isFinite(outputExponent)).toBe(true);
  });

  test('without readings is the tube as entered', () => {
    expect(calibrate(tube, [], filters)).toEqual({
      outputFactor: 0.87,
      outputExponent: 0,
      inherentFilter_mmAl: 2.5,
      residuals: [],
      findings: [],
    });
  });

  test('trusts the more certain reading more', () => {
    const readings = [60, 80, 100, 120].map((kV) => readingOf(exact, kV));
    const wrong = {
      ...readings[3],
      airKerma_uGy_per_mAs: (readings[3].airKerma_uGy_per_mAs ?? 0) * 1.1,
    };
    const residualWith = (relativeUncertainty_percent: number) =>
      calibrate(
        tube,
        [...readings.slice(0, 3), { ...wrong, relativeUncertainty_percent }],
        filters,
        vacuum,
      ).residuals.at(-1)?.relative_percent ?? Number.NaN;
    expect(Math.abs(residualWith(1))).toBeLessThan(Math.abs(residualWith(20)));
  });
});

test('any readings, however wrong, end in a finite calibration or a refusal', () => {
  const anyReading = fc.record({
    potential_kV: fc.double({ min: 20, max: 150, noNaN: true }),
    filter: fc.constantFrom('none', '0.2 Cu', 'not there'),
    halfValueLayer_mmAl: fc.option(fc.double({ min: 1e-3, max: 50, noNaN: true })),
    airKerma_uGy_per_mAs: fc.option(fc.double({ min: 1e-6, max: 1e5, noNaN: true })),
    distance_mm: fc.double({ min: 100, max: 10_000, noNaN: true }),
    relativeUncertainty_percent: fc.double({ min: 1e-3, max: 100, noNaN: true }),
  });
  fc.assert(
    fc.property(fc.array(anyReading, { maxLength: 6 }), fc.boolean(), (readings, air) => {
      const calibration = calibrate(tube, readings, filters, { air });
      const { outputFactor, outputExponent, inherentFilter_mmAl, residuals } = calibration;
      const values = residuals.flatMap(({ model, relative_percent }) => [model, relative_percent]);
      for (const value of [outputFactor, outputExponent, inherentFilter_mmAl, ...values]) {
        expect(Number.isFinite(value)).toBe(true);
      }
      expect(outputFactor).toBeGreaterThan(0);
      expect(inherentFilter_mmAl).toBeGreaterThanOrEqual(0);
      const entered = readings.flatMap((r) => [r.halfValueLayer_mmAl, r.airKerma_uGy_per_mAs]);
      const refused = calibration.findings.filter(({ code }) => code === 'readingRefused');
      const given = entered.filter((value) => value !== null).length;
      expect(residuals.length).toBeLessThanOrEqual(given);
      if (residuals.length < given) expect(refused.length).toBeGreaterThan(0);
    }),
    { numRuns: 40 },
  );
});
