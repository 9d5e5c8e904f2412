import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { historyOf, record, redo, undo } from '../../components/store/history.js';

describe('undo and redo', () => {
  test('go back and forth through every step, however many', () => {
    let history = historyOf(0);
    for (let step = 1; step <= 500; step += 1) history = record(history, step, null, step);
    for (let step = 0; step < 500; step += 1) history = undo(history);
    expect(history.present).toBe(0);
    for (let step = 0; step < 500; step += 1) history = redo(history);
    expect(history.present).toBe(500);
  });

  test('do nothing at either end', () => {
    const history = historyOf('a');
    expect(undo(history)).toBe(history);
    expect(redo(history)).toBe(history);
  });

  test('a new edit gives up what was undone', () => {
    const history = record(undo(record(historyOf('a'), 'b', null, 0)), 'c', null, 1);
    expect(redo(history).present).toBe('c');
    expect(undo(history).present).toBe('a');
  });

  test('edits of one field in quick succession are one step', () => {
    const held = [1, 2, 3].reduce(
      (history, value) => record(history, value, 'kV', 100 * value),
      historyOf(0),
    );
    expect(undo(held).present).toBe(0);
  });

  test('edits of one field far apart, or of two fields, are two steps', () => {
    const apart = record(record(historyOf(0), 1, 'kV', 0), 2, 'kV', 5000);
    const other = record(record(historyOf(0), 1, 'kV', 0), 2, 'filter', 10);
    expect(undo(apart).present).toBe(1);
    expect(undo(other).present).toBe(1);
  });

  test('an edit right after an undo does not join what was undone', () => {
    const history = record(undo(record(historyOf(0), 1, 'kV', 0)), 2, 'kV', 10);
    expect(undo(history).present).toBe(0);
  });

  test('undoing all of any sequence of edits comes back to the start', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.integer(), fc.constantFrom('a', 'b', null), fc.nat(3000))),
        (edits) => {
          let now = 0;
          let history = historyOf(-1);
          for (const [value, key, gap] of edits) {
            now += gap;
            history = record(history, value, key, now);
          }
          for (const _ of edits) history = undo(history);
          expect(history.present).toBe(-1);
        },
      ),
    );
  });
});
