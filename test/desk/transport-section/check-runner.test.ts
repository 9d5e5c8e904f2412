import { describe, expect, it } from 'vitest';
import { checkRunner } from '../../../components/desk/transport-section/check-runner.js';
import type { CheckState } from '../../../components/desk/transport-section/check-state.js';
import { evaluationHost } from '../../../components/workers/evaluation-host.js';
import type { Evaluator } from '../../../components/workers/evaluator.js';
import { transportHost } from '../../../components/workers/transport-host.js';
import type {
  FromTransportWorker,
  TransportWorker,
} from '../../../components/workers/transport-messages.js';
import { transportPool } from '../../../components/workers/transport-pool.js';
import { checkReport, setUpCheck } from '../../../physics/check-by-transport/index.js';
import { runTransport } from '../../../physics/jobs/index.js';
import { sampleCase } from '../../physics/sample-case.js';

const parsed = sampleCase();
const request = { technique: 'Current', size: 'as drawn', photons: 8_000, seed: 3 };

/** A worker in this thread that answers a little later; counts the batches it was given. */
function counted(batches: { flown: number }): TransportWorker {
  let answer: (message: FromTransportWorker) => void = () => undefined;
  const take = transportHost((message) => setTimeout(() => answer(message)));
  return {
    post: (message) => {
      if (message.kind === 'fly') batches.flown += 1;
      take(message);
    },
    listen: (heard) => {
      answer = heard;
    },
    end: () => undefined,
  };
}

function stood(host = evaluationHost()) {
  const batches = { flown: 0 };
  const pool = transportPool(() => counted(batches), 1);
  const evaluator: Pick<Evaluator, 'load' | 'check'> = {
    load: async (next) => host.load(next),
    check: async (asked) => host.check(asked),
  };
  const told: CheckState[] = [];
  let clock_ms = 0;
  const parts = { evaluator: () => evaluator, pool: () => pool, now_ms: () => (clock_ms += 10) };
  return { runner: checkRunner(parts, (state) => told.push(state)), told, batches };
}

describe('a run of the check', () => {
  it('ends with the report of the whole run, the tracks with it', async () => {
    const { runner, told } = stood();
    await runner.run(parsed, request);
    const last = told.at(-1);
    const setup = setUpCheck(parsed.case, request);
    if (!('input' in setup)) throw new Error('no setup');
    const whole = checkReport(setup, runTransport(setup.input), null);
    expect(last?.phase).toBe('done');
    expect({ ...last?.report, photonsPerSecond: null }).toEqual(whole);
    expect(told.map(({ phase }) => phase)).toContain('flying');
    expect(told[0].phase).toBe('preparing');
    // Tracks are photons of the first batch, which holds a fortieth of so small a run.
    expect(last?.tracks).toHaveLength(200);
    expect(last?.history.at(-1)?.photons).toBe(8_000);
  });

  it('is cancelled at once, keeps what was said, and flies no more', async () => {
    const { runner, told, batches } = stood();
    const run = runner.run(parsed, { ...request, photons: 4_000_000 });
    await new Promise<void>((done) => {
      const look = setInterval(() => {
        if (!told.some(({ report }) => report !== null)) return;
        clearInterval(look);
        done();
      }, 2);
    });
    runner.cancel();
    const flown = batches.flown;
    expect(told.at(-1)).toMatchObject({ phase: 'cancelled', message: 'cancelled' });
    expect(told.at(-1)?.report?.isComplete).toBe(false);
    await run;
    await new Promise((done) => setTimeout(done, 200));
    expect(batches.flown - flown).toBeLessThanOrEqual(1);
    expect(told.at(-1)?.phase).toBe('cancelled');
  });

  it('gives way to the next run', async () => {
    const { runner, told } = stood();
    const first = runner.run(parsed, { ...request, photons: 4_000_000 });
    const second = runner.run(parsed, request);
    await Promise.all([first, second]);
    expect(told.at(-1)).toMatchObject({ phase: 'done', request });
  });

  it('says why it cannot be made', async () => {
    const { runner, told } = stood();
    await runner.run(parsed, { ...request, technique: 'Nobody' });
    expect(told.at(-1)).toMatchObject({
      phase: 'failed',
      message: 'The case has no technique called Nobody.',
    });
  });

  it('says so when the worker breaks', async () => {
    const broken = {
      ...evaluationHost(),
      check: () => {
        throw new Error('out of memory');
      },
    };
    const { runner, told } = stood(broken);
    await runner.run(parsed, request);
    expect(told.at(-1)).toMatchObject({ phase: 'failed', message: 'out of memory' });
  });
});
