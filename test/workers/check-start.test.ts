import { describe, expect, it } from 'vitest';
import { evaluationHost } from '../../components/workers/evaluation-host.js';
import { sampleCase } from '../physics/sample-case.js';

const host = evaluationHost();
host.load(sampleCase());
const request = { technique: 'Current', size: 'as drawn', photons: 1_000_000, seed: 1 };

describe('a check made ready by the evaluation worker', () => {
  it('clones to the page, with three hundred photons of its first batch', () => {
    const start = structuredClone(host.check(request));
    if (!('setup' in start)) throw new Error('no setup');
    expect(start.tracks).toHaveLength(300);
    expect(Object.values(start.fates).reduce((sum, count) => sum + count, 0)).toBe(300);
    expect(start.setup.input.photons).toBe(1_000_000);
  });

  it('has no more tracks than its first batch has photons', () => {
    const start = host.check({ ...request, photons: 4000 });
    if (!('setup' in start)) throw new Error('no setup');
    expect(start.tracks).toHaveLength(100);
  });

  it('says why there is none', () => {
    const answer = host.check({ ...request, size: 'giant' });
    expect(answer).toEqual({
      findings: [
        { code: 'unknownName', severity: 'limit', message: 'The case has no size called giant.' },
      ],
    });
  });
});

describe('what happens along the depth, from the evaluation worker', () => {
  it('is told of every technique at the size asked for', () => {
    const depths = structuredClone(host.depths('as drawn'));
    expect(depths.map(({ technique, size }) => [technique, size])).toEqual([
      ['Current', 'as drawn'],
      ['Proposed', 'as drawn'],
    ]);
    for (const { absorbed, firstScatter } of depths) {
      expect(absorbed?.energy_mJ_per_mm.every((value) => value > 0)).toBe(true);
      expect(firstScatter.scatterToPrimary_per_cm.every((value) => value > 0)).toBe(true);
    }
    expect(host.depths('giant')).toEqual([]);
  });
});
