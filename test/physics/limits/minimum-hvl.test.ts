import { describe, expect, it } from 'vitest';
import { ruleSchema } from '../../../physics/case/schema.js';
import { nearestPotential_kV } from '../../../physics/limits/potential-limits.js';
import { minimumHalfValueLayer_mmAl } from '../../../physics/limits/rule-limits.js';

const rule = ruleSchema.parse({
  kind: 'minimum-hvl',
  segments: [
    {
      from_kV: 51,
      to_kV: 70,
      points: [
        [51, 1.3],
        [60, 1.5],
        [70, 1.8],
      ],
    },
    {
      from_kV: 71,
      to_kV: 150,
      points: [
        [71, 2.5],
        [80, 2.9],
        [150, 5.4],
      ],
    },
  ],
  source: '21 CFR 1020.30(m)(1)',
  date: '2006-06-10',
  provenance: 'recalled',
});
if (rule.kind !== 'minimum-hvl') throw new Error('a minimum-hvl rule was parsed as another kind');

describe('a minimum half-value layer rule', () => {
  it('meets its own points (21 CFR 1020.30(m)(1), recalled)', () => {
    expect(minimumHalfValueLayer_mmAl(rule, 80)).toBe(2.9);
    expect(minimumHalfValueLayer_mmAl(rule, 71)).toBe(2.5);
    expect(minimumHalfValueLayer_mmAl(rule, 70)).toBe(1.8);
  });

  it('interpolates inside a segment', () => {
    expect(minimumHalfValueLayer_mmAl(rule, 75.5)).toBeCloseTo(2.7, 12);
  });

  it('never interpolates from one segment into another', () => {
    expect(minimumHalfValueLayer_mmAl(rule, 70.5)).toBeNull();
  });
});

describe('the nearest potential the room offers', () => {
  it('is the nearest step inside the range', () => {
    const range = { min: 50, max: 125, step: 5 };
    expect(nearestPotential_kV(range, 72)).toBe(70);
    expect(nearestPotential_kV(range, 30)).toBe(50);
    expect(nearestPotential_kV(range, 140)).toBe(125);
  });
});
