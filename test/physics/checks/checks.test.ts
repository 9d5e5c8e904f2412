import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { checkRow, lastDigit } from '../../../physics/checks/check-row.js';
import { publishedChecks } from '../../../physics/checks/index.js';
import {
  provenanceOf,
  type ReferenceRow,
  referenceRows,
} from '../../../physics/checks/reference-rows.js';
import { packedReference, shippedTables } from '../../reference/pack-reference.js';
import { readReference } from '../../reference/read-reference.js';

const row = (value: string, known = 'text read'): ReferenceRow => ({
  table: 'table',
  set: 'set',
  item: 'item',
  value,
  unit: 'mm',
  conditions: '',
  tolerance: '',
  source: 'a source',
  known,
});

describe('the reference values that are shipped', () => {
  it('are those of test/reference (otherwise: npm run tables)', () => {
    const url = new URL('../../../physics/checks/packed-reference.ts', import.meta.url);
    expect(readFileSync(url, 'utf8')).toBe(packedReference());
  });

  it.each(shippedTables)('come back row by row from the packed text of %s', (table) => {
    const kept = readReference(`${table}.csv`);
    expect(
      referenceRows(table).map(({ set, item, value, source, known }) => [
        set,
        item,
        value,
        source,
        known,
      ]),
    ).toEqual(kept.map((r) => [r.set, r.item, r.value, r.source, r.provenance]));
  });

  it('say how they came to be known', () => {
    expect(provenanceOf(row('1', 'text read'))).toBe('published');
    expect(provenanceOf(row('1', 'abstract read'))).toBe('published');
    expect(provenanceOf(row('1', 'recalled, no text at hand'))).toBe('recalled');
    expect(provenanceOf(row('1', 'derived from the tables'))).toBe('computed');
    expect(provenanceOf(row('1', 'common practice, no source'))).toBe('assumed');
  });
});

describe('a check', () => {
  it('is met up to its tolerance and short beyond, relative or absolute', () => {
    expect(checkRow(row('2'), 2.019, { relative: 0.01 }).verdict).toBe('met');
    expect(checkRow(row('2'), 2.021, { relative: 0.01 }).verdict).toBe('short');
    expect(checkRow(row('2'), 1.989, { absolute: 0.01 }).verdict).toBe('short');
    expect(checkRow(row('-2'), -2.019, { relative: 0.01 }).verdict).toBe('met');
  });

  it('is short where nothing could be computed', () => {
    expect(checkRow(row('2'), null, { relative: 1 })).toMatchObject({
      computed: null,
      verdict: 'short',
    });
    expect(checkRow(row('2'), Number.NaN, { relative: 1 })).toMatchObject({
      computed: null,
      verdict: 'short',
    });
  });

  it('allows half a unit in the last printed digit where asked to', () => {
    const rounding = { absolute: 0, rounding: true };
    expect(checkRow(row('0.50'), 0.5049, rounding).verdict).toBe('met');
    expect(checkRow(row('0.50'), 0.506, rounding).verdict).toBe('short');
    expect(lastDigit('2.50')).toBeCloseTo(0.01, 15);
    expect(lastDigit('3.671e-6')).toBeCloseTo(1e-9, 20);
    expect(lastDigit('12')).toBe(1);
  });
});

describe('the published checks', () => {
  const rows = publishedChecks();

  it('are all met, or rest on an unconfirmed source', () => {
    expect(rows.filter(({ verdict }) => verdict === 'short')).toEqual([]);
  });

  it('never pass a legal limit quoted from memory', () => {
    const limits = rows.filter(({ id }) => id.startsWith('min_hvl'));
    const recalled = limits.filter(({ provenance }) => provenance === 'recalled');
    expect(recalled.length).toBeGreaterThan(10);
    expect(new Set(recalled.map(({ verdict }) => verdict))).toEqual(
      new Set(['unconfirmed source']),
    );
    expect(limits.some(({ verdict }) => verdict === 'met')).toBe(true);
  });

  it('count as carried, not computed, what is only entered: compositions and legal limits', () => {
    const tables = (kind: string) =>
      new Set(rows.filter((one) => one.kind === kind).map(({ id }) => id.split(':')[0]));
    expect(tables('data carried')).toEqual(new Set(['compositions', 'min_hvl']));
    expect([...tables('computed')]).not.toContain('compositions');
    expect([...tables('computed')]).not.toContain('min_hvl');
  });

  it('ask no number to be exactly nothing', () => {
    expect(rows.filter(({ expected, tolerance }) => expected === 0 && tolerance === 0)).toEqual(
      rows.filter(({ kind, expected }) => kind === 'data carried' && expected === 0),
    );
  });

  it('have names of their own', () => {
    expect(new Set(rows.map(({ id }) => id)).size).toBe(rows.length);
  });

  it('cover every shipped table', () => {
    for (const table of shippedTables) {
      expect(
        rows.some(({ id }) => id.startsWith(`${table}: `)),
        table,
      ).toBe(true);
    }
  });
});
