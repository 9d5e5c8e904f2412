import { csvText } from '../../physics/csv/csv-text.js';
import type { HoldConstant } from '../../physics/results.js';
import { type CostName, costNames, figureOfMerit } from '../../physics/sweep/costs.js';
import type { SweepValues } from '../../physics/sweep/values.js';
import type { MappedSetting } from '../../physics/sweep.js';

const quantities = [
  'tubeLoad_mAs',
  'tubeCurrent_mA',
  'exposureTime_ms',
  'power_kW',
  'tubeEnergy_kJ',
  'sdnr',
  'subjectContrast',
  'detectedContrast',
  'sprBehindGrid',
  'detectorAirKerma_uGy',
  'incidentAirKerma_mGy',
  'entranceSurfaceAirKerma_mGy',
  'skinAbsorbedDose_mGy',
  'kermaAreaProduct_Gycm2',
  'energyImparted_mJ',
  'meanAbsorbedDose_mGy',
  'halfValueLayer_mmAl',
  'elementMass_g',
] as const satisfies readonly (keyof SweepValues)[];

const meritHeading = (cost: CostName): string =>
  `sdnrSquaredPer${cost[0].toUpperCase()}${cost.slice(1)}`;

/**
 * One line per setting and size, every quantity at full precision. The condition and, for an agent
 * not in clinical use, the warning stand in every line: lines get parted from their file.
 */
export const sweepCsv = (
  settings: readonly MappedSetting[],
  holdConstant: HoldConstant,
  investigationalAgent: string | null,
): string =>
  csvText(
    [
      'size',
      'filter',
      'potential_kV',
      'holdConstant',
      ...quantities,
      ...costNames.map(meritHeading),
      'onFrontier',
      'limits',
      'nearestAllowed',
      'investigationalAgent',
    ],
    settings.map(({ size, filter, potential_kV, values, findings, onFrontier }) => {
      const limits = findings.filter(({ severity }) => severity === 'limit');
      return [
        size,
        filter,
        potential_kV,
        holdConstant,
        ...quantities.map((quantity) => values?.[quantity] ?? null),
        ...costNames.map((cost) => values && figureOfMerit(values, cost)),
        onFrontier ? 'yes' : 'no',
        limits.map(({ code }) => code).join(' '),
        limits.find(({ nearest }) => nearest)?.nearest ?? null,
        investigationalAgent,
      ];
    }),
  );
