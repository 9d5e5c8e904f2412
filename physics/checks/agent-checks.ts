import {
  type AmountUnit,
  agent,
  agentMixture,
  compound,
  elementBySymbol,
  elementConcentration_mg_per_mL,
} from '../../materials/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { type ReferenceRow, referenceRows } from './reference-rows.js';

/** What the agents' table states and materials can compute. */
export const agentChecks = (): CheckRow[] =>
  referenceRows('agents').flatMap((row) =>
    computations.flatMap(({ item, checks }) => (item.test(row.item) ? checks(row) : [])),
  );

/** A density given as a range is met at its middle, within half its width and the tolerance. */
const five = { relative: 0.05 };

const massFraction = (formula: string, symbol: string): number => {
  const z = elementBySymbol(symbol)?.z;
  return compound(formula, 1).massFractions.find((share) => share.z === z)?.massFraction ?? 0;
};

const density = (name: string, value: number, unit: AmountUnit): number =>
  agentMixture({ agent: name, amount: { value, unit }, carrier: materialOf('water') }).material
    .density_g_per_cm3;

const formulaIn = (item: string): string => item.split(' ').at(-1) ?? '';

const list = (row: ReferenceRow, texts: readonly string[], compute: (index: number) => number) =>
  texts.map((text, index) =>
    checkRow({ ...row, item: `${row.item} [${index + 1}]` }, compute(index), five, text),
  );

const computations: readonly {
  readonly item: RegExp;
  readonly checks: (row: ReferenceRow) => CheckRow[];
}[] = [
  {
    item: /^iodine mass fraction/,
    checks: (row) => [
      checkRow(row, massFraction(formulaIn(row.item), 'I'), { absolute: 0, rounding: true }),
    ],
  },
  {
    item: /^Ba mass fraction/,
    checks: (row) => [checkRow(row, massFraction('BaSO4', 'Ba'), { absolute: 0, rounding: true })],
  },
  {
    item: /^density of iohexol-type/,
    checks: (row) =>
      list(row, row.value.split('/'), (index) =>
        density('iodine', [240, 300, 350][index], 'mg element/mL'),
      ),
  },
  {
    item: /^density of 370/,
    checks: (row) => list(row, row.value.split('-'), () => density('iodine', 370, 'mg element/mL')),
  },
  {
    item: /^gadolinium chelate solution/,
    checks: (row) =>
      list(
        row,
        row.conditions
          .replace(/[^\d. ]/g, ' ')
          .trim()
          .split(/\s+/),
        (index) => gadolinium_mg_per_mL([0.5, 1][index]),
      ),
  },
  {
    item: /^Gd molar mass/,
    checks: (row) => [
      checkRow(row, elementBySymbol('Gd')?.atomicWeight_g_per_mol ?? null, {
        absolute: 0,
        rounding: true,
      }),
    ],
  },
  {
    item: /^Gd-DTPA 0.5 mol\/L density/,
    checks: (row) =>
      list(row, row.value.split('-'), () => density('gadolinium chelate', 0.5, 'mmol/mL')),
  },
  {
    item: /^density of BaSO4 suspension/,
    checks: (row) =>
      [...row.conditions.matchAll(/(\d+) % (?:w\/v )?([\d.]+)/g)].map(([, percent, text]) =>
        checkRow(
          { ...row, item: `${row.item}, ${percent} % w/v`, conditions: '' },
          density('barium sulfate', Number(percent), '% w/v'),
          { absolute: 0, rounding: true },
          text,
        ),
      ),
  },
  {
    item: /^CO2 gas/,
    checks: (row) => [checkRow(row, density('carbon dioxide', 1, 'mg compound/mL'), five)],
  },
];

const gadolinium_mg_per_mL = (value: number): number => {
  const chelate = agent('gadolinium chelate');
  return chelate ? elementConcentration_mg_per_mL(chelate, { value, unit: 'mmol/mL' }) : Number.NaN;
};
