import { describe, expect, it } from 'vitest';
import type { SweepMapData } from '../../../components/charts/sweep-map-layout.js';
import { adoptSetting, replacesControl } from '../../../components/desk/sweep-section/adopt.js';
import { movedCursor } from '../../../components/desk/sweep-section/map-keys.js';
import { piecesInOrder, sweepRunner } from '../../../components/desk/sweep-section/sweep-runner.js';
import {
  type SweepState,
  settingsOfSize,
  sweepBasis,
  wholeSweep,
} from '../../../components/desk/sweep-section/sweep-state.js';
import { progressWords } from '../../../components/desk/sweep-section/sweep-words.js';
import { type Json, valueAtPath } from '../../../components/store/path.js';
import { parseCase } from '../../../physics/case/index.js';
import { wholeRoom } from '../../../physics/sweep.js';
import { sampleCase, sampleJson } from '../../physics/sample-case.js';
import { samePool } from '../sample/pool.js';

const parsed = sampleCase({
  room: { tube: { potential_kV: { min: 60, max: 100, step: 20 } } },
  patient: {
    sizes: [
      { name: 'small', thickness_mm: 100 },
      { name: 'large', thickness_mm: 120 },
    ],
  },
});
const request = wholeRoom(parsed.case);

describe('a setting adopted as Proposed', () => {
  const document = sampleJson as unknown as Json;

  it('changes potential and filter and nothing else', () => {
    const adopted = { potential_kV: 65, filter: '0.1 Cu', detectorAirKerma_uGy: null };
    const next = adoptSetting(1, adopted)(document);
    const proposed = { ...sampleJson.techniques[1], potential_kV: 65, filter: '0.1 Cu' };
    expect(next).toEqual({ ...sampleJson, techniques: [sampleJson.techniques[0], proposed] });
  });

  it('begins as a copy of Current where nothing is proposed, and is a sound case', () => {
    const alone = { ...sampleJson, techniques: [sampleJson.techniques[0]] } as unknown as Json;
    const adopted = { potential_kV: 65, filter: '0.1 Cu', detectorAirKerma_uGy: 1.23456 };
    const next = adoptSetting(null, adopted)(alone);
    expect(valueAtPath(next, 'techniques[1]')).toEqual({
      name: 'Proposed',
      potential_kV: 65,
      filter: '0.1 Cu',
      control: { detectorAirKerma_uGy: 1.235 },
    });
    expect(parseCase(next)).toHaveProperty('case');
  });

  it('takes the place of a control curve, which would decide the setting itself', () => {
    const curve = { control: { curve: 'a.csv', rows: [] } };
    const curved = { ...parsed.case.techniques[1], ...curve };
    const c = { ...parsed.case, techniques: [parsed.case.techniques[0], curved] };
    expect(replacesControl(c, 1)).toBe(true);
    expect(replacesControl(parsed.case, 1)).toBe(false);
  });
});

describe('keys on the map', () => {
  const data = {
    potentials_kV: Array.from({ length: 30 }, (_, i) => 50 + i),
    rows: ['none', '0.1 Cu', '0.3 Cu'].map((filter) => ({ filter, cells: [] })),
    best: { potential_kV: 62, filter: '0.1 Cu', merit: 1, window90_kV: [60, 64] },
  } as unknown as SweepMapData;

  it('begin at the best setting', () => {
    expect(movedCursor(data, null, 'ArrowLeft')).toEqual({ column: 12, row: 1 });
    expect(movedCursor({ ...data, best: null }, null, 'End')).toEqual({ column: 0, row: 0 });
  });

  it.each([
    ['ArrowRight', { column: 13, row: 1 }],
    ['ArrowUp', { column: 12, row: 0 }],
    ['ArrowDown', { column: 12, row: 2 }],
    ['PageUp', { column: 22, row: 1 }],
    ['PageDown', { column: 2, row: 1 }],
    ['Home', { column: 0, row: 1 }],
    ['End', { column: 29, row: 1 }],
    ['a', null],
    ['constructor', null],
  ])('%s', (key, to) => {
    expect(movedCursor(data, { column: 12, row: 1 }, key)).toEqual(to);
  });

  it('stop at the edges', () => {
    expect(movedCursor(data, { column: 0, row: 0 }, 'ArrowUp')).toEqual({ column: 0, row: 0 });
    expect(movedCursor(data, { column: 29, row: 2 }, 'PageUp')).toEqual({ column: 29, row: 2 });
  });
});

