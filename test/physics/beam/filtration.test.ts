import { describe, expect, test } from 'vitest';
import { beamFaults } from '../../../physics/beam/index.js';
import { faultLine } from '../../../physics/case/fault.js';
import { aluminium, copper, material } from './helpers.js';

const setting = { potential_kV: 80, anodeAngle_deg: 12 };

describe('a beam is refused', () => {
  test('with less than 1 mm aluminium-equivalent filtration', () => {
    const faults = beamFaults(setting, [{ material: aluminium, thickness_mm: 0.8 }]);
    expect(faults.map(faultLine)).toEqual([
      'room.tube.inherentFilter: 0.8 mm Al in all: must be at least 1 mm aluminium equivalent with the added filter; enter the filtration of tube and housing',
    ]);
    expect(beamFaults(setting, [])).toHaveLength(1);
  });
  test.each([
    [{ ...setting, potential_kV: 15 }, 'room.tube.potential_kV'],
    [{ ...setting, potential_kV: 151 }, 'room.tube.potential_kV'],
    [{ ...setting, potential_kV: Number.NaN }, 'room.tube.potential_kV'],
    [{ ...setting, anodeAngle_deg: 95 }, 'room.tube.anodeAngle_deg'],
    [{ ...setting, ripple_percent: 120 }, 'room.tube.ripple_percent'],
  ])('outside the model: %o', (outside, path) => {
    const faults = beamFaults(outside, [{ material: aluminium, thickness_mm: 3 }]);
    expect(faults.map((fault) => fault.path)).toEqual([path]);
  });
});

describe('a beam is accepted', () => {
  test.each([
    ['1 mm of aluminium', [{ material: aluminium, thickness_mm: 1 }]],
    ['copper of the same effect', [{ material: copper, thickness_mm: 0.1 }]],
    ['very much filtration', [{ material: material('lead'), thickness_mm: 3 }]],
    ['a K-edge filter', [{ material: material('molybdenum'), thickness_mm: 0.03 }]],
  ])('with %s', (_, layers) => {
    expect(beamFaults(setting, layers)).toEqual([]);
  });
});
