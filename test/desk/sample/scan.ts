import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';

/** Smooth invented curves with the look of real ones. */
const setting = (potential_kV: number, filter: string, hardness: number): SweepSetting => {
  const kerma_mGy = 1.42 * hardness * (80 / potential_kV) ** 2.6;
  const sdnr = 9.8 * (80 / potential_kV) ** 0.9 * (hardness < 1 ? 0.86 : 1);
  const isBeyond = filter === '0.9 Cu' || (filter === '0.2 Cu' && potential_kV < 58);
  return {
    potential_kV,
    filter,
    size: 'median',
    values: {
      tubeLoad_mAs: 20,
      tubeCurrent_mA: 250,
      exposureTime_ms: 80,
      power_kW: 20,
      tubeEnergy_kJ: 1.6,
      sdnr,
      subjectContrast: 0.15,
      detectedContrast: 0.09,
      sprBehindGrid: 0.6,
      detectorAirKerma_uGy: 2.5,
      incidentAirKerma_mGy: kerma_mGy,
      referenceAirKerma_mGy: kerma_mGy * 1.6,
      backscatterFactor: 1.5,
      entranceSurfaceAirKerma_mGy: kerma_mGy * 1.5,
      skinAbsorbedDose_mGy: kerma_mGy * 1.46,
      kermaAreaProduct_Gycm2: kerma_mGy * 0.31,
      energyImparted_mJ: kerma_mGy * 3.1,
      meanAbsorbedDose_mGy: kerma_mGy * 0.34,
      halfValueLayer_mmAl: 3,
      elementMass_g: 0.03,
    },
    findings: isBeyond
      ? [{ code: 'power', severity: 'limit', message: 'Invented: beyond the tube.' }]
      : [],
  };
};

const hardness: Record<string, number> = { none: 1, '0.2 Cu': 0.35, '0.9 Cu': 0.2 };

export const sampleScan: SweepSetting[] = Object.keys(hardness).flatMap((filter) =>
  Array.from({ length: 76 }, (_, i) => setting(50 + i, filter, hardness[filter])),
);
