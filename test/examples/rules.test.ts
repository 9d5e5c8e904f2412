/**
 * The shipped rule tables against `test/reference/min_hvl.csv`, point by point: 21 CFR 1020.30(m)(1)
 * Table 1 and IEC 60601-1-3 Table 3, with the provenance the reference gives.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { type Rule, ruleSchema } from '../../physics/case/schema.js';
import { minimumHalfValueLayer_mmAl } from '../../physics/limits/rule-limits.js';
import { readReference } from '../reference/read-reference.js';

const folder = new URL('../../components/examples/rules/', import.meta.url);
const files = readdirSync(folder);
const shipped = (file: string): { name: string; rule: Extract<Rule, { kind: 'minimum-hvl' }> } => {
  const { name, rule } = JSON.parse(readFileSync(new URL(file, folder), 'utf8'));
  const parsed = ruleSchema.parse(rule);
  if (parsed.kind !== 'minimum-hvl') throw new Error(`${file}: ${parsed.kind}`);
  return { name, rule: parsed };
};

/** Which column of the reference each file holds. */
const columns: Readonly<Record<string, RegExp>> = {
  'cfr-1020-30m-other-before-2006.json': /^min HVL I \((\d+) kVp\)$/,
  'cfr-1020-30m-other-from-2006.json': /^min HVL II \((\d+) kVp\)$/,
  'cfr-1020-30m-dental.json': /^min HVL dental \((\d+) kVp\)$/,
  'iec-60601-1-3.json': /^min first HVL \((\d+) kV\)$/,
};
const rowsOf = (file: string) =>
  readReference('min_hvl.csv').flatMap((row) => {
    const [, potential] = columns[file].exec(row.item) ?? [];
    const { value, provenance } = row;
    return potential === undefined ? [] : [{ value, provenance, potential_kV: Number(potential) }];
  });

describe('the shipped rules', () => {
  it('are one file for each column of the reference', () => {
    expect([...files].sort()).toEqual(Object.keys(columns).sort());
  });

  it.each(files)('%s holds every value of its column, and no other', (file) => {
    const { rule } = shipped(file);
    const rows = rowsOf(file);
    const points = rule.segments.flatMap((segment) => segment.points);
    expect(points).toEqual(rows.map(({ potential_kV, value }) => [potential_kV, Number(value)]));
    for (const { potential_kV, value } of rows) {
      expect(minimumHalfValueLayer_mmAl(rule, potential_kV)).toBe(Number(value));
    }
  });

  it.each(files)('%s says where it comes from, and that text only recalled is recalled', (file) => {
    const { rule, name } = shipped(file);
    const isRecalled = rowsOf(file).some(({ provenance }) => provenance.startsWith('recalled'));
    expect(rule.provenance).toBe(isRecalled ? 'recalled' : 'published');
    expect(rule.source).toMatch(/^(21 CFR 1020\.30\(m\)|IEC 60601-1-3)/);
    if (isRecalled) expect(rule.source).toContain('recalled, text not at hand');
    expect(rule.date).toMatch(/^\d{4}/);
    expect(name).toMatch(/^Minimum half-value layer, /);
  });

  it.each(files)('%s carries no value across the gap between two of its segments', (file) => {
    const { rule } = shipped(file);
    for (const [i, { to_kV }] of rule.segments.entries()) {
      if (i === rule.segments.length - 1) continue;
      expect(minimumHalfValueLayer_mmAl(rule, to_kV + 0.5)).toBeNull();
    }
  });
});
