import { describe, expect, test } from 'vitest';
import { calibrate, readingFaults } from '../../../physics/beam/index.js';
import { expectWithin } from './helpers.js';
import { exact, filters, readingOf, steep, type Truth, tube, vacuum } from './synthetic-room.js';

describe('cautions', () => {
  const codes = (truth: Truth, potentials = [80]) =>
    calibrate(
      tube,
      potentials.map((kV) => readingOf(truth, kV)),
      filters,
      vacuum,
    ).findings.map(({ code }) => code);

  test('inherent filter outside 1.5 to 6 mm Al', () => {
    expect(codes({ ...exact, inherent_mmAl: 1.2 })).toEqual(['inherentFilterUnusual']);
    expect(codes({ ...exact, inherent_mmAl: 7 })).toEqual(['inherentFilterUnusual']);
    expect(codes({ ...exact, inherent_mmAl: 5 })).toEqual([]);
  });

  test('output outside 0.5 to 1.3 of the model', () => {
    expect(codes({ ...exact, output: 0.4 })).toEqual(['outputUnusual']);
    expect(codes({ ...exact, output: 1.5 })).toEqual(['outputUnusual']);
  });

  test('an output that departs from the model with potential by more than the power 0.3', () => {
    const readings = [60, 80, 120].map((kV) => {
      const reading = readingOf(exact, kV);
      return {
        ...reading,
        airKerma_uGy_per_mAs: (reading.airKerma_uGy_per_mAs ?? 0) * (kV / 80) ** 0.5,
      };
    });
    const { findings, outputExponent } = calibrate(tube, readings, filters, vacuum);
    expectWithin(outputExponent, 0.5, 0.1, 'b');
    expect(findings.map(({ code }) => code)).toEqual(['outputSlopeUnusual']);
    expect(findings[0].message).toMatch(/-0.3 to 0.3/);
  });

  test('a reading that the calibrated model does not meet', () => {
    const readings = [readingOf(exact, 80), readingOf(exact, 100)];
    const off = {
      ...readings[1],
      halfValueLayer_mmAl: (readings[1].halfValueLayer_mmAl ?? 0) * 1.15,
    };
    const { findings } = calibrate(tube, [readings[0], off], filters, vacuum);
    expect(findings.map(({ code, path }) => [code, path])).toEqual([
      ['readingNotMet', 'room.readings[1].halfValueLayer_mmAl'],
    ]);
  });
});

describe('readings in the wrong unit are refused with the reason', () => {
  const good = readingOf(exact, 80);
  const kerma = good.airKerma_uGy_per_mAs ?? 0;
  const layer = good.halfValueLayer_mmAl ?? 0;

  test.each([60, 80, 100, 120, 150])('a half-value layer in cm at %f kV', (kV) => {
    const reading = readingOf(exact, kV);
    const inCm = { ...reading, halfValueLayer_mmAl: (reading.halfValueLayer_mmAl ?? 0) / 10 };
    const [fault, ...others] = readingFaults(tube, [inCm], filters, vacuum);
    expect(others).toEqual([]);
    expect(fault.path).toBe('room.readings[0].halfValueLayer_mmAl');
    expect(fault.remedy).toMatch(/read in cm/);
    expect(fault.remedy).toContain(
      String(Number((reading.halfValueLayer_mmAl ?? 0).toPrecision(3))),
    );
  });

  test.each([
    ['in mGy/mAs', { airKerma_uGy_per_mAs: kerma / 1000 }, /mGy\/mAs/],
    ['in mR/mAs', { airKerma_uGy_per_mAs: kerma / 8.76 }, /mR\/mAs/],
    ['with its distance in cm', { distance_mm: 100 }, /distance in cm/],
    ['in nGy/mAs', { airKerma_uGy_per_mAs: kerma * 1000 }, /nGy\/mAs/],
  ])('an output %s', (_, entry, remedy) => {
    const faults = readingFaults(tube, [{ ...good, ...entry }], filters, vacuum);
    expect(faults.map(({ path }) => path)).toEqual(['room.readings[0].airKerma_uGy_per_mAs']);
    expect(faults[0].remedy).toMatch(remedy);
  });

  test('a filter that the room does not have', () => {
    const faults = readingFaults(tube, [{ ...good, filter: '0.3 Cu' }], filters, vacuum);
    expect(faults).toEqual([
      {
        path: 'room.readings[0].filter',
        value: '0.3 Cu',
        rule: 'must be a filter of the room: none, 0.2 Cu',
        remedy: 'name one of them, or enter the filter under room.filters',
      },
    ]);
  });

  test('and left out of the calibration, which says so', () => {
    const wrong = {
      ...readingOf(exact, 100),
      halfValueLayer_mmAl: layer / 10,
      airKerma_uGy_per_mAs: kerma / 1000,
    };
    const { outputFactor, inherentFilter_mmAl, residuals, findings } = calibrate(
      tube,
      [good, wrong],
      filters,
      vacuum,
    );
    expectWithin(outputFactor, 0.8, 1e-4, 'g');
    expectWithin(inherentFilter_mmAl, 3, 1e-4, 't');
    expect(residuals.every(({ path }) => path.startsWith('room.readings[0].'))).toBe(true);
    expect(findings.map(({ code, severity, path }) => [code, severity, path])).toEqual([
      ['readingRefused', 'limit', 'room.readings[1].halfValueLayer_mmAl'],
      ['readingRefused', 'limit', 'room.readings[1].airKerma_uGy_per_mAs'],
    ]);
  });

  test('good readings of any tube from 1 to 8 mm Al have no faults', () => {
    for (const inherent_mmAl of [1, 2.5, 8]) {
      for (const filter of filters.keys()) {
        const readings = [40, 80, 120, 145].map((kV) =>
          readingOf({ ...steep, inherent_mmAl }, kV, filter),
        );
        expect(readingFaults(tube, readings, filters, vacuum)).toEqual([]);
      }
    }
  });
});
