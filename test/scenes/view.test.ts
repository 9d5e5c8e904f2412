import { describe, expect, test } from 'vitest';
import {
  isSectionView,
  obliqueShare,
  sectionView,
  turned,
  viewBetween,
  viewWords,
  zoomed,
} from '../../scenes/index.js';

describe('a view', () => {
  test('is told in words', () => {
    expect(viewWords(sectionView)).toBe('from the front, oblique');
    expect(viewWords({ ...sectionView, oblique: 0 })).toBe('from the front');
    expect(viewWords(turned(sectionView, 30, 20))).toBe('from 30° right, 20° above');
    expect(viewWords(zoomed(turned(sectionView, -5, -10), 1.4))).toBe(
      'from 5° left, 10° below, 1.4 times as large',
    );
  });

  test('is the section only where nothing has been turned, zoomed or shifted', () => {
    expect(isSectionView(sectionView)).toBe(true);
    expect(isSectionView(turned(turned(sectionView, 5, 0), -5, 0))).toBe(true);
    expect(isSectionView(turned(sectionView, 5, 0))).toBe(false);
    expect(isSectionView(zoomed(sectionView, 1.2))).toBe(false);
  });

  test('loses its oblique drawing as it is turned', () => {
    const shares = [0, 10, 20, 30, 60].map((angle) => obliqueShare(turned(sectionView, angle, 0)));
    expect(shares[0]).toBe(1);
    expect(shares[3]).toBe(0);
    expect(shares[4]).toBe(0);
    expect(shares[1]).toBeGreaterThan(shares[2]);
  });

  test('between two views begins at the one and ends at the other', () => {
    const to = { ...zoomed(turned(sectionView, 40, 20), 4), oblique: 0 };
    expect(viewBetween(sectionView, to, 0)).toEqual(sectionView);
    expect(viewBetween(sectionView, to, 1)).toBe(to);
    expect(viewBetween(sectionView, to, 0.5).zoom).toBeCloseTo(2, 12);
  });
});
