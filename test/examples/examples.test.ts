/**
 * The worked cases: sound, invented, with the answers their page promises, and confirmed by
 * test/reference/examples-independent.py (numpy and xraylib, none of this code).
 */
import { describe, expect, it } from 'vitest';
import { quantityOf, quantitySections } from '../../components/command/weigh-quantities.js';
import type { Evaluation, HoldConstant, Ratios, Weighing } from '../../physics/results.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { weigh } from '../../physics/weigh.js';
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

/** A table of the page: the case it stands under, its heading cells, its rows. */
interface PageTable {
  readonly example: string;
  readonly heading: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

const cellsOf = (line: string): string[] =>
  line
    .split('|')
    .slice(1, -1)
    .map((cell) => cell.trim());

/** The tables of README.md, in order. */
const pageTables = (): PageTable[] => {
  const tables: { example: string; lines: string[] }[] = [];
  let example = '';
  let isInside = false;
  for (const line of readExampleText('README.md').split('\n')) {
    example = /^## (.+)\.case\.json/.exec(line)?.[1] ?? example;
    if (line.startsWith('|')) {
      if (!isInside) tables.push({ example, lines: [] });
      tables.at(-1)?.lines.push(line);
    }
    isInside = line.startsWith('|');
  }
  return tables.map(({ example: name, lines: [heading, , ...rows] }) => ({
    example: name,
    heading: cellsOf(heading),
    rows: rows.map(cellsOf),
  }));
};

// Three digits are printed: half a unit of the last may be 0.5 %, and the models may move a little.
const printed = 0.015;

describe('the page of worked cases', () => {
  const tables = pageTables();
  const quantities = quantitySections.flatMap((section) => section.quantities);

  it('has tables for every case', () => {
    expect([...new Set(tables.map(({ example }) => example))].sort()).toEqual(
      [...exampleNames].sort(),
    );
  });

  it.each(tables.filter(({ heading }) => heading[0] === 'at P50'))(
    'gives the values of $example',
    ({ example, heading, rows }) => {
      for (const [name, unit, ...values] of rows) {
        const quantity = quantities.find((q) => q.name === name && q.unit === unit);
        if (!quantity) throw new Error(`no quantity ${name} in ${unit}`);
        values.forEach((value, index) => {
          const technique = heading[index + 2];
          const found = quantityOf(quantity, evaluationOf(example, technique));
          expectWithin(found, Number(value), printed, `${technique}: ${name}`);
        });
      }
    },
  );

  const held: Readonly<Record<string, HoldConstant>> = {
    'as set': 'asSet',
    SdNR: 'sdnr',
    'incident air kerma': 'incidentAirKerma',
  };
  const ratios: Readonly<Record<string, keyof Ratios>> = {
    SdNR: 'sdnr',
    'incident air kerma': 'incidentAirKerma',
    'energy imparted': 'energyImparted',
    'tube load': 'tubeLoad',
  };
  it.each(tables.filter(({ heading }) => heading[0].includes(' over ')))(
    'gives the ratios of $example: $heading.0',
    ({ example, heading, rows }) => {
      const to = heading[0].split(' over ')[0];
      const comparison = weighed(example).comparisons.find(
        (candidate) => candidate.to === to && candidate.size === 'P50',
      );
      for (const [condition, ...values] of rows) {
        const row = comparison?.rows.find(({ holdConstant }) => holdConstant === held[condition]);
        values.forEach((value, index) => {
          const key = ratios[heading[index + 1]];
          expectWithin(row?.ratio[key] ?? null, Number(value), printed, `${condition}: ${key}`);
        });
      }
    },
  );
});
