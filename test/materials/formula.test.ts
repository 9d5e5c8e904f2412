import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { compound, elements, molarMass_g_per_mol, parseFormula } from '../../materials/index.js';

const counts = (formula: string) =>
  Object.fromEntries([...parseFormula(formula)].map(([{ symbol }, n]) => [symbol, n]));

describe('a formula', () => {
  test.each([
    ['H2O', { H: 2, O: 1 }],
    ['BaSO4', { Ba: 1, S: 1, O: 4 }],
    ['Ca10(PO4)6(OH)2', { Ca: 10, P: 6, O: 26, H: 2 }],
    ['K4(Fe(CN)6)', { K: 4, Fe: 1, C: 6, N: 6 }],
    ['C19 H26 I3 N3 O9', { C: 19, H: 26, I: 3, N: 3, O: 9 }],
    ['Gd2O2S', { Gd: 2, O: 2, S: 1 }],
    ['Fe0.95O', { Fe: 0.95, O: 1 }],
    ['CO', { C: 1, O: 1 }],
    ['Co', { Co: 1 }],
  ])('%s is read', (formula, expected) => {
    expect(counts(formula)).toEqual(expected);
  });

  test.each([
    ['', 'is empty; write element symbols such as H2O'],
    ['NaCl)', 'has a closing parenthesis at place 5 that was never opened; remove it'],
    ['((H2O)', 'opens a parenthesis at place 1 that is never closed; close it'],
    ['Ca()2', 'has empty parentheses at place 3; fill or remove them'],
    ['Xx2', 'has "Xx" at place 1, which is no element from H to U'],
    ['h2o', 'has "h" at place 1, which is no element from H to U'],
    ['2H', 'has "2" at place 1, which is no element from H to U'],
    ['H0', 'has the count 0 at place 2; counts must be above 0'],
    ['H2+', 'has "+" at place 3, which is no element from H to U'],
  ])('"%s" is refused in plain words', (formula, words) => {
    expect(() => parseFormula(formula)).toThrow(`formula: "${formula}": ${words}`);
  });

  test('either is read or refused with a message that names it, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 20 }), (formula) => {
        try {
          const mass = molarMass_g_per_mol(parseFormula(formula));
          expect(mass).toBeGreaterThan(1);
        } catch (refusal) {
          expect((refusal as Error).message).toContain(`formula: "${formula}": `);
        }
      }),
    );
  });

  test('weighs as much as its atoms', () => {
    const symbols = fc.constantFrom(...elements.map(({ symbol }) => symbol));
    fc.assert(
      fc.property(
        fc.array(fc.tuple(symbols, fc.integer({ min: 1, max: 30 })), { minLength: 1 }),
        (parts) => {
          const formula = parts.map(([symbol, n]) => `(${symbol}${n})2`).join('');
          const expected = parts.reduce((sum, [symbol, n]) => {
            const element = elements.find((candidate) => candidate.symbol === symbol);
            return sum + 2 * n * (element?.atomicWeight_g_per_mol ?? Number.NaN);
          }, 0);
          expect(molarMass_g_per_mol(parseFormula(formula)) / expected).toBeCloseTo(1, 12);
        },
      ),
    );
  });
});

describe('a compound', () => {
  test('of water has the composition of ICRU 44 (0.111898 hydrogen)', () => {
    const [hydrogen] = compound('H2O', 1).massFractions;
    expect(Math.abs(hydrogen.massFraction - 0.111898)).toBeLessThan(1e-5);
  });

  test.each([0, -1, Number.NaN, 35])('of density %s is refused', (density) => {
    expect(() => compound('H2O', density)).toThrow(/density_g_per_cm3: .*must be above 0/);
  });
});
