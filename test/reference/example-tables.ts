import { quantityOf, quantitySections } from '../../components/command/weigh-quantities.js';
import type { Comparison, Evaluation, HoldConstant, Ratios, Weighing } from '../../physics/results.js';

/** Quantities the page of worked cases gives, by name and unit as `stratabeam weigh` prints them. */
const shownQuantities: readonly (readonly [name: string, unit: string])[] = [
  ['first half-value layer, in vacuum', 'mm Al'],
  ['patient, primary transmission', ''],
  ['scatter-to-primary ratio', ''],
  ['subject contrast', ''],
  ['detected contrast', ''],
  ['iodine equivalent', 'mg/cm²'],
  ['SdNR', ''],
  ['incident air kerma', 'mGy'],
  ['kerma–area product', 'Gy cm²'],
  ['energy imparted', 'mJ'],
  ['tube load', 'mAs'],
  ['tube power', 'kW'],
];

const shownConditions: readonly (readonly [words: string, held: HoldConstant])[] = [
  ['as set', 'asSet'],
  ['SdNR', 'sdnr'],
  ['incident air kerma', 'incidentAirKerma'],
];

const shownRatios: readonly (readonly [words: string, ratio: keyof Ratios])[] = [
  ['SdNR', 'sdnr'],
  ['incident air kerma', 'incidentAirKerma'],
  ['energy imparted', 'energyImparted'],
  ['tube load', 'tubeLoad'],
];

export const shownSize = 'P50';

/** The tables of one worked case, as they stand in components/examples/README.md. */
export const exampleTables = ({ evaluations, comparisons }: Weighing): string =>
  [
    valueTable(evaluations.filter(({ size }) => size === shownSize)),
    ...comparisons.filter(({ size }) => size === shownSize).map(ratioTable),
  ].join('\n\n');

const valueTable = (evaluations: readonly Evaluation[]): string => {
  const quantities = quantitySections.flatMap((section) => section.quantities);
  const rows = shownQuantities.flatMap(([name, unit]) => {
    const quantity = quantities.find((one) => one.name === name && one.unit === unit);
    const values = evaluations.map((evaluation) => quantity && quantityOf(quantity, evaluation));
    return values.every((value) => value == null) ? [] : [[name, unit, ...values.map(digits)]];
  });
  return markdown([`at ${shownSize}`, 'unit', ...evaluations.map((e) => e.technique)], rows);
};

const ratioTable = ({ from, to, rows }: Comparison): string =>
  markdown(
    [`${to} over ${from} at ${shownSize}, held constant`, ...shownRatios.map(([words]) => words)],
    shownConditions.map(([words, held]) => {
      const ratio = rows.find(({ holdConstant }) => holdConstant === held)?.ratio;
      return [words, ...shownRatios.map(([, key]) => digits(ratio?.[key]))];
    }),
  );

/** Three digits, no exponent; zeros at the end stay, so that a reader sees the precision. */
const digits = (value: number | null | undefined): string => {
  if (value == null) return '–';
  return Math.abs(value) < 1000 ? value.toPrecision(3) : String(Number(value.toPrecision(3)));
};

const markdown = (heading: readonly string[], rows: readonly (readonly string[])[]): string => {
  const line = (cells: readonly string[]): string => `| ${cells.join(' | ')} |`;
  return [line(heading), `|${'---|'.repeat(heading.length)}`, ...rows.map(line)].join('\n');
};

/** The page with the tables under each `## NAME.case.json` put in place of those that stand there. */
export const withExampleTables = (
  page: string,
  tablesOf: (name: string) => string,
): string =>
  page.replace(
    /^(## (.+)\.case\.json\n[\s\S]*?\n)(\|[\s\S]*?\|\n)(?=\n[^|])/gm,
    (_, above: string, name: string) => `${above}${tablesOf(name)}\n`,
  );
