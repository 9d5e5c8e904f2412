/**
 * Reference beams against the standards' values in test/reference/qualities.csv (recalled, no text at
 * hand). The tolerances here are the tube model's own: 0.015 in homogeneity, 2.5 % in half-value
 * layer, 3 % in fluence per air kerma; the file's are wider.
 */
import { describe, expect, test } from 'vitest';
import {
  aluminiumForHalfValueLayer_mm,
  attenuate,
  halfValueLayer_mm,
  homogeneityCoefficient,
  idealSnrSquaredPerAirKerma_per_mm2_uGy,
  type ReferenceBeamName,
  referenceBeam,
  referenceQualities,
  tungstenSpectrum,
} from '../../../physics/beam/index.js';
import { readReference } from '../../reference/read-reference.js';
import { aluminium, expectWithin, material } from './helpers.js';

const rows = readReference('qualities.csv');
const named = (set: string, item: RegExp) =>
  rows
    .filter((row) => row.set === set && item.test(row.item))
    .map((row) => ({
      name: (/RQ[RA]\d+/.exec(row.item)?.[0] ?? '') as ReferenceBeamName,
      value: Number(row.value),
      source: row.source,
    }));

describe('RQR beams', () => {
  test.each(named('RQR', /HVL1/))(
    '$name has the half-value layer that defines it',
    ({ name, value }) => {
      expectWithin(halfValueLayer_mm(referenceBeam(name), aluminium), value, 1e-5, 'HVL1');
    },
  );

  const coefficients = named('RQR', /homogeneity/);
  test.each(coefficients)(
    '$name has the homogeneity coefficient $value within 0.015',
    ({ name, value }) => {
      const computed = homogeneityCoefficient(referenceBeam(name)) ?? Number.NaN;
      expect(Math.abs(computed - value), `computed ${computed}`).toBeLessThanOrEqual(0.015);
    },
  );

  test('their homogeneity is within 0.007 of the standard, root mean square', () => {
    const squares = coefficients.map(
      ({ name, value }) => ((homogeneityCoefficient(referenceBeam(name)) ?? 0) - value) ** 2,
    );
    const mean = squares.reduce((sum, square) => sum + square, 0) / squares.length;
    expect(Math.sqrt(mean)).toBeLessThanOrEqual(0.007);
  });
});

describe('RQA beams', () => {
  test.each(named('RQA', /HVL1/))(
    '$name has the half-value layer $value mm Al within 2.5 %',
    ({ name, value }) => {
      expectWithin(halfValueLayer_mm(referenceBeam(name), aluminium), value, 2.5, 'HVL1');
    },
  );

  test.each(named('RQA', /added filter/))(
    '$name adds the aluminium of the standard',
    ({ name, value }) => {
      const quality = referenceQualities.find(({ number }) => name === `RQA${number}`);
      expect(quality?.rqaAddedAluminium_mm).toBe(value);
    },
  );
});

describe('squared signal-to-noise ratio per air kerma of an ideal counter', () => {
  test.each(named('IEC62220', /2015/))(
    'in $name is $value per mm² and µGy within 3 % (2015 edition)',
    ({ name, value }) => {
      expectWithin(idealSnrSquaredPerAirKerma_per_mm2_uGy(referenceBeam(name)), value, 3, 'SNR²');
    },
  );

  // The editions disagree, by 5 % at RQA3, because the 2003 edition rests on the RQA of IEC 61267:1994,
  // set by half-value layers of 4.0, 7.1, 9.1 and 11.5 mm Al (recalled), and the 2015 edition on those
  // of 2005, set by the added filter. Filtered to the older half-value layers the model follows.
  const older: Record<string, [potential_kV: number, halfValueLayer_mmAl: number]> = {
    RQA3: [50, 4.0],
    RQA5: [70, 7.1],
    RQA7: [90, 9.1],
    RQA9: [120, 11.5],
  };
  test.each(named('IEC62220', /2003/))(
    'in $name as defined in 1994 is $value per mm² and µGy within 3 % (2003 edition)',
    ({ name, value }) => {
      const [potential_kV, halfValueLayer_mmAl] = older[name];
      const window = { material: material('beryllium'), thickness_mm: 7 };
      const bare = attenuate(tungstenSpectrum({ potential_kV, anodeAngle_deg: 20 }), [window]);
      const thickness_mm = aluminiumForHalfValueLayer_mm(bare, halfValueLayer_mmAl) ?? Number.NaN;
      const beam = attenuate(bare, [{ material: aluminium, thickness_mm }]);
      expectWithin(idealSnrSquaredPerAirKerma_per_mm2_uGy(beam), value, 3, 'SNR²');
    },
  );
});

describe('a reference beam', () => {
  test('is one object for one name and edge set', () => {
    expect(referenceBeam('RQA5', [33.169])).toBe(referenceBeam('RQA5', [33.169]));
  });
  test('takes the edges of a detector as boundaries', () => {
    expect([...referenceBeam('RQA5', [33.169]).edges_keV]).toContain(33.169);
  });
  test('of an unknown name is refused in words', () => {
    expect(() => referenceBeam('RQA1' as ReferenceBeamName)).toThrow(/RQR2 to RQR10/);
  });
});
