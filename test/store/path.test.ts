import { describe, expect, test } from 'vitest';
import { type Json, valueAtPath, withValueAt } from '../../components/store/path.js';

const document: Json = {
  patient: { layers: [{ name: 'a', thickness_mm: 1 }, { name: 'b' }] },
  title: 't',
};

describe('values at paths', () => {
  test('are found through objects and lists', () => {
    expect(valueAtPath(document, 'patient.layers[1].name')).toBe('b');
    expect(valueAtPath(document, 'patient.layers[2].name')).toBeUndefined();
    expect(valueAtPath(document, 'title.length')).toBeUndefined();
  });

  test('are never found on the prototype', () => {
    expect(valueAtPath(document, 'constructor.name')).toBeUndefined();
    expect(valueAtPath(document, '__proto__')).toBeUndefined();
  });

  test('are written without touching the document handed in', () => {
    const before = JSON.stringify(document);
    const after = withValueAt(document, 'patient.layers[0].thickness_mm', 5);
    expect(valueAtPath(after, 'patient.layers[0].thickness_mm')).toBe(5);
    expect(JSON.stringify(document)).toBe(before);
  });

  test('leave untouched parts the same objects', () => {
    const after = withValueAt(document, 'title', 'u');
    expect(valueAtPath(after, 'patient')).toBe(valueAtPath(document, 'patient'));
  });

  test('make the objects and lists on the way', () => {
    const after = withValueAt({}, 'room.geometry.field_mm[0]', 200);
    expect(after).toEqual({ room: { geometry: { field_mm: [200] } } });
  });

  test('keep the order of keys, so that a saved file differs only where it was edited', () => {
    const after = withValueAt(document, 'patient', null);
    expect(Object.keys(after as object)).toEqual(['patient', 'title']);
  });

  test('taken away leave neither key nor hole', () => {
    expect(withValueAt(document, 'title', undefined)).toEqual({ patient: document.patient });
    expect(
      valueAtPath(withValueAt(document, 'patient.layers[0]', undefined), 'patient.layers'),
    ).toEqual([{ name: 'b' }]);
  });

  test('a key called __proto__ is written as an ordinary key', () => {
    const after = withValueAt({}, '__proto__.polluted', true);
    expect(Object.hasOwn(after as object, '__proto__')).toBe(true);
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
  });
});