const stateAfter = async (
  use: (run: ReturnType<typeof sweepRunner>, told: SweepState[]) => unknown,
) => {
  const told: SweepState[] = [];
  let clock_ms = 0;
  const runner = sweepRunner(
    () => samePool,
    (state) => told.push(state),
    () => (clock_ms += 200),
  );
  await use(runner, told);
  return told;
};

describe('a sweep on the desk', () => {
  it('computes the size looked at before the others', () => {
    const half = request.axes.filters.length;
    expect(piecesInOrder(request, 'large').slice(0, half)).toEqual([4, 5, 6, 7]);
    expect([...piecesInOrder(request, 'none of them')]).toEqual([...Array(2 * half).keys()]);
  });

  it('tells of its progress and ends whole', async () => {
    const told = await stateAfter((runner) => runner.run(parsed, request, 'large'));
    const last = told.at(-1) as SweepState;
    expect(last.phase).toBe('done');
    expect(told.length).toBeGreaterThan(3);
    expect(settingsOfSize(last, 'large').isWhole).toBe(true);
    expect(wholeSweep(last, ['incidentAirKerma'])?.settings).toHaveLength(24);
    expect(progressWords(last)).toMatch(/^24 settings: 3 potentials, 4 filters, 2 sizes, in /);
    const partly = told[3];
    expect(settingsOfSize(partly, 'large').isWhole).toBe(false);
    expect(wholeSweep(partly, ['incidentAirKerma'])).toBeNull();
    expect(progressWords(partly)).toMatch(/of 24 settings: incomplete$/);
  });

  it('gives the same settings object while a size has not changed', async () => {
    const told = await stateAfter((runner) => runner.run(parsed, request, 'large'));
    const [before, after] = [told.at(-2), told.at(-1)] as SweepState[];
    expect(settingsOfSize(after, 'large')).toBe(settingsOfSize(before, 'large'));
  });

  it('cancelled, keeps what it has and says that it is incomplete', async () => {
    const told = await stateAfter(async (runner, heard) => {
      const run = runner.run(parsed, request, 'large');
      while (heard.length < 3) await new Promise((turn) => setTimeout(turn));
      runner.cancel();
      await run;
    });
    const last = told.at(-1) as SweepState;
    expect(last.phase).toBe('cancelled');
    expect(progressWords(last)).toMatch(/^cancelled after \d+ of 24 settings: incomplete$/);
    expect(last.pieces.some((piece) => piece !== null)).toBe(true);
  });

  it('says why it failed', async () => {
    const broken = { ...samePool, run: () => Promise.reject(new Error('out of memory')) };
    const told: SweepState[] = [];
    await sweepRunner(
      () => broken,
      (state) => told.push(state),
    ).run(parsed, request, 'large');
    expect(progressWords(told.at(-1) as SweepState)).toBe('could not be computed: out of memory');
  });

  it('depends on the condition and on Current, not on Proposed nor on prose', () => {
    const { case: c } = parsed;
    const basis = sweepBasis(c, 'sdnr');
    const [current, proposed] = c.techniques;
    expect(sweepBasis(c, 'tubeLoad')).not.toBe(basis);
    expect(sweepBasis({ ...c, title: 'other' }, 'sdnr')).toBe(basis);
    const moved = [current, { ...proposed, potential_kV: 61 }];
    expect(sweepBasis({ ...c, techniques: moved }, 'sdnr')).toBe(basis);
    const other = [{ ...current, potential_kV: 61 }, proposed];
    expect(sweepBasis({ ...c, techniques: other }, 'sdnr')).not.toBe(basis);
  });
});
