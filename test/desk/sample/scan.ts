import type { ScanPoint } from '../../../components/workers/scan-slice.js';
import { sampleWeighing } from './weighing.js';

/** Smooth invented curves with the look of real ones. */
const point = (potential_kV: number, filter: string, hardness: number): ScanPoint => {
  const base = sampleWeighing.evaluations[0];
  const kerma = 1.42 * hardness * (80 / potential_kV) ** 2.6;
  const sdnr = 9.8 * (80 / potential_kV) ** 0.9 * (hardness < 1 ? 0.86 : 1);
  return {
    potential_kV,
    filter,
    forbidden: filter === '0.9 Cu' || (filter === '0.2 Cu' && potential_kV < 58) ? 'beyond the tube' : null,
    evaluation: {
      ...base,
      setting: { potential_kV, filter, grid: 'in' },
      sdnr,
      dose: { ...base.dose, incidentAirKerma_mGy: kerma, kermaAreaProduct_Gycm2: kerma * 0.31 },
    },
  };
};

const hardness: Record<string, number> = { none: 1, '0.2 Cu': 0.35, '0.9 Cu': 0.2 };

export const sampleScan: ScanPoint[] = Object.keys(hardness).flatMap((filter) =>
  Array.from({ length: 76 }, (_, i) => point(50 + i, filter, hardness[filter])),
);
