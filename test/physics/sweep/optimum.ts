import type { Case } from '../../../physics/case/schema.js';
import { compare } from '../../../physics/compare.js';
import { operatingPoint } from '../../../physics/operating-point.js';
import type { ComparisonRow, HoldConstant } from '../../../physics/results.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { type CostName, figureOfMerit } from '../../../physics/sweep/costs.js';
import { window90_kV } from '../../../physics/sweep/window.js';
import { sweepPiece, wholeRoom } from '../../../physics/sweep.js';
import { sampleCase } from '../sample-case.js';

const copper = [0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9];
const filterOf = (thickness_mm: number) => ({
  name: `${thickness_mm} Cu`,
  layers: [{ material: 'copper', thickness_mm }],
});

/** Thicknesses and filters of the optimum table. */
export const thicknesses_cm = [10, 15, 20, 25, 30];
export const tableFilters = ['none', '0.1 Cu', '0.3 Cu', '0.9 Cu'];
export const tableCosts = ['incidentAirKerma', 'energyImparted'] as const;

/**
 * Thin iodine, 1 mg/cm², in the middle of water, quantum noise only: 12° anode, 2.5 mm Al, constant
 * potential; 10:1 grid, 200 mg/cm² caesium iodide, field 25 × 25 cm at the detector, 10 cm gap.
 */
export const thinIodine: Case = sampleCase({
  room: {
    tube: { potential_kV: { min: 35, max: 125, step: 1 } },
    filters: [{ name: 'none', layers: [] }, ...copper.map(filterOf)],
    detector: { structureNoise_fraction: 0, electronicNoiseKerma_uGy: 0 },
  },
  patient: {
    layers: [{ name: 'water', material: 'water', thickness_mm: 200 }],
    sizes: thicknesses_cm.map((cm) => ({ name: `${cm} cm`, thickness_mm: 10 * cm })),
  },
  task: {
    detail: {
      size_mm: 1,
      agent: { name: 'iodine', amount: { value: 10, unit: 'mg element/mL' }, carrier: 'water' },
    },
  },
  techniques: [{ name: 'Current', potential_kV: 70, control: { detectorAirKerma_uGy: 2.5 } }],
}).case;

/** A row of the optimum table. */
export interface Optimum {
  readonly thickness_cm: number;
  readonly filter: string;
  readonly cost: CostName;
  readonly best_kV: number;
  readonly from_kV: number;
  readonly to_kV: number;
}

/**
 * The potential with most SdNR² per cost, for every thickness and filter, with the potentials within
 * 90 % of it. With quantum noise alone the load does not matter; limits are not asked.
 */
export const optimumTable = (): Optimum[] => {
  const request = wholeRoom(thinIodine, 'tubeLoad');
  const { sizes, filters } = request.axes;
  return sizes.flatMap(({ thickness_mm }, s) =>
    tableFilters.flatMap((filter) => {
      const index = s * filters.length + filters.indexOf(filter);
      const { settings } = sweepPiece(thinIodine, request, index);
      return tableCosts.map((cost) => {
        const merits = settings.map(({ values }) => (values && figureOfMerit(values, cost)) ?? 0);
        const best_kV = settings[merits.indexOf(Math.max(...merits))].potential_kV;
        const [from_kV, to_kV] = window90_kV(settings, cost, best_kV);
        return { thickness_cm: thickness_mm / 10, filter, cost, best_kV, from_kV, to_kV };
      });
    }),
  );
};

/** A row of the copper table: what added copper does at 70 kV behind 20 cm, over no filter. */
export interface CopperRow {
  readonly copper_mm: number;
  readonly holdConstant: HoldConstant;
  readonly incidentAirKerma: number;
  readonly energyImparted: number;
  readonly tubeLoad: number;
  readonly subjectContrast: number;
  readonly sdnr: number;
}

/** Ratios to no filter at equal SdNR and at equal detector air kerma, 70 kV, 20 cm of water. */
export const copperTable = (): CopperRow[] => {
  const size = sizesOf(thinIodine.patient)[2];
  const [bare] = thinIodine.techniques;
  const from = operatingPoint(thinIodine, bare, size);
  if (!('made' in from)) throw new Error('the bare technique cannot be placed');
  return copper.flatMap((copper_mm) => {
    const to = operatingPoint(thinIodine, { ...bare, filter: `${copper_mm} Cu` }, size);
    if (!('made' in to)) throw new Error(`${copper_mm} mm copper cannot be placed`);
    const { rows } = compare(thinIodine, from, to);
    return (['sdnr', 'detectorAirKerma'] as const).map((holdConstant) => {
      const { ratio } = rows.find((row) => row.holdConstant === holdConstant) as ComparisonRow;
      const of = (key: keyof typeof ratio): number => ratio[key] ?? Number.NaN;
      return {
        copper_mm,
        holdConstant,
        incidentAirKerma: of('incidentAirKerma'),
        energyImparted: of('energyImparted'),
        tubeLoad: of('tubeLoad'),
        subjectContrast: of('subjectContrast'),
        sdnr: of('sdnr'),
      };
    });
  });
};
