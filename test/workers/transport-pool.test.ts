import { afterAll, describe, expect, it } from 'vitest';
import { makeTransportThread } from '../../components/workers/make-transport-thread.js';
import { transportHost } from '../../components/workers/transport-host.js';
import type {
  FromTransportWorker,
  TransportWorker,
} from '../../components/workers/transport-messages.js';
import { type TransportPool, transportPool } from '../../components/workers/transport-pool.js';
import { runTransport } from '../../physics/jobs/index.js';
import { flyThrough, named, slabStack } from '../physics/transport/slab-runs.js';

const { input } = flyThrough(slabStack([[named('water'), 5]]), 60, { photons: 60_000, seed: 17 });
const expected = runTransport(input);

const pools: TransportPool[] = [];
afterAll(() => {
  for (const pool of pools) pool.end();
});
function poolOf(size: number, make: () => TransportWorker = makeTransportThread): TransportPool {
  const pool = transportPool(make, size);
  pools.push(pool);
  return pool;
}

/** A worker in this thread that answers a little later, and dies before its `life`-th answer. */
function mortalWorker(life: number): TransportWorker {
  let answer: (message: FromTransportWorker) => void = () => undefined;
  let lost: (reason: string) => void = () => undefined;
  let isEnded = false;
  let answers = 0;
  const take = transportHost((message) => {
    setTimeout(() => {
      if (isEnded) return;
      if (++answers < life) answer(message);
      else lost('out of memory');
    });
  });
  return {
    post: (message) => take(structuredClone(message)),
    listen: (onAnswer, onLost) => {
      answer = onAnswer;
      lost = onLost;
    },
    end: () => {
      isEnded = true;
    },
  };
}

describe('the transport pool', () => {
  for (const size of [1, 3]) {
    it(`gives the bits of a single thread with ${size} worker threads`, async () => {
      expect(await poolOf(size).run(input)).toEqual(expected);
    });
  }

  it('gives the same bits, and a second run, when workers die on the way', async () => {
    let made = 0;
    const pool = poolOf(2, () => mortalWorker(made++ < 2 ? 5 : Number.POSITIVE_INFINITY));
    expect(await pool.run(input)).toEqual(expected);
    expect(made).toBe(4);
    expect(await pool.run(input)).toEqual(expected);
    expect(made).toBe(4);
  });

  it('gives up, saying why, when workers keep dying', async () => {
    const pool = poolOf(2, () => mortalWorker(1));
    await expect(pool.run(input)).rejects.toThrow('out of memory');
  });

  it('reports progress at most twenty times a second, and the end, labelling what is partial', async () => {
    const seen: { at: number; photons: number; isComplete: boolean }[] = [];
    const pool = poolOf(1, () => mortalWorker(Number.POSITIVE_INFINITY));
    await pool.run(input, {
      onProgress: ({ photons, ofPhotons, partial }) => {
        const { isComplete } = partial();
        expect(isComplete).toBe(photons === ofPhotons);
        seen.push({ at: performance.now(), photons, isComplete });
      },
    });
    expect(seen.at(-1)).toMatchObject({ photons: 60_000, isComplete: true });
    const gaps = seen.slice(1, -1).map(({ at }, i) => at - seen[i].at);
    // Timers may come a millisecond early against the clock.
    expect(Math.min(50, ...gaps)).toBeGreaterThan(49);
    const counts = seen.map(({ photons }) => photons);
    expect(counts).toEqual([...counts].sort((a, b) => a - b));
  });

  it('is cancelled at once, and the next run is whole', async () => {
    const pool = poolOf(2);
    const long = { ...input, photons: 20_000_000 };
    const cancel = new AbortController();
    const run = pool.run(long, {
      signal: cancel.signal,
      onProgress: () => cancel.abort(new Error('cancelled by the user')),
    });
    await expect(run).rejects.toThrow('cancelled by the user');
    expect(await pool.run(input)).toEqual(expected);
  });

  it('never starts a run that was cancelled while it waited', async () => {
    const pool = poolOf(1, () => mortalWorker(Number.POSITIVE_INFINITY));
    const first = pool.run(input);
    await expect(pool.run(input, { signal: AbortSignal.abort(new Error('no')) })).rejects.toThrow(
      'no',
    );
    expect(await first).toEqual(expected);
  });

  it('passes on what a batch throws', async () => {
    const pool = poolOf(1);
    const broken = { ...input, source: { kind: 'point' } } as unknown as typeof input;
    await expect(pool.run(broken)).rejects.toThrow('TypeError');
  });
});
