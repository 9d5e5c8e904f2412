import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { keepSoon } from '../../components/store/keep-soon.js';

describe('keeping a moment after the last change', () => {
  beforeEach(() => vi.useFakeTimers());
  afterEach(() => vi.useRealTimers());

  const keeperOf = (isKept = true) => {
    const kept: string[] = [];
    const told: boolean[] = [];
    const keep = async (value: string) => {
      kept.push(value);
      return isKept;
    };
    return { kept, told, keeper: keepSoon(keep, 400, (entry) => told.push(entry)) };
  };

  test('changes in quick succession are kept once, the last of them', async () => {
    const { kept, told, keeper } = keeperOf();
    keeper.later('one');
    await vi.advanceTimersByTimeAsync(300);
    keeper.later('two');
    await vi.advanceTimersByTimeAsync(399);
    expect(kept).toEqual([]);
    await vi.advanceTimersByTimeAsync(1);
    expect(kept).toEqual(['two']);
    expect(told).toEqual([true]);
  });

  test('what waits is kept at once when the page may go, and not again', async () => {
    const { kept, keeper } = keeperOf();
    keeper.now();
    expect(kept).toEqual([]);
    keeper.later('one');
    keeper.now();
    expect(kept).toEqual(['one']);
    await vi.advanceTimersByTimeAsync(1000);
    expect(kept).toEqual(['one']);
  });

  test('a failure to keep is told', async () => {
    const { told, keeper } = keeperOf(false);
    keeper.later('one');
    await vi.advanceTimersByTimeAsync(400);
    expect(told).toEqual([false]);
  });
});
