import { describe, expect, test } from 'vitest';
import { createCaseStore } from '../../components/store/case-store.js';
import { setInPair } from '../../components/store/pair-changes.js';
import type { Json } from '../../components/store/path.js';
import { sampleDocument } from '../desk/sample/case.js';

const measured = (index: 0 | 1, value: Json) =>
  setInPair('room.grid.measured', ['primaryTransmission', 'scatterTransmission'], index, value);
const sides = (index: 0 | 1, value: Json) => setInPair('patient.lateral_mm', [0, 1], index, value);
const newStore = () =>
  createCaseStore(
    { document: sampleDocument as unknown as Json, files: {}, fileName: null },
    () => 0,
  );

describe('two values given together or not at all', () => {
  test('one alone is a fault at the other, and the case stands without the pair', () => {
    for (const [change, at] of [
      [measured(0, 0.7), 'room.grid.measured.scatterTransmission'],
      [sides(0, 400), 'patient.lateral_mm[1]'],
    ] as const) {
      const store = newStore();
      store.change(change);
      const { draft } = store.state();
      expect(draft.faults.map(({ path }) => path)).toEqual([at]);
      expect(draft.case.room.grid?.measured).toBe(null);
      expect(draft.case.patient.lateral_mm).toBe(null);
    }
  });

  test('other edits go on while one of the pair is missing', () => {
    const store = newStore();
    store.change(measured(0, 0.7));
    store.setAt('techniques[1].potential_kV', 75);
    expect(store.state().draft.case.techniques[1].potential_kV).toBe(75);
  });

  test('both are the pair', () => {
    const store = newStore();
    store.change(measured(0, 0.7));
    store.change(measured(1, 0.1));
    store.change(sides(1, 220));
    store.change(sides(0, 400));
    const { draft } = store.state();
    expect(draft.faults).toEqual([]);
    expect(draft.case.room.grid?.measured).toEqual({
      primaryTransmission: 0.7,
      scatterTransmission: 0.1,
    });
    expect(draft.case.patient.lateral_mm).toEqual([400, 220]);
  });

  test('both emptied are none', () => {
    const store = newStore();
    for (const change of [measured, sides]) {
      store.change(change(0, 0.5));
      store.change(change(1, 0.5));
      store.change(change(0, null));
      store.change(change(1, null));
    }
    const { draft } = store.state();
    expect(draft.faults).toEqual([]);
    expect(draft.case.room.grid?.measured).toBe(null);
    expect(draft.case.patient.lateral_mm).toBe(null);
  });
});
