import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { binSizes } from '../../../physics/sizes.js';

const patients = fc.array(
  fc.record({
    thickness_mm: fc.integer({ min: 80, max: 500 }),
    weight: fc.integer({ min: 1, max: 9 }),
  }),
  { minLength: 1, maxLength: 300 },
);
const total = (rows: readonly { weight: number }[]) =>
  rows.reduce((sum, { weight }) => sum + weight, 0);
const mean = (rows: readonly { weight: number; thickness_mm: number }[]) =>
  rows.reduce((sum, row) => sum + row.weight * row.thickness_mm, 0) / total(rows);

describe('sizes from counted thicknesses', () => {
  it('are the thicknesses themselves while there are few', () => {
    const { sizes, width_mm } = binSizes([
      { thickness_mm: 220, weight: 2 },
      { thickness_mm: 180, weight: 1 },
      { thickness_mm: 220, weight: 1 },
    ]);
    expect(width_mm).toBeNull();
    expect(sizes).toEqual([
      { name: '180 mm', thickness_mm: 180, weight: 1 },
      { name: '220 mm', thickness_mm: 220, weight: 3 },
    ]);
  });

  it('are at most as many as asked, and lose no patient and no mean thickness', () => {
    fc.assert(
      fc.property(patients, (rows) => {
        const { sizes } = binSizes(rows, 10);
        expect(sizes.length).toBeLessThanOrEqual(10);
        expect(total(sizes)).toBe(total(rows));
        // Each bin's mean is kept to 0.1 mm.
        expect(Math.abs(mean(sizes) - mean(rows))).toBeLessThanOrEqual(0.05);
        const thicknesses = sizes.map(({ thickness_mm }) => thickness_mm);
        expect([...thicknesses].sort((a, b) => a - b)).toEqual(thicknesses);
        expect(new Set(sizes.map(({ name }) => name)).size).toBe(sizes.length);
      }),
    );
  });

  it('leave out what stands for no patient', () => {
    expect(binSizes([{ thickness_mm: 200, weight: 0 }]).sizes).toEqual([]);
  });
});
