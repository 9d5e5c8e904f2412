import { describe, expect, test } from 'vitest';
import { latestWins, superseded } from '../../components/workers/latest-wins.js';

/** A run under test control: what was begun, and how to end it. */
function controlled() {
  const begun: number[] = [];
  const ends: ((value: string) => void)[] = [];
  const fails: ((error: Error) => void)[] = [];
  const ask = latestWins((input: number) => {
    begun.push(input);
    return new Promise<string>((resolve, reject) => {
      ends.push(resolve);
      fails.push(reject);
    });
  });
  return { ask, begun, ends, fails };
}

describe('the latest request wins', () => {
  test('a single request is run and answered', async () => {
    const { ask, ends } = controlled();
    const answer = ask(1);
    ends[0]('one');
    expect(await answer).toBe('one');
  });

  test('of requests that come while one runs, only the last is run', async () => {
    const { ask, begun, ends } = controlled();
    const first = ask(1);
    const second = ask(2);
    const third = ask(3);
    expect(await second).toBe(superseded);
    ends[0]('one');
    expect(await first).toBe('one');
    ends[1]('three');
    expect(await third).toBe('three');
    expect(begun).toEqual([1, 3]);
  });

  test('a run that fails rejects its own request and lets the next begin', async () => {
    const { ask, ends, fails } = controlled();
    const first = ask(1);
    const second = ask(2);
    fails[0](new Error('broken'));
    await expect(first).rejects.toThrow('broken');
    ends[1]('two');
    expect(await second).toBe('two');
  });

  test('a request after all is quiet begins at once', async () => {
    const { ask, begun, ends } = controlled();
    const first = ask(1);
    ends[0]('one');
    await first;
    void ask(2);
    expect(begun).toEqual([1, 2]);
  });
});
