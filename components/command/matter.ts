import { Command } from 'commander';
import {
  electronDensity_per_cm3,
  energyAbsorptionCaution,
  type Material,
  massEnergyAbsorption,
  partialCoefficients,
} from '../../materials/index.js';
import { csvText } from '../../physics/csv/csv-text.js';
import type { Io } from './io.js';
import { materialNamed } from './material-named.js';
import { shown } from './numbers.js';
import { optionNumber, optionNumbers } from './option-number.js';
import { plainTableText } from './plain-table.js';
import { type Format, print } from './print.js';

interface MatterOptions extends Format {
  readonly energy?: readonly number[];
  readonly density?: number;
}

const usualEnergies_keV = [10, 15, 20, 30, 40, 50, 60, 80, 100, 150];

/** `matter`: attenuation of one element, compound or named material. */
export const matterCommand = (io: Io): Command =>
  new Command('matter')
    .summary('attenuation of one element, compound or material')
    .description(
      'Attenuation of an element ("copper", "Cu"), a named material ("soft tissue") or a chemical ' +
        'formula with its density ("BaSO4" --density 4.5), 1 keV to 20 MeV, narrow beam.',
    )
    .argument('<name>', 'element, named material or formula')
    .option(
      '--energy <keV...>',
      `photon energies (default: ${usualEnergies_keV.join(' ')})`,
      optionNumbers('--energy', { min: 1, max: 20000, remedy: 'enter the photon energy in keV' }),
    )
    .option(
      '--density <g/cm3>',
      'density in g/cm³; needed with a formula',
      optionNumber('--density', { min: 1e-6, max: 30, remedy: 'enter the density in g/cm³' }),
    )
    .action((name: string, _: unknown, command: Command) =>
      runMatter(io, name, command.optsWithGlobals<MatterOptions>()),
    );

const runMatter = (io: Io, name: string, options: MatterOptions): void => {
  const material = materialNamed('NAME', name, options.density);
  const rows = (options.energy ?? usualEnergies_keV).map((energy) => matterRow(material, energy));
  print(io, options, {
    json: () => ({
      name: material.name,
      density_g_per_cm3: material.density_g_per_cm3,
      electronDensity_per_cm3: electronDensity_per_cm3(material),
      massFractions: material.massFractions,
      source: material.source,
      provenance: material.provenance,
      rows,
      findings: cautionsFor(material, rows),
    }),
    csv: () => matterCsv(rows),
    table: () => matterTable(material, rows),
  });
};

const matterRow = (material: Material, energy_keV: number) => {
  const coefficients = partialCoefficients(material, energy_keV);
  const linearAttenuation_per_cm =
    coefficients.massAttenuation_cm2_per_g * material.density_g_per_cm3;
  const meanFreePath_mm = 10 / linearAttenuation_per_cm;
  return {
    energy_keV,
    ...coefficients,
    massEnergyAbsorption_cm2_per_g: massEnergyAbsorption(material, energy_keV),
    linearAttenuation_per_cm,
    meanFreePath_mm,
    halfValue_mm: Math.LN2 * meanFreePath_mm,
    tenthValue_mm: Math.LN10 * meanFreePath_mm,
  };
};

type MatterRow = ReturnType<typeof matterRow>;

const cautionsFor = (material: Material, rows: readonly MatterRow[]) =>
  rows.flatMap(({ energy_keV }) => {
    const message = energyAbsorptionCaution(material, energy_keV);
    return message === null
      ? []
      : [{ code: 'energyAbsorption', severity: 'caution' as const, message, value: energy_keV }];
  });

const columns = [
  'energy_keV',
  'coherent_cm2_per_g',
  'incoherent_cm2_per_g',
  'photoelectric_cm2_per_g',
  'pair_cm2_per_g',
  'massAttenuation_cm2_per_g',
  'massEnergyAbsorption_cm2_per_g',
  'linearAttenuation_per_cm',
  'meanFreePath_mm',
  'halfValue_mm',
  'tenthValue_mm',
] as const satisfies readonly (keyof MatterRow)[];

const matterCsv = (rows: readonly MatterRow[]): string =>
  csvText(
    columns,
    rows.map((row) => columns.map((column) => row[column])),
  );

const matterTable = (material: Material, rows: readonly MatterRow[]): string => {
  const density = shown(material.density_g_per_cm3);
  const electrons = shown(electronDensity_per_cm3(material));
  const table = plainTableText({
    title: `${material.name}, ${density} g/cm³, ${electrons} electrons/cm³\ncross sections in cm²/g, lengths in mm, μ in 1/cm`,
    headings: [
      'keV',
      'coherent',
      'incoherent',
      'photoelectric',
      'pair',
      'μ/ρ',
      'μen/ρ',
      'μ',
      'mean free path',
      'half value',
      'tenth value',
    ],
    rows: rows.map((row) => columns.map((column) => cell(column, row))),
    wordColumns: 0,
  });
  const cautions = cautionsFor(material, rows).map(({ message }) => `caution: ${message}\n`);
  return [table, ...cautions].join(cautions.length > 0 ? '\n' : '');
};

const cell = (column: (typeof columns)[number], row: MatterRow): string =>
  column === 'energy_keV' ? String(row.energy_keV) : shown(row[column]);
