import { describe, expect, test } from 'vitest';
import {
  addLayer,
  moveLayer,
  removeLayer,
  renameLayer,
  setLayerThickness,
} from '../../components/store/layer-changes.js';
import { type Json, valueAtPath } from '../../components/store/path.js';
import { parseCase } from '../../physics/case/index.js';
import { sampleDocument } from '../desk/sample/case.js';

const document = sampleDocument as unknown as Json;
const names = (json: Json) =>
  (valueAtPath(json, 'patient.layers') as { name: string }[]).map(({ name }) => name);
const sizes = (json: Json) =>
  (valueAtPath(json, 'patient.sizes') as { thickness_mm: number }[]).map(
    (size) => size.thickness_mm,
  );
const shareSum = (json: Json) =>
  (valueAtPath(json, 'patient.layers') as { growthShare: number }[]).reduce(
    (sum, layer) => sum + layer.growthShare,
    0,
  );
const isSound = (json: Json) => !('faults' in parseCase(json));

describe('changing the layers', () => {
  test('a thicker layer makes the size drawn thicker and leaves the others', () => {
    const changed = setLayerThickness(1, 190)(document);
    expect(sizes(changed)).toEqual([222, 290]);
    expect(isSound(changed)).toBe(true);
  });

  test('what is not a number is kept for the user to correct, sizes untouched', () => {
    const changed = setLayerThickness(1, 'thick')(document);
    expect(valueAtPath(changed, 'patient.layers[1].thickness_mm')).toBe('thick');
    for (const faulty of ['thick', 0, -3, null]) {
      expect(sizes(setLayerThickness(1, faulty)(document))).toEqual(sizes(document));
      const again = setLayerThickness(1, 170)(setLayerThickness(1, faulty)(document));
      expect(sizes(again)).toEqual(sizes(document));
    }
  });

  test('moving swaps neighbours and changes no size', () => {
    const changed = moveLayer(0, 1)(document);
    expect(names(changed)).toEqual(['abdomen', 'front', 'spine']);
    expect(sizes(changed)).toEqual(sizes(document));
  });

  test('moving past either end changes nothing', () => {
    expect(moveLayer(0, -1)(document)).toBe(document);
    expect(moveLayer(2, 1)(document)).toBe(document);
  });

  test('a removed layer leaves growth shares that still sum to one', () => {
    const changed = removeLayer(0)(document);
    expect(names(changed)).toEqual(['abdomen', 'spine']);
    expect(shareSum(changed)).toBeCloseTo(1, 9);
    expect(isSound(changed)).toBe(true);
  });

  test('removing the only layer that grows lets the others grow alike', () => {
    const changed = removeLayer(0)(removeLayer(0)(addLayer(2)(document)));
    expect(shareSum(changed)).toBeCloseTo(1, 9);
  });

  test('the last layer stays', () => {
    const one = removeLayer(0)(removeLayer(0)(document));
    expect(names(one)).toEqual(['spine']);
    expect(removeLayer(0)(one)).toBe(one);
  });

  test('an added layer takes a name of its own and makes a sound case', () => {
    const changed = addLayer(0)(addLayer(0)(document));
    expect(new Set(names(changed)).size).toBe(5);
    expect(sizes(changed)).toEqual([222, 290]);
    expect(isSound(changed)).toBe(true);
  });

  test('a renamed layer keeps the detail in it', () => {
    const changed = renameLayer(1, 'belly')(document);
    expect(valueAtPath(changed, 'task.detail.inLayer')).toBe('belly');
    expect(isSound(changed)).toBe(true);
  });
});
