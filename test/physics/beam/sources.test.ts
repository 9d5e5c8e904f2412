import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  airKerma_uGy,
  halfValueLayer_mm,
  lineSpectrum,
  monoenergetic,
  rescaleToAirKerma,
  scaleSpectrum,
  sourceBeam,
  spectrumFromCsv,
  spectrumFromRows,
  spectrumRows,
  totalFluence_per_mm2,
} from '../../../physics/beam/index.js';
import { rebin } from '../../../physics/beam/rebin.js';
import { aluminium, expectWithin, tubeBeam } from './helpers.js';

describe('gamma lines', () => {
  test('stand at their exact energies, ascending, equal ones added', () => {
    const beam = lineSpectrum([
      [1332.5, 1],
      [1173.2, 1],
      [1332.5, 0.5],
      [662, 0],
    ]);
    expect([...beam.energies_keV]).toEqual([1173.2, 1332.5]);
    expect([...beam.fluence_per_mm2]).toEqual([1, 1.5]);
    expect(beam.edges_keV).toHaveLength(0);
  });
  test('keep their energies as one object, so that coefficients are found again', () => {
    expect(monoenergetic(60, 1).energies_keV).toBe(monoenergetic(60, 7).energies_keV);
  });
});

describe('rebinning', () => {
  test('keeps the number of photons, those outside told apart', () => {
    const counts = fc.array(fc.double({ min: 0, max: 1e6, noNaN: true }), {
      minLength: 1,
      maxLength: 40,
    });
    const width = fc.double({ min: 0.05, max: 5, noNaN: true });
    fc.assert(
      fc.property(
        counts,
        width,
        fc.double({ min: 0, max: 30, noNaN: true }),
        (values, step, start) => {
          const edges = Float64Array.from(
            { length: values.length + 1 },
            (_, i) => start + i * step,
          );
          const target = Float64Array.from({ length: 101 }, (_, i) => 5 + i * 0.5);
          const moved = rebin({ edges, counts: Float64Array.from(values) }, target);
          const before = values.reduce((sum, count) => sum + count, 0);
          const inside = moved.counts.reduce((sum, count) => sum + count, 0);
          const after = inside + moved.below + moved.above;
          expect(Math.abs(after - before)).toBeLessThanOrEqual(1e-9 * before + 1e-12);
        },
      ),
    );
  });
  test('onto the same bins changes nothing', () => {
    const edges = Float64Array.of(5, 5.5, 6, 7);
    const counts = Float64Array.of(3, 0, 2);
    expect(rebin({ edges, counts }, edges)).toEqual({ counts, below: 0, above: 0 });
  });
});

