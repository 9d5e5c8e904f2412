import type { SweepValues } from './values.js';

/** What a setting may cost; the names a frontier is asked for by. */
export const costs = {
  incidentAirKerma: {
    words: 'incident air kerma',
    unit: 'mGy',
    of: (v: SweepValues) => v.incidentAirKerma_mGy,
  },
  entranceSurfaceAirKerma: {
    words: 'entrance surface air kerma',
    unit: 'mGy',
    of: (v: SweepValues) => v.entranceSurfaceAirKerma_mGy,
  },
  kermaAreaProduct: {
    words: 'kerma–area product',
    unit: 'Gy cm²',
    of: (v: SweepValues) => v.kermaAreaProduct_Gycm2,
  },
  skinAbsorbedDose: {
    words: 'skin absorbed dose',
    unit: 'mGy',
    of: (v: SweepValues) => v.skinAbsorbedDose_mGy,
  },
  energyImparted: {
    words: 'energy imparted',
    unit: 'mJ',
    of: (v: SweepValues) => v.energyImparted_mJ,
  },
  meanAbsorbedDose: {
    words: 'mean absorbed dose',
    unit: 'mGy',
    of: (v: SweepValues) => v.meanAbsorbedDose_mGy,
  },
  tubeLoad: { words: 'tube load', unit: 'mAs', of: (v: SweepValues) => v.tubeLoad_mAs },
  tubeEnergy: { words: 'tube energy', unit: 'kJ', of: (v: SweepValues) => v.tubeEnergy_kJ },
  power: { words: 'power', unit: 'kW', of: (v: SweepValues) => v.power_kW },
  elementMass: {
    words: 'element in the detail',
    unit: 'g',
    of: (v: SweepValues) => v.elementMass_g,
  },
} as const satisfies Record<
  string,
  { words: string; unit: string; of: (values: SweepValues) => number | null }
>;

export type CostName = keyof typeof costs;

export const costNames = Object.keys(costs) as CostName[];

/** SdNR² per unit of a cost: the figure of merit of a setting under its condition. */
export const figureOfMerit = (values: SweepValues, cost: CostName): number | null => {
  const paid = costs[cost].of(values);
  return paid !== null && paid > 0 ? values.sdnr ** 2 / paid : null;
};
