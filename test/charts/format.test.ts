import { describe, expect, test } from 'vitest';
import {
  formatEntry,
  formatNumber,
  formatPercent,
  formatRatio,
} from '../../components/charts/format.js';

describe('numbers on paper', () => {
  test.each([
    [1.4163, '1.42'],
    [0.07128, '0.0713'],
    [0.9996, '1.00'],
    [262.5, '263'],
    [12345, '12300'],
    [0, '0'],
    [-0.148, '−0.148'],
    [0.00004123, '4.12 × 10⁻⁵'],
    [1.9e6, '1.90 × 10⁶'],
    [null, '–'],
    [Number.NaN, '–'],
    [Number.POSITIVE_INFINITY, '–'],
  ])('%s is set as %s', (value, text) => {
    expect(formatNumber(value)).toBe(text);
  });

  test.each([
    [0.5, '×0.50'],
    [1, '×1.00'],
    [12.44, '×12.4'],
    [0.0213, '×0.0213'],
    [null, '–'],
  ])('ratio %s is set as %s', (ratio, text) => {
    expect(formatRatio(ratio)).toBe(text);
  });

  test('an entry is set as it was typed, without rounding dust', () => {
    expect(formatEntry(0.1 + 0.2)).toBe('0.3');
    expect(formatEntry(202)).toBe('202');
  });

  test('shares are set as percent', () => {
    expect(formatPercent(0.25)).toBe('25.0 %');
    expect(formatPercent(0.004)).toBe('0.40 %');
  });
});
