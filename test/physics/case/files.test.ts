import { describe, expect, it } from 'vitest';
import { faultLine, parseCase, referencedFiles } from '../../../physics/case/index.js';
import { type Loose, soundCase } from './broken-cases.js';

const withSizes = (): Loose => {
  const c = soundCase();
  c.patient.sizes = { file: 'sizes.csv' };
  return c;
};

const withCurve = (): Loose => {
  const c = soundCase();
  c.techniques[0].control = { curve: 'control.csv' };
  return c;
};

const curve = [
  'thickness_mm,potential_kV,tubeCurrent_mA,exposureTime_ms,filter',
  '150,70,200,60,0.2 Cu',
  '250,80,400,80,none',
].join('\n');

const lines = (json: unknown, files: Record<string, string>): string[] => {
  const result = parseCase(json, files);
  return 'faults' in result ? result.faults.map(faultLine) : [];
};

describe('files that a case names', () => {
  it('are listed once each', () => {
    const c = withSizes();
    c.techniques[0].control = { curve: 'control.csv' };
    c.techniques[1].control = { curve: 'control.csv' };
    c.room.source = { kind: 'spectrum', file: 'spectrum.csv' };
    expect(referencedFiles(c)).toEqual(['sizes.csv', 'spectrum.csv', 'control.csv']);
    expect(referencedFiles(null)).toEqual([]);
  });

  it('give the size mix, with a weight of 1 where the table has none', () => {
    const result = parseCase(withSizes(), { 'sizes.csv': 'thickness_mm\n180\n220\n' });
    expect('case' in result && result.case.patient.sizes).toEqual([
      { name: '180 mm', thickness_mm: 180, weight: 1 },
      { name: '220 mm', thickness_mm: 220, weight: 1 },
    ]);
  });

  it('are no assumption, but a weight they leave out is', () => {
    const c = withSizes();
    c.techniques[0].control = { curve: 'control.csv' };
    const result = parseCase(c, { 'sizes.csv': 'thickness_mm\n180\n', 'control.csv': curve });
    const assumed = 'case' in result ? result.assumed : [];
    expect(assumed.filter((path) => /sizes|control/.test(path))).toEqual([
      'patient.sizes[0].weight',
    ]);
  });

  it('give the control curve', () => {
    const result = parseCase(withCurve(), { 'control.csv': curve });
    expect('case' in result && result.case.techniques[0].control).toMatchObject({
      curve: 'control.csv',
      rows: [{ thickness_mm: 150, filter: '0.2 Cu' }, { tubeCurrent_mA: 400 }],
    });
  });

  it('give a spectrum per keV whether the table is per keV or per bin', () => {
    const spectrum = (text: string) => {
      const c = soundCase();
      c.room.source = { kind: 'spectrum', file: 's.csv' };
      const result = parseCase(c, { 's.csv': text });
      return 'case' in result ? result.case.room.source : result.faults;
    };
    const perKeV = spectrum('energy_keV,fluence_per_mm2_per_keV_per_mAs\n20,1\n22,2\n24,1\n');
    const perBin = spectrum('energy_keV,fluence_per_mm2_per_mAs\n20,2\n22,4\n24,2\n');
    expect(perKeV).toMatchObject({ rows: [[20, 1], [22, 2], [24, 1]] }); // biome-ignore format: a table
    expect(perBin).toEqual(perKeV);
  });

  it('are refused line by line where they cannot be read', () => {
    expect(lines(withSizes(), { 'sizes.csv': 'thickness_mm,weight\n180,1\nabc,1\n220\n' })).toEqual(
      [
        'patient.sizes.file: sizes.csv, line 3: must be readable, but thickness_mm: abc: is not a number; correct the line or take it out',
        'patient.sizes.file: sizes.csv, line 4: must be readable, but 1 cells where the heading has 2; correct the line or take it out',
      ],
    );
  });

  it('must name the unit of a column', () => {
    expect(lines(withSizes(), { 'sizes.csv': 'thickness,weight\n180,1\n' })).toEqual([
      'patient.sizes.file: sizes.csv: must name the unit of thickness_mm in its heading; write the heading as in thickness_mm',
    ]);
  });

  it('must hold rows', () => {
    expect(lines(withSizes(), { 'sizes.csv': 'thickness_mm,weight\n' })).toEqual([
      'patient.sizes.file: sizes.csv: must hold at least one row below its heading; enter the rows',
    ]);
  });

  it('must name filters of the room, in rising thickness', () => {
    const [heading, thin, thick] = curve.split('\n');
    const swapped = [heading, thick, thin.replace('0.2 Cu', '0.9 Cu')].join('\n');
    expect(lines(withCurve(), { 'control.csv': swapped })).toEqual([
      'techniques[0].control.rows[1].thickness_mm: 150: must be above the one before, 250; order the control curve by thickness',
      'techniques[0].control.rows[1].filter: "0.9 Cu": must be one of room.filters; did you mean "0.2 Cu"?',
    ]);
  });

  it('need not be handed in where their rows stand in the case', () => {
    const first = parseCase(withCurve(), { 'control.csv': curve });
    if ('faults' in first) throw new Error('refused');
    expect(referencedFiles(first.case)).toEqual([]);
    expect(parseCase(first.case)).toMatchObject({ case: first.case });
  });
});
