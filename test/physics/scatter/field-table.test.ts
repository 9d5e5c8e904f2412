import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { unpackDecimals } from '../../../materials/packed-decimals.js';
import { elementTableSha256 } from '../../../materials/tables/elements.js';
import { airKermaAxes, fieldAxes, valueCount } from '../../../physics/scatter/field-axes.js';
import {
  backscatterFieldShare,
  multipleFieldFactor,
} from '../../../physics/scatter/field-table.js';
import {
  fieldTable,
  fieldTableElementsSha256,
  fieldTableSha256,
} from '../../../physics/scatter/tables/field-table.js';

describe('the field table', () => {
  it('is the one its hash was taken of', () => {
    expect(createHash('sha256').update(fieldTable).digest('hex')).toBe(fieldTableSha256);
  });
  it('was made with the cross sections in use: else run npm run scatter-table', () => {
    expect(fieldTableElementsSha256).toBe(elementTableSha256);
  });
  it('holds a value for every node', () => {
    const backscatter = fieldAxes.energies_keV.length * fieldAxes.halfSides_cm.length;
    const count = valueCount(fieldAxes) + valueCount(airKermaAxes) + backscatter;
    expect(fieldTable).toHaveLength(4 * count);
  });
  it('keeps three quarters of the backscatter or more in a 20 cm field, and no less in larger ones', () => {
    for (const energy of [20, 40, 60, 80, 120]) {
      const shares = [1, 5, 10, 20, 30].map((half) => backscatterFieldShare(energy, half));
      for (let k = 1; k < shares.length; k++)
        expect(shares[k]).toBeGreaterThanOrEqual(shares[k - 1]);
      expect(shares[2]).toBeGreaterThan(0.75);
      expect(shares[4]).toBeLessThanOrEqual(1);
    }
  });
  it('gives a factor within that of its nodes wherever it is asked', () => {
    const nodes = unpackDecimals(fieldTable, 0, valueCount(fieldAxes) + valueCount(airKermaAxes));
    const [least, greatest] = [Math.min(...nodes), Math.max(...nodes)];
    expect(least).toBeGreaterThan(0);
    fc.assert(
      fc.property(
        fc.constantFrom('energy' as const, 'airKerma' as const),
        fc.double({ min: 5, max: 200, noNaN: true }),
        fc.double({ min: 0, max: 100, noNaN: true }),
        fc.double({ min: 0, max: 100, noNaN: true }),
        fc.double({ min: 0, max: 100, noNaN: true }),
        (quantity, energy, thickness_cm, gap_cm, halfSide_cm) => {
          const factor = multipleFieldFactor(quantity, energy, {
            thickness_cm,
            gap_cm,
            halfSide_cm,
          });
          expect(factor).toBeGreaterThanOrEqual(least * (1 - 1e-12));
          expect(factor).toBeLessThanOrEqual(greatest * (1 + 1e-12));
        },
      ),
    );
  });
  it('tends to 1 as the field grows without a gap', () => {
    for (const energy of [40, 60, 100]) {
      const factor = multipleFieldFactor('energy', energy, {
        thickness_cm: 10,
        gap_cm: 0,
        halfSide_cm: 30,
      });
      expect(Math.abs(factor - 1)).toBeLessThan(0.03);
    }
  });
});
