/**
 * `npx tsx test/tools/sweep-tables.ts` writes what Stratabeam finds for iodine behind water into
 * test/reference/: the optimum potential with its 90 % window, and what copper does at 70 kV. Tests
 * hold the committed tables against a fresh computation and against the shapes of the literature.
 */
import { writeFileSync } from 'node:fs';
import { csvText } from '../../physics/csv/csv-text.js';
import { copperTable, optimumTable } from '../physics/sweep/optimum.js';

const conditions = [
  'computed by Stratabeam (test/tools/sweep-tables.ts), not measured: thin iodine, 1 mg/cm2, in the',
  'middle of water; quantum noise only; 12 degree anode, 2.5 mm Al, constant potential; 10:1 grid,',
  '200 mg/cm2 caesium iodide, field 25 x 25 cm at the detector, 1100 mm from the focal spot, 10 cm gap',
];

const write = (
  file: string,
  title: string,
  headings: readonly string[],
  rows: readonly (readonly (string | number)[])[],
): void => {
  const head = [title, ...conditions].map((line) => `# ${line}\n`).join('');
  writeFileSync(new URL(`../reference/${file}`, import.meta.url), head + csvText(headings, rows));
};

write(
  'sweep-optimum-iodine.csv',
  'potential with most SdNR2 per cost, potentials within 90 % of it; searched from 35 to 125 kV',
  ['thickness_cm', 'filter', 'cost', 'best_kV', 'from_kV', 'to_kV'],
  optimumTable().map((row) => [
    row.thickness_cm,
    row.filter,
    row.cost,
    row.best_kV,
    row.from_kV,
    row.to_kV,
  ]),
);

const digits = (value: number): number => Number(value.toPrecision(5));
write(
  'sweep-copper-70kV.csv',
  'copper at 70 kV behind 20 cm of water: ratios to no filter, one quantity held equal',
  [
    'copper_mm',
    'holdConstant',
    'incidentAirKerma',
    'energyImparted',
    'tubeLoad',
    'subjectContrast',
    'sdnr',
  ],
  copperTable().map((row) => [
    row.copper_mm,
    row.holdConstant,
    digits(row.incidentAirKerma),
    digits(row.energyImparted),
    digits(row.tubeLoad),
    digits(row.subjectContrast),
    digits(row.sdnr),
  ]),
);
