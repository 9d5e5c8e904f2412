import { describe, expect, test } from 'vitest';
import * as constants from '../../materials/constants.js';

describe('constants', () => {
  test.each(Object.values(constants))(
    '$name names unit and reference and is frozen',
    (constant) => {
      expect(constant.unit).not.toBe('');
      expect(constant.reference).not.toBe('');
      expect(constant.uncertainty).toBeGreaterThanOrEqual(0);
      expect(Object.isFrozen(constant)).toBe(true);
    },
  );

  test('derived ones have their handbook values', () => {
    expect(constants.photonEnergyWavelength_keV_angstrom.value).toBeCloseTo(12.39841984, 8);
    expect(constants.pairThreshold_keV.value).toBeCloseTo(1021.9979, 4);
    expect(constants.joulePerKeV.value).toBeCloseTo(1.602176634e-16, 25);
    expect(constants.thomsonCrossSection_cm2.value).toBeCloseTo(6.6524587e-25, 31);
    expect(constants.airKermaPerRoentgen_mGy.value).toBeCloseTo(8.76, 2);
  });
});
