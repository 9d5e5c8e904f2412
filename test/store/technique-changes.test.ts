import { describe, expect, test } from 'vitest';
import { addItem, removeItem, renameFilter } from '../../components/store/list-changes.js';
import { type Json, valueAtPath } from '../../components/store/path.js';
import {
  addTechnique,
  controlOfKind,
  fixedOfKind,
  removeTechnique,
  renameTechnique,
} from '../../components/store/technique-changes.js';
import { parseCase } from '../../physics/case/index.js';
import { sampleDocument } from '../desk/sample/case.js';

const document = sampleDocument as unknown as Json;
const names = (json: Json) =>
  (valueAtPath(json, 'techniques') as { name: string }[]).map(({ name }) => name);
const isSound = (json: Json) => !('faults' in parseCase(json));

describe('changing techniques and lists', () => {
  test('a copied technique takes a name of its own and makes a sound case', () => {
    const changed = addTechnique(1)(document);
    expect(names(changed)).toEqual(['Current', 'Proposed', 'Proposed 2']);
    expect(valueAtPath(changed, 'techniques[2].potential_kV')).toBe(70);
    expect(isSound(changed)).toBe(true);
  });

  test('the last technique stays', () => {
    const one = removeTechnique(1)(document);
    expect(names(one)).toEqual(['Current']);
    expect(removeTechnique(0)(one)).toBe(one);
  });

  test('measured checks follow a renamed technique', () => {
    const checks = [
      { quantity: 'sdnr', technique: 'Proposed', values: [9] },
      { quantity: 'sdnr', technique: 'Current', values: [9] },
    ];
    const changed = renameTechnique(
      1,
      'Softer',
    )({ ...(document as object), measuredChecks: checks } as Json);
    expect(valueAtPath(changed, 'measuredChecks[0].technique')).toBe('Softer');
    expect(valueAtPath(changed, 'measuredChecks[1].technique')).toBe('Current');
  });

  test('techniques follow a renamed filter', () => {
    const changed = renameFilter(1, 'copper')(document);
    expect(valueAtPath(changed, 'techniques[1].filter')).toBe('copper');
    expect(valueAtPath(changed, 'techniques[0].filter')).toBe('none');
    expect(isSound(changed)).toBe(true);
  });

  test('a list the case is silent about starts from what it assumes there', () => {
    const assumed = [{ material: 'aluminium', thickness_mm: 2.5 }];
    const changed = addItem(
      'room.tube.inherentFilter',
      { material: 'copper', thickness_mm: 0.1 },
      assumed,
    )(document);
    expect(valueAtPath(changed, 'room.tube.inherentFilter')).toHaveLength(2);
    expect(
      valueAtPath(
        removeItem('room.tube.inherentFilter', 0, assumed)(document),
        'room.tube.inherentFilter',
      ),
    ).toEqual([]);
  });

  test('control and split of tube load are written as the case file has them', () => {
    expect(controlOfKind('tubeLoad_mAs', 20, '')).toEqual({ tubeLoad_mAs: 20 });
    expect(controlOfKind('curve', 0, 'control.csv')).toEqual({ curve: 'control.csv' });
    expect(fixedOfKind('shortest', 1)).toBe('shortest');
    expect(fixedOfKind('tubeCurrent_mA', 123.456)).toEqual({ tubeCurrent_mA: 123 });
  });
});
