import type { Acquisition, Case } from './case/schema.js';
import { splitTubeLoad } from './exposure.js';
import { framesPerRun } from './frames.js';
import { sdnrAt } from './readout/index.js';
import type { DoseQuantities, Exposure, FigureOfMerit, Ratios } from './results.js';
import type { Yield } from './yield.js';

const scaled = (value: number | null, load: number): number | null =>
  value === null ? null : value * load;

/** Every dose quantity of a yield at a tube load, per frame, per run and per minute. */
export const doseAt = (
  { dose, placement }: Yield,
  acquisition: Acquisition,
  tubeLoad_mAs: number,
): DoseQuantities => {
  const incidentAirKerma_mGy = dose.incidentAirKerma_mGy * tubeLoad_mAs;
  const referenceAirKerma_mGy = dose.referenceAirKerma_mGy * tubeLoad_mAs;
  const kermaAreaProduct_Gycm2 = dose.kermaAreaProduct_Gycm2 * tubeLoad_mAs;
  const energyImparted_mJ = scaled(dose.energyImparted_mJ, tubeLoad_mAs);
  const frames = framesPerRun(acquisition);
  return {
    incidentAirKerma_mGy,
    backscatterFactor: dose.backscatterFactor,
    entranceSurfaceAirKerma_mGy: scaled(dose.entranceSurfaceAirKerma_mGy, tubeLoad_mAs),
    kermaAreaProduct_Gycm2,
    referenceAirKerma_mGy,
    energyImparted_mJ,
    meanAbsorbedDose_mGy: scaled(dose.meanAbsorbedDose_mGy, tubeLoad_mAs),
    layerAbsorbedDose_mGy:
      dose.layerAbsorbedDose_mGy &&
      placement.stack.layers.map(({ name }, k) => ({
        layer: name,
        value: (dose.layerAbsorbedDose_mGy as Float64Array)[k] * tubeLoad_mAs,
      })),
    skinAbsorbedDose_mGy: scaled(dose.skinAbsorbedDose_mGy, tubeLoad_mAs),
    incidentAirKermaRate_mGy_per_min: rate_mGy_per_min(acquisition, incidentAirKerma_mGy),
    perRun: {
      incidentAirKerma_mGy: incidentAirKerma_mGy * frames,
      referenceAirKerma_mGy: referenceAirKerma_mGy * frames,
      kermaAreaProduct_Gycm2: kermaAreaProduct_Gycm2 * frames,
      energyImparted_mJ: scaled(energyImparted_mJ, frames),
    },
  };
};

/** A single radiograph has no rate. */
const rate_mGy_per_min = (acquisition: Acquisition, perFrame_mGy: number): number | null =>
  acquisition.mode === 'radiography' && acquisition.frames === 1
    ? null
    : perFrame_mGy * acquisition.frameRate_per_s * 60;

/** Current, time and power of one frame; a source without a tube has none of them. */
export const exposureAt = (
  c: Case,
  acquisition: Acquisition,
  potential_kV: number,
  tubeLoad_mAs: number,
): Exposure =>
  c.room.source
    ? { tubeLoad_mAs, tubeCurrent_mA: null, exposureTime_ms: null, power_kW: null }
    : splitTubeLoad(c.room.tube, acquisition, potential_kV, tubeLoad_mAs);

const per = (square: number, cost: number | null): number | null =>
  cost !== null && cost > 0 ? square / cost : null;

/**
 * SdNR² over each named cost of one frame. With electronic or static noise these depend on the
 * load, so they belong to the load they are given for.
 */
export const figureOfMeritAt = (
  c: Case,
  made: Yield,
  dose: DoseQuantities,
  tubeLoad_mAs: number,
): FigureOfMerit => {
  const square = sdnrAt(made.readout, tubeLoad_mAs) ** 2;
  const tubeEnergy_kJ = c.room.source ? null : (made.setting.potential_kV * tubeLoad_mAs) / 1000;
  return {
    perIncidentAirKerma_per_mGy: per(square, dose.incidentAirKerma_mGy) ?? 0,
    perKermaAreaProduct_per_Gycm2: per(square, dose.kermaAreaProduct_Gycm2) ?? 0,
    perEnergyImparted_per_mJ: per(square, dose.energyImparted_mJ),
    perMeanAbsorbedDose_per_mGy: per(square, dose.meanAbsorbedDose_mGy),
    perTubeEnergy_per_kJ: per(square, tubeEnergy_kJ),
    perElementMass_per_g: per(square, made.placement.detail.agent?.elementMass_g ?? null),
  };
};

/** Everything a comparison sets in ratio, of one yield at one load. */
export type Weighed = Readonly<Record<keyof Ratios, number | null>>;

export const weighedAt = (
  c: Case,
  made: Yield,
  acquisition: Acquisition,
  tubeLoad_mAs: number,
): Weighed => {
  const { dose, readout } = made;
  return {
    incidentAirKerma: dose.incidentAirKerma_mGy * tubeLoad_mAs,
    entranceSurfaceAirKerma: scaled(dose.entranceSurfaceAirKerma_mGy, tubeLoad_mAs),
    kermaAreaProduct: dose.kermaAreaProduct_Gycm2 * tubeLoad_mAs,
    energyImparted: scaled(dose.energyImparted_mJ, tubeLoad_mAs),
    meanAbsorbedDose: scaled(dose.meanAbsorbedDose_mGy, tubeLoad_mAs),
    tubeLoad: tubeLoad_mAs,
    power: exposureAt(c, acquisition, made.setting.potential_kV, tubeLoad_mAs).power_kW,
    sdnr: sdnrAt(readout, tubeLoad_mAs),
    subjectContrast: readout.contrast.subject,
    detectedContrast: readout.contrast.detected,
  };
};
