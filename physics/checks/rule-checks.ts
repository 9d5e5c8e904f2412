import type { Rule } from '../case/schema.js';
import { minimumHalfValueLayer_mmAl } from '../limits/rule-limits.js';
import { type CheckRow, carried, checkRow } from './check-row.js';
import { numberAfter, provenanceOf, type ReferenceRow, referenceRows } from './reference-rows.js';

type MinimumHvl = Extract<Rule, { kind: 'minimum-hvl' }>;

/**
 * Legal limits as editable rules: entered as a rule, each table gives its own values back, and no
 * value is carried across the gap between two segments. A limit quoted from memory is never met.
 */
export const ruleChecks = (): CheckRow[] => {
  const rows = referenceRows('min_hvl').filter(({ item }) => / kVp?\)/.test(item));
  return rows.map((row) => {
    const rule = ruleOf(rows.filter((other) => columnOf(other) === columnOf(row)));
    const value = minimumHalfValueLayer_mmAl(rule, numberAfter(row.item, '\\('));
    const check = carried(checkRow(row, value, { absolute: 0 }));
    return provenanceOf(row) === 'recalled' ? { ...check, verdict: 'unconfirmed source' } : check;
  });
};

/** The column of a table that a row stands in: the item without its potential. */
const columnOf = ({ set, item }: ReferenceRow): string => `${set} ${item.replace(/\(.*/, '')}`;

/** Potentials of one segment share their conditions up to the first semicolon. */
const ruleOf = (rows: readonly ReferenceRow[]): MinimumHvl => {
  const segments = new Map<string, [number, number][]>();
  for (const row of rows) {
    const name = row.conditions
      .split(';')[0]
      .replace('designed range below 51 kVp', 'designed range below 51');
    const points = segments.get(name) ?? [];
    points.push([numberAfter(row.item, '\\('), Number(row.value)]);
    segments.set(name, points);
  }
  const { source } = rows[0];
  return {
    kind: 'minimum-hvl',
    source,
    date: '',
    provenance: provenanceOf(rows[0]),
    segments: [...segments.values()].map((points) => ({
      from_kV: points[0][0],
      to_kV: points[points.length - 1][0],
      points,
    })),
  };
};
