import { describe, expect, test } from 'vitest';
import { askDepths } from '../../../components/desk/transport-section/ask-depths.js';
import type { ParsedCase } from '../../../physics/case/index.js';
import type { DepthProfiles } from '../../../physics/depth-profiles.js';
import { sampleCase } from '../sample/case.js';

const asking = (depths: () => Promise<DepthProfiles[]>) => {
  const told: string[] = [];
  let parsed: ParsedCase = { case: sampleCase, assumed: [] };
  const ask = askDepths(
    () => ({ load: async () => undefined, depths }),
    () => parsed,
    {
      depths: (profiles) => told.push(`${profiles.length} profiles`),
      trouble: (words) => told.push(words),
    },
  );
  const change = () => {
    parsed = { ...parsed };
  };
  return { told, ask, change };
};

describe('what happens along the depth', () => {
  test('is told when it comes', async () => {
    const { told, ask } = asking(async () => []);
    await ask('median');
    expect(told).toEqual(['', '0 profiles']);
  });

  test('that could not be computed is told, and asking again takes the words away', async () => {
    let isBroken = true;
    const { told, ask } = asking(async () => {
      if (isBroken) throw new Error('out of memory');
      return [];
    });
    await ask('median');
    isBroken = false;
    await ask('median');
    expect(told[1]).toContain('could not be computed: out of memory');
    expect(told.slice(2)).toEqual(['', '0 profiles']);
  });

  test('of a case that has changed since is dropped', async () => {
    const { told, ask, change } = asking(async () => []);
    const answer = ask('median');
    change();
    await answer;
    expect(told).toEqual(['']);
  });
});
