import { describe, expect, test } from 'vitest';
import { massAttenuation } from '../../../materials/index.js';
import {
  airKerma_uGy,
  aluminiumEquivalent_mm,
  attenuate,
  beamQuality,
  broadBeamAirKerma_uGy,
  effectiveAttenuation_per_cm,
  effectiveEnergy_keV,
  energyWeightedMeanEnergy_keV,
  halfValueLayer_mm,
  homogeneityCoefficient,
  lineSpectrum,
  meanEnergy_keV,
  monoenergetic,
  quarterValueLayer_mm,
  scaleSpectrum,
  tenthValueLayer_mm,
  tungstenSpectrum,
  valueLayer_mm,
  valueLayers,
} from '../../../physics/beam/index.js';
import { readReference } from '../../reference/read-reference.js';
import { aluminium, copper, expectWithin, material, tubeBeam } from './helpers.js';

describe('published half-value layers', () => {
  const rows = readReference('tg195.csv').filter(({ set }) => set === 'mono HVL');
  test('are read from the reference file', () => expect(rows).toHaveLength(8));
  test.each(rows)('$item (NISTIR 5632) within 1 %', ({ item, value }) => {
    const energy_keV = Number(/at (\d+) keV/.exec(item)?.[1]);
    expectWithin(halfValueLayer_mm(monoenergetic(energy_keV), aluminium), Number(value), 1, item);
  });
});

describe('facts of the trade (common practice, no source)', () => {
  test('water halves 1.33 MeV photons in 11.2 cm, within 2 %', () => {
    expectWithin(halfValueLayer_mm(monoenergetic(1330), material('water')), 112, 2, 'HVL water');
  });
  test('lead lets a tenth of 1.33 MeV photons through 36.2 mm, within 2 %', () => {
    expectWithin(tenthValueLayer_mm(monoenergetic(1330), material('lead')), 36.2, 2, 'TVL lead');
  });
  test('homogeneity rises with aluminium and with copper', () => {
    const homogeneity = (al: number, cu: number) =>
      homogeneityCoefficient(tubeBeam(80, 12, al, cu)) ?? Number.NaN;
    expect(homogeneity(4, 0)).toBeGreaterThan(homogeneity(2.5, 0));
    expect(homogeneity(2.5, 0.2)).toBeGreaterThan(homogeneity(2.5, 0.1));
  });
});

describe('value layers', () => {
  const beam = tubeBeam(100, 12, 3);

  test('let through exactly the kerma they are named for', () => {
    for (const absorber of [aluminium, copper, material('water'), material('lead')]) {
      for (const transmission of [0.9, 0.5, 0.25, 0.1, 0.001]) {
        const thickness_mm = valueLayer_mm(beam, absorber, transmission) ?? Number.NaN;
        const behind = attenuate(beam, [{ material: absorber, thickness_mm }]);
        const what = `${absorber.name}, ${transmission}`;
        expectWithin(airKerma_uGy(behind) / airKerma_uGy(beam), transmission, 1e-8, what);
      }
    }
  });

  test('add up: the quarter-value layer is first plus second half-value layer', () => {
    const sum =
      (halfValueLayer_mm(beam, aluminium, 1) ?? 0) + (halfValueLayer_mm(beam, aluminium, 2) ?? 0);
    expectWithin(quarterValueLayer_mm(beam, aluminium), sum, 1e-9, 'QVL');
  });

  test('the second half-value layer is the first of the beam behind the first', () => {
    const thickness_mm = halfValueLayer_mm(beam, aluminium) ?? Number.NaN;
    const behind = attenuate(beam, [{ material: aluminium, thickness_mm }]);
    const second = halfValueLayer_mm(behind, aluminium) ?? Number.NaN;
    expectWithin(halfValueLayer_mm(beam, aluminium, 2), second, 1e-8, 'HVL2');
  });

  test('of a beam without photons are null and say why', () => {
    const empty = scaleSpectrum(beam, 0);
    expect(valueLayers(empty, aluminium, [0.5])).toEqual({
      thicknesses_mm: null,
      reason: 'the beam holds no photons',
    });
    expect(halfValueLayer_mm(empty, aluminium)).toBeNull();
    expect(homogeneityCoefficient(empty)).toBeNull();
    expect(effectiveEnergy_keV(empty)).toBeNull();
    expect(meanEnergy_keV(empty)).toBe(0);
  });

  test('above 3 MeV are given for one energy and refused with the reason for several', () => {
    const water = material('water');
    const expected = (10 * Math.LN2) / (massAttenuation(water, 6000) * water.density_g_per_cm3);
    expectWithin(halfValueLayer_mm(monoenergetic(6000), water), expected, 1e-9, 'HVL at 6 MeV');
    const several = lineSpectrum([
      [1000, 1],
      [6000, 1],
    ]);
    expect(valueLayers(several, water, [0.5]).reason).toMatch(/3000 keV/);
  });
});

