import { describe, expect, it } from 'vitest';
import { withReport } from '../../../components/desk/transport-section/check-history.js';
import type { CheckPoint } from '../../../components/desk/transport-section/check-state.js';
import { sampleReport } from './sample-check.js';

describe('the history of a run', () => {
  it('keeps the first and the last point, and few between that can be told apart', () => {
    let history: readonly CheckPoint[] = [];
    for (let photons = 25_000; photons <= 10_000_000; photons += 25_000) {
      history = withReport(history, { ...sampleReport, photons });
    }
    expect(history[0].photons).toBe(25_000);
    expect(history.at(-1)?.photons).toBe(10_000_000);
    expect(history.length).toBeLessThan(110);
    expect(history.length).toBeGreaterThan(40);
    const counts = history.map(({ photons }) => photons);
    expect(counts).toEqual([...new Set(counts)].sort((a, b) => a - b));
  });
});
