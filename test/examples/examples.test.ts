/**
 * The worked cases: sound, invented, with the answers their page promises, and confirmed by
 * test/reference/examples-independent.py (numpy and xraylib, none of this code).
 */
import { describe, expect, it } from 'vitest';
import type { Evaluation, Weighing } from '../../physics/results.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { weigh } from '../../physics/weigh.js';
import { exampleTables } from '../reference/example-tables.js';
import { readReference } from '../reference/read-reference.js';
import { exampleNames, parsedExample, readExampleText } from './read-example.js';

/** The middle of the mix, and its ends: what is between them stands where they do. */
const weighedSizes = ['P5', 'P50', 'P95'];

const weighings = new Map<string, Weighing>();
const weighed = (name: string): Weighing => {
  const parsed = parsedExample(name);
  const sizes = sizesOf(parsed.case.patient).filter((size) => weighedSizes.includes(size.name));
  const known = weighings.get(name) ?? weigh(parsed, sizes);
  weighings.set(name, known);
  return known;
};

const evaluationOf = (name: string, technique: string): Evaluation => {
  const found = weighed(name).evaluations.find(
    (evaluation) => evaluation.technique === technique && evaluation.size === 'P50',
  );
  if (!found) throw new Error(`${name}: no ${technique} at P50`);
  return found;
};

const expectWithin = (computed: number | null, expected: number, share: number, what: string) => {
  const off = Math.abs((computed ?? Number.NaN) / expected - 1);
  expect(off, `${what}: computed ${computed}, expected ${expected}`).toBeLessThan(share);
};

describe.each(exampleNames)('the case %s', (name) => {
  const { case: c } = parsedExample(name);

  it('says that its room is invented', () => {
    expect(c.room.name).toMatch(/\(invented\)$/);
  });

  it('is calibrated with residuals of less than one percent', () => {
    const { calibration } = weighed(name);
    expect(calibration?.findings).toEqual([]);
    for (const { path, relative_percent } of calibration?.residuals ?? []) {
      expect(Math.abs(relative_percent), path).toBeLessThan(1);
    }
  });

  it('has five sizes, and every technique is evaluated at the middle and both ends of them', () => {
    expect(c.patient.sizes.map((size) => size.name)).toEqual(['P5', 'P25', 'P50', 'P75', 'P95']);
    expect(weighed(name).evaluations.map(({ technique, size }) => `${technique}, ${size}`)).toEqual(
      weighedSizes.flatMap((size) => c.techniques.map((technique) => `${technique.name}, ${size}`)),
    );
  });

  it('asks a question', () => {
    expect(c.question).toMatch(/\?$/);
  });
});

describe('a script that shares none of this code', () => {
  const rows = readReference('examples-independent.csv').filter(({ size }) => size === 'P50');
  const computed: Readonly<Record<string, (evaluation: Evaluation) => number | null>> = {
    'half-value layer': ({ beam }) => beam.halfValueLayers[0].first_mm,
    transmission: ({ transmission }) => transmission.primary,
    'subject contrast': ({ contrast }) => contrast.subject,
  };

  it('covers every worked case', () => {
    expect([...new Set(rows.map(({ example }) => example))].sort()).toEqual(
      [...exampleNames].sort(),
    );
  });

  it.each(rows)(
    'confirms $quantity of $technique in $example within 1 %: $value',
    ({ example, technique, quantity, value }) => {
      const found = computed[quantity](evaluationOf(example, technique));
      expectWithin(found, Number(value), 0.01, quantity);
    },
  );
});

describe('the page of worked cases', () => {
  const page = readExampleText('README.md');
  const sections = new Map(
    page
      .split(/^## (?=\S+\.case\.json$)/m)
      .slice(1)
      .map((section) => [section.split('.case.json')[0], section] as const),
  );

  it('has a section for every case', () => {
    expect([...sections.keys()].sort()).toEqual([...exampleNames].sort());
  });

  it.each(exampleNames)('prints exactly what %s gives (otherwise: npm run tables)', (name) => {
    const tables = (sections.get(name) ?? '').split('\n').filter((line) => line.startsWith('|'));
    const generated = exampleTables(weighed(name))
      .split('\n')
      .filter((line) => line !== '');
    expect(generated.length).toBeGreaterThan(15);
    expect(tables).toEqual(generated);
  });
});
