import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { elementTableOf, momentumTransferNodes } from '../../materials/element-tables.js';
import { packDecimals, unpackDecimals } from '../../materials/packed-decimals.js';
import { shellNames } from '../../materials/shells.js';
import { elementTable, elementTableSha256 } from '../../materials/tables/elements.js';

const ledger = readFileSync(new URL('../../materials/tables/LEDGER.md', import.meta.url), 'utf8');

describe('the packed table', () => {
  test('has the hash that it and the ledger state', () => {
    const sha256 = createHash('sha256').update(elementTable).digest('hex');
    expect(elementTableSha256).toBe(sha256);
    expect(ledger).toContain(`SHA-256 of the packed text: \`${sha256}\``);
  });

  test('is followed to its last character by the reader', () => {
    const z92 = elementTableOf(92);
    expect(z92.incoherentScattering.at(-1)).toBe(92);
    expect(elementTable.length % 4).toBe(0);
  });

  test('holds published values digit for digit (XCOM, NBSIR 87-3597: iodine and lead)', () => {
    const iodine = elementTableOf(53);
    const at60 = iodine.energies_keV.indexOf(60);
    expect(iodine.photoelectric[at60]).toBe(7.2083);
    const at60scatter = iodine.scatteringEnergies_keV.indexOf(60);
    expect(iodine.coherent[at60scatter]).toBe(0.25768);
    expect(iodine.incoherent[at60scatter]).toBe(0.11104);
    const lead = elementTableOf(82);
    expect(lead.edges.find(({ shell }) => shellNames[shell] === 'M5')).toEqual({
      shell: 8,
      energy_keV: 2.484,
      below_cm2_per_g: 789.97,
      above_cm2_per_g: 1384.9,
    });
  });

  test.each(Array.from({ length: 92 }, (_, i) => i + 1))('is sound for Z = %i', (z) => {
    const table = elementTableOf(z);
    expect(table.energies_keV[0]).toBe(1);
    expect(table.energies_keV.at(-1)).toBe(20_000);
    const all = [table.photoelectric, table.coherent, table.incoherent, table.pair];
    for (const column of all) expect(column.every((value) => value > 0)).toBe(true);
    expect(table.formFactor[0]).toBeCloseTo(z, 1);
    expect(table.incoherentScattering.at(-1)).toBeCloseTo(z, 1);
    expect(table.formFactor).toHaveLength(momentumTransferNodes().length);
    for (const edge of table.edges) {
      expect(edge.above_cm2_per_g).toBeGreaterThan(edge.below_cm2_per_g);
      const binding_keV = table.bindingEnergies_keV[edge.shell];
      expect(Math.abs(Math.log(edge.energy_keV / binding_keV))).toBeLessThan(0.1);
    }
  });
});

describe('packed decimals', () => {
  test('come back as the number nearest to their five digits', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.integer({ min: 0, max: 99_999 }), fc.integer({ min: -40, max: 40 })), {
          minLength: 1,
        }),
        (parts) => {
          const values = parts.map(([digits, power]) => Number(`${digits}e${power}`));
          const packed = packDecimals(values);
          expect(packed).toHaveLength(4 * values.length);
          expect([...unpackDecimals(packed, 0, values.length)]).toEqual(values);
        },
      ),
    );
  });

  test('are rounded to five digits, half a unit at most', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-15, max: 1e15, noNaN: true }), (value) => {
        const [back] = unpackDecimals(packDecimals([value]), 0, 1);
        expect(Math.abs(back / value - 1)).toBeLessThanOrEqual(5.0001e-5);
      }),
    );
  });

  test('cannot be negative', () => {
    expect(() => packDecimals([-1])).toThrow(/from 0 upward/);
  });
});
