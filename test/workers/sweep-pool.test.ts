import { describe, expect, it } from 'vitest';
import { sweepHost } from '../../components/workers/sweep-host.js';
import type {
  FromSweepWorker,
  SweepWorker,
  ToSweepWorker,
} from '../../components/workers/sweep-messages.js';
import { type SweepPool, sweepPool } from '../../components/workers/sweep-pool.js';
import type { RoomTask } from '../../physics/sweep/room-task.js';
import { combineSweep, sweep, sweepPieceCount, wholeRoom } from '../../physics/sweep.js';
import { sampleCase } from '../physics/sample-case.js';

const parsed = sampleCase({
  room: { tube: { potential_kV: { min: 60, max: 100, step: 20 } }, grid: null },
  patient: {
    sizes: [
      { name: 'small', thickness_mm: 100 },
      { name: 'large', thickness_mm: 120 },
    ],
  },
  techniques: [{ name: 'Current', potential_kV: 80, control: { detectorAirKerma_uGy: 2.5 } }],
});
const request = wholeRoom(parsed.case);
const pieces = Array.from({ length: sweepPieceCount(request) }, (_, index) => ({
  kind: 'sweepPiece' as const,
  request,
  index,
}));

/** A worker of this process: everything goes through the post, one message a turn. */
const inProcess = (seen: ToSweepWorker[] = [], dies = false): SweepWorker => {
  let answer: (message: FromSweepWorker) => void = () => undefined;
  let lost: (message: string) => void = () => undefined;
  const take = sweepHost((message) => {
    const posted = structuredClone(message);
    setTimeout(() => answer(posted));
  });
  return {
    post: (message) => {
      seen.push(message);
      if (dies && message.kind === 'do') setTimeout(() => lost('out of memory'));
      else take(structuredClone(message));
    },
    listen: (onAnswer, onLost) => {
      answer = onAnswer;
      lost = onLost;
    },
    end: () => undefined,
  };
};

const indices = (seen: readonly ToSweepWorker[]): number[] =>
  seen.flatMap((message) =>
    message.kind === 'do' && message.task.kind === 'sweepPiece' ? [message.task.index] : [],
  );

describe('a pool of sweep workers', () => {
  it.each([1, 2, 3])('sweeps to the same map with %d workers', async (size) => {
    const pool = sweepPool(() => inProcess(), size);
    const answers = await pool.run(parsed, pieces);
    expect(combineSweep(request, answers)).toEqual(sweep(parsed.case, request));
  });

  it('tells of every answer as it comes', async () => {
    const heard: number[] = [];
    const pool = sweepPool(() => inProcess(), 2);
    await pool.run(parsed, pieces, { onAnswer: (index) => heard.push(index) });
    expect([...heard].sort((a, b) => a - b)).toEqual([...pieces.keys()]);
  });

  it('leaves a thickness to the worker that had it before', async () => {
    const seen: ToSweepWorker[][] = [];
    const pool = sweepPool(() => {
      const own: ToSweepWorker[] = [];
      seen.push(own);
      return inProcess(own);
    }, 2);
    await pool.run(parsed, pieces.slice(0, 1));
    const half = request.axes.filters.length;
    await pool.run(parsed, [...pieces.slice(0, half), ...pieces.slice(half)]);
    const first = indices(seen[0]).slice(1);
    expect(first[0]).toBeLessThan(half);
    expect(indices(seen[1])[0]).toBeGreaterThanOrEqual(half);
  });

  it('cancels at once, with the signal’s reason, and asks no more', async () => {
    const seen: ToSweepWorker[] = [];
    const pool = sweepPool(() => inProcess(seen), 1);
    const stop = new AbortController();
    const run = pool.run(parsed, pieces, {
      signal: stop.signal,
      onAnswer: () => stop.abort('enough'),
    });
    await expect(run).rejects.toBe('enough');
    const asked = indices(seen).length;
    await new Promise((done) => setTimeout(done, 50));
    expect(indices(seen).length).toBe(asked);
    expect(asked).toBeLessThanOrEqual(2);
    expect(pool.isBusy()).toBe(false);
  });

  it('does an urgent question before what is left of a sweep', async () => {
    const pool: SweepPool = sweepPool(() => inProcess(), 1);
    const order: string[] = [];
    const [size] = request.axes.sizes;
    const question: RoomTask = {
      kind: 'solve',
      question: { what: 'bestSetting', size, cost: 'incidentAirKerma', holdConstant: 'sdnr' },
    };
    const sweeping = pool.run(parsed, pieces).then(() => order.push('sweep'));
    const solving = pool
      .run(parsed, [question], { urgent: true })
      .then(() => order.push('question'));
    await Promise.all([sweeping, solving]);
    expect(order).toEqual(['question', 'sweep']);
  });

  it('fails the run whose task fails, and no other', async () => {
    const pool = sweepPool(() => inProcess(), 1);
    const [size] = request.axes.sizes;
    const noSuch = { what: 'leastAgent', size, technique: 9, targetSdnr: 5 } as const;
    const bad = pool.run(parsed, [{ kind: 'solve' as const, question: noSuch }]);
    const good = pool.run(parsed, pieces.slice(0, 1));
    await expect(bad).rejects.toThrow();
    expect((await good)[0].settings.length).toBe(3);
  });

  it('replaces workers that die, and gives up when they keep dying', async () => {
    let hired = 0;
    const pool = sweepPool(() => inProcess([], ++hired <= 2), 1);
    expect((await pool.run(parsed, pieces.slice(0, 2))).length).toBe(2);
    expect(hired).toBe(3);
    const doomed = sweepPool(() => inProcess([], true), 1);
    await expect(doomed.run(parsed, pieces)).rejects.toThrow('out of memory');
  });

  it('loads a case once for all its tasks', async () => {
    const seen: ToSweepWorker[] = [];
    const pool = sweepPool(() => inProcess(seen), 1);
    await pool.run(parsed, pieces);
    await pool.run(parsed, pieces);
    expect(seen.filter(({ kind }) => kind === 'load')).toHaveLength(1);
  });
});
