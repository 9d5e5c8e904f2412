import { Command } from 'commander';
import {
  airPath,
  attenuate,
  beamFaults,
  beamQuality,
  kEdges_keV,
  type MaterialLayer,
  outputFactorAt_kV,
  type Spectrum,
  scaleSpectrum,
  type TubeSetting,
  tungstenSpectrum,
} from '../../physics/beam/index.js';
import { defaults } from '../../physics/case/index.js';
import { csvText } from '../../physics/csv/csv-text.js';
import type { BeamQuality } from '../../physics/results.js';
import type { Io } from './io.js';
import { shown } from './numbers.js';
import { optionNumber } from './option-number.js';
import { plainTableText } from './plain-table.js';
import { type Format, print } from './print.js';
import { refuse } from './refusal.js';
import { type SpectrumRow, spectrumRows } from './spectrum-rows.js';
import { throughLayer } from './through.js';

interface BeamOptions extends Format {
  readonly potential: number;
  readonly anodeAngle: number;
  readonly through: readonly string[];
  readonly ripple: number;
  readonly distance: number;
  readonly air: boolean;
  readonly outputFactor: number;
  readonly outputExponent: number;
}

const tube = defaults.room.tube;

/** `beam`: spectrum and quality of one tube beam at a point on its axis. */
export const beamCommand = (io: Io): Command =>
  new Command('beam')
    .summary('spectrum and quality of one beam')
    .description(
      'Spectrum and quality of one tungsten-anode beam at a point on its axis. In vacuum unless ' +
        '--air; everything between anode and point must be listed in --through.',
    )
    .requiredOption(
      '--potential <kV>',
      'tube potential, 20 to 150 kV',
      optionNumber('--potential', { min: 20, max: 150, remedy: 'enter the tube potential in kV' }),
    )
    .option(
      '--anode-angle <deg>',
      'anode angle, 6 to 22 degrees',
      optionNumber('--anode-angle', { min: 6, max: 22, remedy: 'enter the nameplate angle' }),
      tube.anodeAngle_deg,
    )
    .option('--through <layer...>', 'a layer such as "aluminium 2.5 mm"; may be repeated')
    .option(
      '--ripple <percent>',
      '(Vmax − Vmin)/Vmax of the potential',
      optionNumber('--ripple', { min: 0, max: 100, remedy: 'enter the ripple in percent' }),
      tube.ripple_percent,
    )
    .option(
      '--distance <mm>',
      'distance from the focal spot',
      optionNumber('--distance', { min: 1, max: 100000, remedy: 'enter the distance in mm' }),
      1000,
    )
    .option('--air', 'air instead of vacuum up to the point', false)
    .option(
      '--output-factor <g>',
      'output scale of the tube at 80 kV; 0.87 stands for any tube within ±30 %',
      optionNumber('--output-factor', {
        min: 1e-3,
        max: 10,
        remedy: 'enter the calibrated output',
      }),
      tube.outputFactor,
    )
    .option(
      '--output-exponent <b>',
      'the output scale goes as (kV/80)^b, as a calibration prints it',
      optionNumber('--output-exponent', {
        min: -3,
        max: 3,
        remedy: 'enter the calibrated output exponent, 0 for none',
      }),
      0,
    )
    .action((_: unknown, command: Command) => runBeam(io, command.optsWithGlobals<BeamOptions>()));

const runBeam = (io: Io, options: BeamOptions): void => {
  const layers = (options.through ?? []).map(throughLayer);
  const beam = beamAtPoint(options, layers);
  const quality = beamQuality(beam, options.potential);
  const spectrum = spectrumRows(beam);
  print(io, options, {
    json: () => ({ ...quality, spectrum }),
    csv: () => spectrumCsv(spectrum),
    table: () => beamTable(options, quality),
  });
};

const beamAtPoint = (options: BeamOptions, layers: readonly MaterialLayer[]): Spectrum => {
  const slabs_mm = layers.reduce((sum, layer) => sum + layer.thickness_mm, 0);
  const air_mm = options.air ? Math.max(0, options.distance - slabs_mm) : 0;
  const inTheWay = [...layers, airPath(air_mm)];
  const setting = {
    potential_kV: options.potential,
    anodeAngle_deg: options.anodeAngle,
    ripple_percent: options.ripple,
    outputFactor: outputFactorAt_kV(
      { outputFactor: options.outputFactor, outputExponent: options.outputExponent },
      options.potential,
    ),
    extraEdges_keV: kEdges_keV(layers.map(({ material }) => material)),
  };
  checkFiltration(setting, inTheWay, options.through ?? []);
  return scaleSpectrum(
    attenuate(tungstenSpectrum(setting), inTheWay),
    (1000 / options.distance) ** 2,
  );
};

const checkFiltration = (
  setting: TubeSetting,
  layers: readonly MaterialLayer[],
  through: readonly string[],
): void => {
  for (const { value, rule } of beamFaults(setting, layers)) {
    const listed = through.map((layer) => JSON.stringify(layer)).join(' ') || 'nothing';
    refuse(
      '--through',
      `${listed}, ${value}`,
      rule.replace(' with the added filter', ''),
      'list all that lies between anode and point, as in --through "aluminium 2.5 mm"',
    );
  }
};

const spectrumCsv = (rows: readonly SpectrumRow[]): string =>
  csvText(
    ['energy_keV', 'fluence_per_mm2_per_keV_per_mAs'],
    rows.map((row) => [row.energy_keV, row.fluence_per_mm2_per_keV_per_mAs]),
  );

const beamTable = (options: BeamOptions, quality: BeamQuality): string => {
  const way = [...(options.through ?? []), options.air ? 'air' : 'vacuum'].join(', ');
  const { outputFactor, outputExponent } = options;
  const title =
    `${options.potential} kV, anode ${options.anodeAngle}°, through ${way}, at ${options.distance} mm, ` +
    `output factor ${outputFactor}${outputExponent === 0 ? '' : ` × (kV/80)^${outputExponent}`}`;
  return [
    plainTableText({
      title,
      headings: ['quantity', 'value', 'unit'],
      rows: [
        ['air kerma', shown(quality.airKerma_uGy_per_mAs), 'µGy/mAs'],
        ['fluence', shown(quality.fluence_per_mm2_per_mAs), '1/(mm² mAs)'],
        ['mean energy', shown(quality.meanEnergy_keV), 'keV'],
        ['effective energy', shown(quality.effectiveEnergy_keV), 'keV'],
        ['homogeneity coefficient', shown(quality.homogeneityCoefficient), ''],
      ],
    }),
    plainTableText({
      headings: ['value layers in mm', 'first half', 'second half', 'tenth'],
      rows: quality.halfValueLayers.map((layer) => [
        layer.material,
        shown(layer.first_mm),
        shown(layer.second_mm),
        shown(layer.tenth_mm),
      ]),
    }),
  ].join('\n');
};
