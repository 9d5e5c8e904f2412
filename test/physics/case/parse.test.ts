import { describe, expect, it } from 'vitest';
import {
  defaults,
  faultLine,
  type ParsedCase,
  parseCase,
  parseCaseText,
} from '../../../physics/case/index.js';
import { brokenCases, soundCase, soundText } from './broken-cases.js';

const parsed = (json: unknown, files?: Record<string, string>): ParsedCase => {
  const result = parseCase(json, files);
  if ('faults' in result) throw new Error(result.faults.map(faultLine).join('\n'));
  return result;
};

/** The least a case file must say. */
const smallest = () => ({
  format: 'stratabeam.case',
  version: 1,
  patient: { layers: [{ name: 'body', material: 'water', thickness_mm: 200 }] },
  task: {
    detail: {
      shape: 'vessel',
      inLayer: 'body',
      size_mm: 5,
      agent: { name: 'iodine', amount: { value: 100, unit: 'mg element/mL' } },
    },
  },
  techniques: [{ name: 'Current', potential_kV: 80, control: { tubeLoad_mAs: 10 } }],
});

describe('a broken case', () => {
  it.each(brokenCases)('with $name is refused in one clear line', ({ text, path, rule }) => {
    const result = parseCaseText(text);
    if (!('faults' in result)) throw new Error('was taken as sound');
    expect(result.faults[0]).toMatchObject({ path, rule: expect.stringContaining(rule) });
    for (const fault of result.faults) {
      const line = faultLine(fault);
      expect(line).not.toMatch(/[\p{Cc}\u2028-\u202e\u2066-\u2069]/u);
      expect(line.length).toBeLessThan(400);
      expect(line).not.toMatch(/undefined|NaN: must be NaN|\[object/);
      expect(fault.remedy).not.toBe('');
    }
  });

  it('is told all its faults at once, whichever part they are in', () => {
    const c = soundCase();
    c.room.tube.anodeAngle_deg = 95;
    c.patient.layers[2].thickness_mm = -3;
    c.techniques[0].potential_kV = 1e308;
    c.materials[0].massFractions = { H: 0.1 };
    const result = parseCase(c);
    const paths = 'faults' in result ? result.faults.map(({ path }) => path) : [];
    expect(paths).toEqual([
      'room.tube.anodeAngle_deg',
      'patient.layers[2].thickness_mm',
      'techniques[0].potential_kV',
      'materials[0].massFractions',
    ]);
  });

  it('gets one fault, not two, for a key in the wrong unit', () => {
    const c = soundCase();
    c.patient.layers[0].thickness_cm = 2;
    delete c.patient.layers[0].thickness_mm;
    const result = parseCase(c);
    expect('faults' in result && result.faults.map(faultLine)).toEqual([
      'patient.layers[0].thickness_cm: 2: is not a key of patient.layers[0]; write thickness_mm',
    ]);
  });

  it('is named with the nearest known name', () => {
    const c = soundCase();
    c.patient.layers[1].material = 'soft tisue';
    const result = parseCase(c);
    expect('faults' in result && result.faults.map(faultLine)).toEqual([
      'patient.layers[1].material: "soft tisue": must be a known material; did you mean "soft tissue"?',
    ]);
  });

  it('does not touch the prototype of objects', () => {
    parseCaseText(soundText.replace('"title"', '"__proto__": { "polluted": true }, "title"'));
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
  });

  it('that is no JSON data at all is refused without a crash', () => {
    const loop: Record<string, unknown> = {};
    loop.self = loop;
    for (const value of [undefined, Symbol('x'), () => 1, new Date(), 3n, loop, Number.NaN]) {
      expect(parseCase(value)).toHaveProperty('faults');
      const inside = { ...soundCase(), title: value };
      if (value !== undefined) expect(parseCase(inside)).toHaveProperty('faults');
    }
  });
});

describe('a sound case', () => {
  it('of the worked example is taken as it stands', () => {
    const { case: c } = parsed(soundCase());
    expect(c.techniques.map(({ name }) => name)).toEqual(['Current', 'Proposed']);
    expect(c.room.tube.outputFactor).toBe(0.87);
  });

  it('may say no more than patient, task and techniques', () => {
    const { case: c, assumed } = parsed(smallest());
    expect(c.room.geometry.sourceToDetector_mm).toBe(defaults.room.geometry.sourceToDetector_mm);
    expect(assumed).toContain('room.tube.anodeAngle_deg');
    expect(assumed).toContain('room.detector.opticalSwank');
    expect(assumed).toContain('techniques[0].acquisition.mode');
    expect(assumed).not.toContain('title');
  });

  it('has no grid in the beam where the room has none and the file is silent', () => {
    const { case: c, assumed } = parsed(smallest());
    expect(c.techniques[0].grid).toBe('out');
    expect(assumed).toContain('techniques[0].grid');
    const withGrid = { ...smallest(), room: { grid: { ratio: 10, strips_per_cm: 40 } } };
    expect(parsed(withGrid).case.techniques[0].grid).toBe('in');
  });

  it('has one mask frame in subtraction where the file is silent', () => {
    const json = smallest();
    const [technique] = json.techniques;
    const techniques = [{ ...technique, acquisition: { mode: 'subtraction' } }];
    expect(parsed({ ...json, techniques }).case.techniques[0].acquisition.maskFrames).toBe(1);
    expect(parsed(json).case.techniques[0].acquisition.maskFrames).toBe(0);
  });

  it('lists what it assumed, and nothing that the file says', () => {
    const { assumed } = parsed(soundCase());
    expect(assumed).toContain('room.detector.countingThreshold_keV');
    expect(assumed).toContain('task.detail.width_mm');
    expect(assumed).not.toContain('room.tube.anodeAngle_deg');
    expect(assumed).not.toContain('techniques[0].control');
  });

  it.each([20, 69.5, 69.6, 69.65, 69.7, 125.5, 150])('may have a potential of %f kV', (kV) => {
    const c = soundCase();
    c.techniques[1].potential_kV = kV;
    expect(parsed(c).case.techniques[1].potential_kV).toBe(kV);
  });

  it('may give a material by formula and density', () => {
    const c = soundCase();
    c.materials = [{ name: 'my salt', density_g_per_cm3: 2.17, formula: 'NaCl' }];
    c.patient.layers[0].material = 'my salt';
    const [{ massFractions }] = parsed(c).case.materials;
    expect(massFractions.Na).toBeCloseTo(22.99 / 58.44, 4);
    expect(massFractions.Na + massFractions.Cl).toBeCloseTo(1, 12);
  });

  it('may give the thickness of the strips alone, or their material: the other is assumed', () => {
    const c = soundCase();
    c.room.grid.strip = { thickness_um: 20 };
    const thin = parsed(c);
    expect(thin.case.room.grid?.strip).toEqual({ material: 'lead', thickness_um: 20 });
    expect(thin.assumed).toContain('room.grid.strip.material');
    expect(thin.assumed).not.toContain('room.grid.strip.thickness_um');
    c.room.grid.strip = { material: 'tungsten' };
    expect(parsed(c).case.room.grid?.strip.thickness_um).toBe(36);
  });

  it('keeps markup in names as the text it is', () => {
    const c = soundCase();
    c.techniques[1].name = '<img src=x onerror=alert(1)> & "quotes"';
    expect(parsed(c).case.techniques[1].name).toBe(c.techniques[1].name);
  });

  it('is frozen and leaves what was handed in as it was', () => {
    const json = soundCase();
    const { case: c } = parsed(json);
    expect(Object.isFrozen(c.room.tube.potential_kV)).toBe(true);
    expect(json).toEqual(soundCase());
  });

  it('may begin with a byte order mark', () => {
    expect(parseCaseText(`\ufeff${soundText}`)).toHaveProperty('case');
  });
});
