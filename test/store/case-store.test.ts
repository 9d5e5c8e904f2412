import { describe, expect, test } from 'vitest';
import { canStand, createCaseStore } from '../../components/store/case-store.js';
import { faultAt, isAssumed, shownAt } from '../../components/store/draft.js';
import { removeLayer } from '../../components/store/layer-changes.js';
import type { Json } from '../../components/store/path.js';
import { sampleDocument } from '../desk/sample/case.js';

const document = sampleDocument as unknown as Json;
const newStore = () => {
  let now = 0;
  return createCaseStore({ document, files: {}, fileName: null }, () => (now += 10_000));
};

describe('the case on the desk', () => {
  test('an edit changes document and case, and can be undone and redone', () => {
    const store = newStore();
    store.setAt('techniques[1].potential_kV', 75);
    expect(store.state().draft.case.techniques[1].potential_kV).toBe(75);
    store.undo();
    expect(store.state().draft.case.techniques[1].potential_kV).toBe(70);
    expect(store.state().draft.document).toBe(document);
    store.redo();
    expect(store.state().draft.case.techniques[1].potential_kV).toBe(75);
  });

  test('a faulty value stays in its field while the last good one stands in for it', () => {
    const store = newStore();
    store.setAt('techniques[1].potential_kV', 75);
    store.setAt('techniques[1].potential_kV', 7000);
    const { draft } = store.state();
    expect(shownAt(draft, 'techniques[1].potential_kV')).toBe(7000);
    expect(draft.case.techniques[1].potential_kV).toBe(75);
    expect(faultAt(draft, 'techniques[1].potential_kV')?.rule).toContain('150');
  });

  test('text where a number belongs is a fault at the field and is not lost', () => {
    const store = newStore();
    store.setAt('patient.layers[0].thickness_mm', 'twenty');
    expect(shownAt(store.state().draft, 'patient.layers[0].thickness_mm')).toBe('twenty');
    expect(faultAt(store.state().draft, 'patient.layers[0].thickness_mm')).toBeDefined();
  });

  test('other edits go on while a fault stands, and putting it right clears it', () => {
    const store = newStore();
    store.setAt('techniques[0].potential_kV', -1);
    store.setAt('techniques[1].potential_kV', 66);
    store.change(removeLayer(0));
    expect(store.state().draft.case.techniques.map((entry) => entry.potential_kV)).toEqual([
      80, 66,
    ]);
    expect(store.state().draft.case.patient.layers).toHaveLength(2);
    store.setAt('techniques[0].potential_kV', 81);
    expect(store.state().draft.faults).toEqual([]);
  });

  test('what the case is silent about is assumed until it is entered', () => {
    const store = newStore();
    expect(isAssumed(store.state().draft, 'room.tube.anodeAngle_deg')).toBe(true);
    store.setAt('room.tube.anodeAngle_deg', 12);
    expect(isAssumed(store.state().draft, 'room.tube.anodeAngle_deg')).toBe(false);
  });

  test('a document with faults opens with the faults shown where something sound can stand in', () => {
    const store = newStore();
    const broken = {
      ...sampleDocument,
      room: { ...sampleDocument.room, tube: { anodeAngle_deg: 95 } },
    } as unknown as Json;
    expect(store.open({ document: broken, files: {}, fileName: null })).toEqual([]);
    expect(store.state().draft.faults.map(({ path }) => path)).toEqual([
      'room.tube.anodeAngle_deg',
    ]);
  });

  test('a document that leaves nothing to show is refused with its faults, and the case stays', () => {
    const store = newStore();
    const before = store.state().draft;
    for (const bad of [
      null,
      3,
      [],
      {},
      { format: 'other' },
      { format: 'stratabeam.case', version: 1 },
    ] as Json[]) {
      expect(store.open({ document: bad, files: {}, fileName: null }).length).toBeGreaterThan(0);
      expect(store.state().draft).toBe(before);
    }
  });

  test('opening another case can be undone', () => {
    const store = newStore();
    store.open({
      document: { ...(sampleDocument as object), title: 'Another' } as Json,
      files: {},
      fileName: null,
    });
    expect(store.state().draft.case.title).toBe('Another');
    store.undo();
    expect(store.state().draft.case.title).toBe(sampleDocument.title);
  });

  test('faulty values of a case opened are never stood in for by the case before it', () => {
    const store = newStore();
    store.setAt('room.tube.anodeAngle_deg', 9);
    const room = { ...sampleDocument.room, tube: { anodeAngle_deg: 95 } };
    const broken = { ...sampleDocument, room } as unknown as Json;
    store.open({ document: broken, files: {}, fileName: null });
    expect(store.state().draft.case.room.tube.anodeAngle_deg).toBe(12);
  });

  test('a document that cannot be read any more stands with its faults over the case last good', () => {
    const store = newStore();
    const good = store.state().draft.case;
    store.change(() => 'nothing of a case');
    const { draft } = store.state();
    expect(draft.document).toBe('nothing of a case');
    expect(draft.case).toBe(good);
    expect(draft.faults.length).toBeGreaterThan(0);
    store.undo();
    expect(store.state().draft.faults).toEqual([]);
  });

  test('parts of the case that an edit left alone stay the very same objects', () => {
    const store = newStore();
    const before = store.state().draft.case;
    store.setAt('techniques[1].potential_kV', 75);
    const after = store.state().draft.case;
    expect(after.room).toBe(before.room);
    expect(after.techniques[0]).toBe(before.techniques[0]);
    expect(after.techniques[1]).not.toBe(before.techniques[1]);
  });

  test('a sheet says whether it leaves anything to start from', () => {
    expect(canStand({ document, files: {}, fileName: null })).toBe(true);
    expect(canStand({ document: {}, files: {}, fileName: null })).toBe(false);
  });

  test('the name of the file goes back with the case that undo brings back', () => {
    const store = newStore();
    store.named('a.case.json');
    store.open({
      document: { ...sampleDocument } as unknown as Json,
      files: {},
      fileName: 'b.case.json',
    });
    expect(store.state().fileName).toBe('b.case.json');
    store.undo();
    expect(store.state().fileName).toBe('a.case.json');
    store.redo();
    expect(store.state().fileName).toBe('b.case.json');
  });

  test('a case saved keeps its name when edits before the saving are undone', () => {
    const store = newStore();
    store.setAt('title', 'one');
    store.named('one.case.json');
    store.undo();
    expect(store.state().fileName).toBe('one.case.json');
    expect(store.state().canUndo).toBe(false);
  });

  test('listeners hear every change with a rising revision until they leave', () => {
    const store = newStore();
    const heard: number[] = [];
    const leave = store.subscribe(({ revision }) => heard.push(revision));
    store.setAt('title', 'one');
    store.setAt('title', 'one');
    store.undo();
    leave();
    store.redo();
    expect(heard[1]).toBeGreaterThan(heard[0]);
    expect(heard).toHaveLength(3);
  });

  test('tables handed in are what the case finds under their names', () => {
    const store = newStore();
    store.setAt('patient.sizes', { file: 'sizes.csv' });
    expect(store.state().draft.faults).toHaveLength(1);
    store.addFiles({ 'sizes.csv': 'thickness_mm,weight\n180,1\n220,2\n' });
    expect(store.state().draft.faults).toEqual([]);
    expect(store.state().draft.case.patient.sizes).toHaveLength(2);
  });
});
