/**
 * Flies the reference cases of photon transport with many photons and writes what they give beside
 * the reference: `npx tsx test/tools/transport-tables.ts unit|tg195|spr PHOTONS`. Minutes on a core.
 */
import { writeFileSync } from 'node:fs';
import type { Estimated } from '../../physics/transport/index.js';
import { flyScatterRows, scatterRows } from '../physics/transport/scatter-rows.js';
import { deviation } from '../physics/transport/slab-runs.js';
import { case2Values, flyCase2 } from '../physics/transport/tg195.js';
import { stackNumbers, waterNumbers } from '../physics/transport/unit-numbers.js';

const seed = 2024;

const number = (value: number): string => value.toPrecision(6);
const quoted = (text: string): string => `"${text}"`;
const both = ({ value, standardError }: Estimated): string =>
  `${number(value)},${number(standardError ?? 0)}`;

const tables: Record<string, (photons: number) => readonly string[]> = {
  unit: (photons) => [
    '# Photon transport beside separately computed values (not published); standard errors 1 sigma.',
    `# ${photons} photons per run, seeds from ${seed}. Written by test/tools/transport-tables.ts unit.`,
    'item,expected,expectedError,found,foundError,deviation_standardErrors',
    ...[...waterNumbers(photons, seed), ...stackNumbers(photons, seed + 100)].map(
      ({ name, expected, expectedError, found }) =>
        `${quoted(name)},${expected},${expectedError},${both(found)},${deviation(found, expected, expectedError).toFixed(2)}`,
    ),
  ],
  tg195: (photons) => [
    '# Photon transport beside AAPM Report 195 case 2, 56.4 keV, 0 deg (recalled values); standard errors 1 sigma.',
    `# ${photons} photons, seed ${seed}. Written by test/tools/transport-tables.ts tg195.`,
    'item,expected_eV,tolerance,found_eV,foundError_eV,relative_percent',
    ...case2Values(flyCase2(photons, seed)).map(
      ({ item, expected_eV, tolerance, found_eV }) =>
        `${quoted(item)},${expected_eV},${tolerance},${both(found_eV)},${(100 * (found_eV.value / expected_eV - 1)).toFixed(2)}`,
    ),
  ],
  spr: (photons) => [
    '# Photon transport beside the computed rows of scatter_spr.csv; standard errors 1 sigma.',
    `# ${photons} photons per slab and energy (more beyond 4 mean free paths), seeds from ${seed}. Written by test/tools/transport-tables.ts spr.`,
    'item,expected,found,foundError,relative_percent,expectedByCount,foundByCount,foundByCountError',
    ...flyScatterRows(scatterRows(), photons, seed).map(
      ({ item, expected, found, expectedByCount, foundByCount }) =>
        `${quoted(item)},${expected},${both(found)},${(100 * (found.value / expected - 1)).toFixed(2)},${expectedByCount},${both(foundByCount)}`,
    ),
  ],
};

const files: Record<string, string> = {
  unit: 'transport-unit-numbers.csv',
  tg195: 'transport-tg195.csv',
  spr: 'transport-scatter-spr.csv',
};

const [name = '', photons = '1e6'] = process.argv.slice(2);
const table = tables[name];
if (table) {
  const lines = table(Number(photons));
  writeFileSync(new URL(`../reference/${files[name]}`, import.meta.url), `${lines.join('\n')}\n`);
} else {
  console.error(`transport-tables: ${name}: must be one of ${Object.keys(tables).join(', ')}`);
  process.exitCode = 2;
}
