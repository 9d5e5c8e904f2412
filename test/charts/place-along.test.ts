import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { placeAlong } from '../../components/charts/place-along.js';

describe('labels placed along a line', () => {
  test('stand where they want to when there is room', () => {
    expect(
      placeAlong(
        [
          { anchor: 50, height: 20 },
          { anchor: 150, height: 20 },
        ],
        0,
        300,
      ),
    ).toEqual([40, 140]);
  });

  test('two that want the same place share the way', () => {
    expect(
      placeAlong(
        [
          { anchor: 100, height: 20 },
          { anchor: 100, height: 20 },
        ],
        0,
        300,
      ),
    ).toEqual([80, 100]);
  });

  test('stay inside the line', () => {
    expect(
      placeAlong(
        [
          { anchor: 0, height: 20 },
          { anchor: 300, height: 20 },
        ],
        0,
        300,
      ),
    ).toEqual([0, 280]);
  });

  const wishes = fc.array(
    fc.record({
      anchor: fc.double({ min: 0, max: 1000, noNaN: true }),
      height: fc.integer({ min: 1, max: 60 }),
    }),
    { maxLength: 20 },
  );
  const sorted = wishes.map((list) => [...list].sort((a, b) => a.anchor - b.anchor));

  test('never overlap, keep their order, and never leave the top', () => {
    fc.assert(
      fc.property(sorted, (list) => {
        const tops = placeAlong(list, 0, 1000);
        tops.forEach((top, i) => {
          const least = i === 0 ? 0 : tops[i - 1] + list[i - 1].height;
          expect(top).toBeGreaterThanOrEqual(least - 1e-9);
        });
      }),
    );
  });

  test('do not pass the end of the line when they fit on it', () => {
    fc.assert(
      fc.property(sorted, (list) => {
        const needed = list.reduce((sum, { height }) => sum + height, 0);
        const tops = placeAlong(list, 0, 1300);
        const last = list.length - 1;
        if (needed <= 1300 && last >= 0)
          expect(tops[last] + list[last].height).toBeLessThanOrEqual(1300 + 1e-9);
      }),
    );
  });
});
