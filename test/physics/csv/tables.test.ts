import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  csvRecords,
  parseControlCurveCsv,
  parseReadingsCsv,
  parseSizesCsv,
  parseSpectrumCsv,
  readColumns,
} from '../../../physics/csv/index.js';

describe('a table of readings', () => {
  const expected = {
    potential_kV: 80,
    filter: null,
    halfValueLayer_mmAl: 2.95,
    airKerma_uGy_per_mAs: 62,
    distance_mm: 1000,
    relativeUncertainty_percent: null,
  };

  test.each([
    [
      'with the keys of the case',
      'potential_kV,halfValueLayer_mmAl,airKerma_uGy_per_mAs,distance_mm\n80,2.95,62,1000',
    ],
    ['in other units', 'kVp,HVL (mm Al),output (mGy/mAs),distance (cm)\n80,2.95,0.062,100'],
    [
      'in cm Al, with decimal commas',
      'kV;HVL [cm Al];output_mGy_per_mAs;distance_m\n80;0,295;0,062;1',
    ],
    [
      'separated by tabs',
      'Potential (kV)\tHalf-value layer (mm)\tAir kerma (µGy/mAs)\tDistance (mm)\n80\t2,95\t62\t1000',
    ],
    [
      'with comments and quotes',
      '# Room A, invented\n"kVp","HVL (mm Al)","output (µGy/mAs)","distance (cm)"\n\n# first\n"80",2.95,62,100\n',
    ],
  ])('is read %s', (_, text) => {
    const table = parseReadingsCsv(text);
    expect(table.badRows).toEqual([]);
    expect(table.rows).toEqual([expected]);
    expect(table.assumedUnits).toEqual([]);
  });

  test('converts exposure, 1 R being 8.76 mGy of air kerma', () => {
    const [row] = parseReadingsCsv('kVp,output (mR/mAs)\n80,7.08').rows;
    expect(row.airKerma_uGy_per_mAs).toBeCloseTo(7.08 * 8.76, 1);
  });

  test('is read by a mapping of its own headings, units still converted', () => {
    const { rows } = parseReadingsCsv('U,Layer (cm),Y\n80,0.295,62', {
      potential_kV: 'U',
      halfValueLayer_mmAl: 'Layer (cm)',
      airKerma_uGy_per_mAs: 'Y',
    });
    expect(rows[0]).toMatchObject({
      potential_kV: 80,
      halfValueLayer_mmAl: 2.95,
      airKerma_uGy_per_mAs: 62,
    });
  });

  test('names the columns whose unit was assumed and the headings it did not use', () => {
    const table = parseReadingsCsv('kVp,HVL,room\n80,2.95,A');
    expect(table.assumedUnits).toEqual(['halfValueLayer_mmAl']);
    expect(table.unusedHeadings).toEqual(['room']);
  });

  test('lists every bad row by line and reason', () => {
    const text = [
      'kVp,HVL (mm Al),output (µGy/mAs)',
      '80,2.95,62',
      '80,x,62',
      '200,3,62',
      '70,,',
      ',3,60',
      '80,2.9',
      '90,"1,234",5',
    ].join('\n');
    const table = parseReadingsCsv(text);
    expect(table.rows).toHaveLength(1);
    expect(table.badRows).toEqual([
      { line: 3, reason: 'halfValueLayer_mmAl: x: is not a number' },
      { line: 4, reason: 'potential_kV: 200: must be 20 to 150 kV' },
      { line: 5, reason: 'neither halfValueLayer_mmAl nor airKerma_uGy_per_mAs is given' },
      { line: 6, reason: 'potential_kV is empty' },
      { line: 7, reason: '2 cells where the heading has 3' },
      { line: 8, reason: 'halfValueLayer_mmAl: 1,234: is not a number' },
    ]);
  });

  test('without a needed column says what to name it, a unit of something else included', () => {
    expect(parseReadingsCsv('HVL (mm Al)\n3').badRows[0].reason).toMatch(
      /no column for potential_kV/,
    );
    expect(parseSizesCsv('thickness (kV)\n30').badRows[0].reason).toMatch(/in um or mm or cm or m/);
    expect(parseSizesCsv('').badRows[0].reason).toMatch(/empty/);
  });
});

describe('the other tables of a case', () => {
  test('a spectrum is per keV or per bin by its heading', () => {
    const perKeV = parseSpectrumCsv('energy_keV,fluence_per_mm2_per_keV_per_mAs\n20,5');
    expect(perKeV).toMatchObject({ fluenceIs: 'per keV', rows: [{ energy_keV: 20, fluence: 5 }] });
    const perBin = parseSpectrumCsv('energy (MeV),photons (/cm2/mAs)\n0.02,500');
    expect(perBin).toMatchObject({ fluenceIs: 'per bin', rows: [{ energy_keV: 20, fluence: 5 }] });
  });

  test('a control curve is read with its filter names', () => {
    const text =
      'thickness_mm,potential_kV,tubeCurrent_mA,exposureTime_ms,filter\n200,70,400,10,0.2 Cu\n';
    expect(parseControlCurveCsv(text).rows).toEqual([
      {
        thickness_mm: 200,
        potential_kV: 70,
        tubeCurrent_mA: 400,
        exposureTime_ms: 10,
        filter: '0.2 Cu',
      },
    ]);
  });

  test('sizes may leave out the weight', () => {
    expect(parseSizesCsv('thickness (cm),weight\n20,3\n25,\n').rows).toEqual([
      { thickness_mm: 200, weight: 3 },
      { thickness_mm: 250, weight: null },
    ]);
  });
});

describe('any table', () => {
  test('refuses a number too large to be converted or rounded', () => {
    const reason = (text: string) => parseSizesCsv(`thickness (m)\n${text}`).badRows[0]?.reason;
    expect(reason('1.7976931348623157e308')).toBe(
      'thickness_mm: 1.7976931348623157e308: is too large',
    );
    const columns = { a: { kind: 'number', names: [], unit: 'number' } } as const;
    expect(readColumns('a\n1.7976931348623151e+308', columns).rows).toEqual([]);
  });

  test('keeps every line: each is a row, a bad row, a comment or empty', () => {
    const cell = fc.oneof(fc.double({ noNaN: true }).map(String), fc.string({ maxLength: 8 }));
    const line = fc.array(cell, { minLength: 1, maxLength: 4 }).map((cells) => cells.join(','));
    fc.assert(
      fc.property(fc.array(line, { maxLength: 20 }), (body) => {
        const text = ['a,b', ...body].join('\n');
        const table = readColumns(text, {
          a: { kind: 'number', names: [], unit: 'number' },
          b: { kind: 'text', names: [], optional: true },
        });
        const seen = [...table.lines, ...table.badRows.map((row) => row.line)].sort(
          (x, y) => x - y,
        );
        const expected = csvRecords(text)
          .records.slice(1)
          .map((record) => record.line);
        expect(seen).toEqual(expected);
        for (const row of table.rows) expect(Number.isFinite(row.a)).toBe(true);
      }),
    );
  });
});
