import {
  type CheckReport,
  type CheckRow,
  photonsText,
  statedBalance_fraction,
  verdictRule,
  verdictText,
} from '../../physics/check-by-transport/index.js';
import { csvText } from '../../physics/csv/csv-text.js';
import type { CaseStamp, Finding } from '../../physics/results.js';
import { version } from '../../physics/version.js';
import { shown } from './numbers.js';
import { plainTableText } from './plain-table.js';

/** `412 thousand of 1 million photons, 310 thousand a second, 2 s left`. */
export const progressText = (
  photons: number,
  ofPhotons: number,
  perSecond: number | null,
): string => {
  const done = `${photonsText(photons)} of ${photonsText(ofPhotons)} photons`;
  if (perSecond === null) return done;
  const left_s = Math.ceil((ofPhotons - photons) / perSecond);
  return `${done}, ${photonsText(perSecond)} a second, ${left_s} s left`;
};

/** A report for people: what was flown, the table with its verdicts, the energy balance. */
export const transportText = (report: CheckReport, stamp: CaseStamp): string =>
  [
    headingText(report, stamp),
    rowsTable(report.rows),
    `${verdictRule.join('\n')}\n`,
    balanceTable(report),
    findingsText(report.findings),
  ]
    .filter((part) => part !== '')
    .join('\n');

const headingText = (
  { technique, size, setting, photons, seed, photonsPerSecond }: CheckReport,
  { hash, title }: CaseStamp,
): string =>
  [
    title || 'Untitled case',
    `case ${hash}, Stratabeam ${version}`,
    '',
    `${technique}, ${setting}, size ${size}`,
    `${photons} photons, seed ${seed}, ${shown(photonsPerSecond, 3)} photons/s`,
    '',
  ].join('\n');

const rowsTable = (rows: readonly CheckRow[]): string =>
  plainTableText({
    title: 'Estimate against transport, dose and energy per frame as set',
    headings: [
      'quantity',
      'verdict',
      'unit',
      'estimate',
      'transport',
      '± 1 s.e.',
      'difference %',
      's.e.s',
      'to decide',
    ],
    rows: rows.map((row) => [
      row.layer === null ? row.name.toLowerCase() : `${row.name.toLowerCase()}, ${row.layer}`,
      verdictText(row),
      row.unit,
      shown(row.estimate),
      shown(row.transport.value),
      shown(row.transport.standardError, 2),
      row.difference_percent === null ? '–' : row.difference_percent.toFixed(1),
      row.z === null ? '–' : row.z.toFixed(1),
      row.photonsToDecide === null ? '–' : photonsText(row.photonsToDecide),
    ]),
    wordColumns: 3,
  });

const balanceNames = [
  ['absorbed', 'absorbed'],
  ['escapedEntrance', 'left at the entrance'],
  ['escapedSide', 'left by the sides'],
  ['transmittedPrimary', 'at the detector plane, primary'],
  ['transmittedScatter', 'at the detector plane, scatter'],
  ['sum', 'found again'],
] as const;

const balanceTable = ({ energyBalance, isBalanced }: CheckReport): string => {
  const within = `${100 * statedBalance_fraction} %`;
  return plainTableText({
    title: `Energy of the beam: ${isBalanced ? `found again within ${within}` : `not found again within ${within}`}`,
    headings: ['share', '%'],
    rows: balanceNames.map(([key, name]) => [name, (100 * energyBalance[key]).toFixed(3)]),
  });
};

const findingsText = (findings: readonly Finding[]): string =>
  findings.length === 0
    ? ''
    : `Findings\n${findings.map(({ severity, message }) => `  ${severity}: ${message}`).join('\n')}\n`;

/** One line a quantity, at full precision. */
export const transportCsv = ({ technique, size, photons, seed, rows }: CheckReport): string =>
  csvText(
    [
      'technique',
      'size',
      'photons',
      'seed',
      'quantity',
      'layer',
      'unit',
      'estimate',
      'transport',
      'standardError',
      'difference_percent',
      'z',
      'tolerance_percent',
      'verdict',
      'photonsToDecide',
    ],
    rows.map((row) => [
      technique,
      size,
      photons,
      seed,
      row.quantity,
      row.layer,
      row.unit,
      row.estimate,
      row.transport.value,
      row.transport.standardError,
      row.difference_percent,
      row.z,
      row.tolerance_percent,
      row.verdict,
      row.photonsToDecide,
    ]),
  );