describe("a user's own spectrum", () => {
  const beam = tubeBeam(60, 12, 2.5);
  const midpoints = [...beam.energies_keV];
  const perKeV = midpoints.map(
    (energy, i) =>
      [energy, beam.fluence_per_mm2[i] / (beam.edges_keV[i + 1] - beam.edges_keV[i])] as const,
  );

  test('as exported from a tube beam has its photons and its kerma', () => {
    const { spectrum, findings } = spectrumFromRows({
      rows: perKeV,
      fluenceIs: 'per keV',
      potential_kV: 60,
    });
    if (!spectrum) throw new Error('no spectrum');
    expectWithin(totalFluence_per_mm2(spectrum), totalFluence_per_mm2(beam), 1e-3, 'photons');
    expectWithin(airKerma_uGy(spectrum), airKerma_uGy(beam), 0.05, 'air kerma');
    expect(findings).toEqual([]);
  });

  test('counted per bin or per keV is the same', () => {
    const rows = [
      [20, 10],
      [22, 30],
      [24, 20],
    ] as const;
    const binned = spectrumFromRows({ rows, fluenceIs: 'per bin', potential_kV: 60 }).spectrum;
    const dense = spectrumFromRows({
      rows: rows.map(([energy, fluence]) => [energy, fluence / 2] as const),
      fluenceIs: 'per keV',
      potential_kV: 60,
    }).spectrum;
    expect(binned && totalFluence_per_mm2(binned)).toBeCloseTo(60, 9);
    expect(dense?.fluence_per_mm2).toEqual(binned?.fluence_per_mm2);
  });

  test('loses what is negative, above the potential or below 5 keV, and says how much', () => {
    const rows = [
      [2, 10],
      [20, 50],
      [38, -5],
      [56, 50],
      [74, 40],
    ] as const;
    const { spectrum, findings } = spectrumFromRows({
      rows,
      fluenceIs: 'per bin',
      potential_kV: 60,
    });
    expect(findings.map(({ code }) => code)).toEqual([
      'spectrumClipped',
      'spectrumAbovePotential',
      'spectrumBelowGrid',
    ]);
    expect(spectrum?.fluence_per_mm2.every((f) => f >= 0)).toBe(true);
    // Bins of 18 keV: of the photons at 56 keV the share 5/18 and all at 74 keV lie above 60 keV, and of
    // those at 2 keV the share 12/18 below 5 keV.
    const [, above, below] = findings.map(({ value }) => Number(value));
    expectWithin(above, (100 * ((50 * 5) / 18 + 40)) / 150, 1e-9, 'above');
    expectWithin(below, (100 * ((10 * 12) / 18)) / 150, 1e-9, 'below');
    expect(findings[1].severity).toBe('caution');
  });

  test('is rescaled to a measured air kerma', () => {
    const scaled = rescaleToAirKerma(beam, 12.5);
    expectWithin(scaled && airKerma_uGy(scaled), 12.5, 1e-9, 'air kerma');
    expect(rescaleToAirKerma(scaleSpectrum(beam, 0), 12.5)).toBeNull();
  });

  test('with fewer than two energies is refused with the reason', () => {
    const { spectrum, findings } = spectrumFromRows({
      rows: [[20, 1]],
      fluenceIs: 'per keV',
      potential_kV: 60,
    });
    expect(spectrum).toBeNull();
    expect(findings[0].message).toMatch(/at least two energies/);
  });

  test('is read from a table, bad rows beside it', () => {
    const text = 'energy_keV;fluence_per_mm2_per_keV_per_mAs\n20;1,5\n21;x\n22;2,5\n';
    const { spectrum, badRows } = spectrumFromCsv(text, 60);
    expect(spectrum && totalFluence_per_mm2(spectrum)).toBeCloseTo(2 * 1.5 + 2 * 2.5, 9);
    expect(badRows).toEqual([{ line: 3, reason: 'fluence: x: is not a number' }]);
  });
});

describe('a spectrum as rows', () => {
  test('holds every photon of a tube beam, its lines included, and reads back as the same beam', () => {
    const beam = tubeBeam(100, 12, 2.5);
    const rows = spectrumRows(beam);
    const photons = rows.reduce((sum, row, i) => {
      const width_keV = beam.edges_keV[i + 1] - beam.edges_keV[i];
      return sum + row.fluence_per_mm2_per_keV_per_mAs * width_keV;
    }, 0);
    expectWithin(photons, totalFluence_per_mm2(beam), 1e-9, 'photons');
    const text = [
      'energy_keV,fluence_per_mm2_per_keV_per_mAs',
      ...rows.map((row) => `${row.energy_keV},${row.fluence_per_mm2_per_keV_per_mAs}`),
    ].join('\n');
    const { spectrum, badRows } = spectrumFromCsv(text, 100);
    expect(badRows).toEqual([]);
    expectWithin(spectrum && airKerma_uGy(spectrum), airKerma_uGy(beam), 0.2, 'air kerma');
    expectWithin(
      spectrum && halfValueLayer_mm(spectrum, aluminium),
      halfValueLayer_mm(beam, aluminium) ?? Number.NaN,
      0.2,
      'HVL1',
    );
  });
});

describe('a source in place of the tube', () => {
  test('gives its beam', () => {
    const { spectrum, findings } = sourceBeam({ kind: 'monoenergetic', energy_keV: 60 }, 80);
    expect([...(spectrum?.energies_keV ?? [])]).toEqual([60]);
    expect(findings).toEqual([]);
  });
  test('without the rows of its file says so', () => {
    const { spectrum, findings } = sourceBeam({ kind: 'spectrum', file: 'own.csv' }, 80);
    expect(spectrum).toBeNull();
    expect(findings[0].path).toBe('room.source.file');
  });
  test('above 3 MeV is refused, for air kerma is not known there', () => {
    const lines: [number, number][] = [
      [1000, 1],
      [6000, 1],
    ];
    const { spectrum, findings } = sourceBeam({ kind: 'lines', lines }, 80);
    expect(spectrum).toBeNull();
    expect(findings[0]).toMatchObject({ path: 'room.source.lines', bound: 3000, value: 6000 });
  });
});
