import { describe, expect, it } from 'vitest';
import { editDistance, nearestKey } from '../../../physics/case/nearest-key.js';

const keys = ['anodeAngle_deg', 'ripple_percent', 'potential_kV', 'thickness_mm', 'growthShare'];

describe('the nearest key', () => {
  it.each([
    ['anodeAngel_deg', 'anodeAngle_deg'],
    ['anode_angle', 'anodeAngle_deg'],
    ['thickness_cm', 'thickness_mm'],
    ['thickness', 'thickness_mm'],
    ['potential', 'potential_kV'],
    ['growthshare', 'growthShare'],
  ])('to %s is %s', (written, meant) => {
    expect(nearestKey(written, keys)).toBe(meant);
  });

  it('is none where nothing is near', () => {
    expect(nearestKey('colour', keys)).toBeUndefined();
    expect(nearestKey('', keys)).toBeUndefined();
    expect(nearestKey('x'.repeat(1e6), keys)).toBeUndefined();
    expect(nearestKey('thickness_mm', [])).toBeUndefined();
  });
});

describe('edits between words', () => {
  it('count inserted, deleted, replaced and swapped letters', () => {
    expect(editDistance('kitten', 'sitting')).toBe(3);
    expect(editDistance('angel', 'angle')).toBe(1);
    expect(editDistance('', 'abc')).toBe(3);
    expect(editDistance('abc', 'abc')).toBe(0);
  });
});