describe('one energy', () => {
  const sole = monoenergetic(60);
  test('is perfectly homogeneous', () => {
    expect(homogeneityCoefficient(sole)).toBe(1);
    expect(beamQuality(sole).homogeneityCoefficient).toBe(1);
  });
  test('is its own mean and effective energy', () => {
    expect(meanEnergy_keV(sole)).toBe(60);
    expect(energyWeightedMeanEnergy_keV(sole)).toBe(60);
    expect(effectiveEnergy_keV(sole)).toBe(60);
    expect(beamQuality(sole).effectiveEnergy_keV).toBe(60);
  });
  test('has the effective attenuation of its energy', () => {
    const expected = massAttenuation(aluminium, 60) * aluminium.density_g_per_cm3;
    expectWithin(effectiveAttenuation_per_cm(sole, aluminium), expected, 1e-9, 'µ effective');
  });
});

describe('derived qualities of a tube beam', () => {
  const beam = tubeBeam(80, 12, 2.5);

  test('the effective energy has the half-value layer of the beam', () => {
    const energy = effectiveEnergy_keV(beam) ?? Number.NaN;
    expectWithin(
      halfValueLayer_mm(monoenergetic(energy), aluminium),
      halfValueLayer_mm(beam, aluminium) ?? Number.NaN,
      1e-6,
      'HVL1',
    );
  });

  test('the mean energy by energy fluence lies above the mean by number', () => {
    expect(energyWeightedMeanEnergy_keV(beam)).toBeGreaterThan(meanEnergy_keV(beam));
  });

  test('aluminium is equivalent to itself, and copper to several times its thickness', () => {
    const bare = tungstenSpectrum({ potential_kV: 80, anodeAngle_deg: 12 });
    const of = (name: string, thickness_mm: number) =>
      aluminiumEquivalent_mm(bare, [{ material: material(name), thickness_mm }]) ?? Number.NaN;
    expectWithin(of('aluminium', 3), 3, 1e-5, 'Al');
    expect(of('copper', 0.1)).toBeGreaterThan(2.5);
    expect(of('copper', 0.1)).toBeLessThan(4.5);
  });

  test('a broad beam is the narrow beam times its build-up', () => {
    expect(broadBeamAirKerma_uGy(10, 0.25)).toBe(12.5);
  });

  test('quality lists aluminium and copper and agrees with its parts', () => {
    const quality = beamQuality(beam, 80);
    expect(quality.halfValueLayers.map((layer) => layer.material)).toEqual(['aluminium', 'copper']);
    expectWithin(
      quality.halfValueLayers[1].tenth_mm,
      tenthValueLayer_mm(beam, copper) ?? 0,
      1e-9,
      'TVL',
    );
    expectWithin(quality.effectiveEnergy_keV, effectiveEnergy_keV(beam) ?? 0, 1e-9, 'E effective');
  });
});
