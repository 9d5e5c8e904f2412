import type { Acquisition, Case } from './case/schema.js';
import { splitTubeLoad } from './exposure.js';
import { framesPerRun } from './frames.js';
import { sdnrAt } from './readout/index.js';
import type { DoseQuantities, Exposure, FigureOfMerit, Ratios } from './results.js';
import type { Yield } from './yield.js';

/** The dose quantities of one frame, each by its own name. */
export type FrameDose = Omit<
  DoseQuantities,
  'incidentAirKermaRate_mGy_per_min' | 'perRun' | 'layerAbsorbedDose_mGy'
>;

/** Every dose quantity of one frame at a tube load. */
export const frameDose = ({ dose }: Yield, tubeLoad_mAs: number): FrameDose => ({
  incidentAirKerma_mGy: dose.incidentAirKerma_mGy_per_mAs * tubeLoad_mAs,
  backscatterFactor: dose.backscatterFactor,
  entranceSurfaceAirKerma_mGy: dose.entranceSurfaceAirKerma_mGy_per_mAs * tubeLoad_mAs,
  kermaAreaProduct_Gycm2: dose.kermaAreaProduct_Gycm2_per_mAs * tubeLoad_mAs,
  referenceAirKerma_mGy: dose.referenceAirKerma_mGy_per_mAs * tubeLoad_mAs,
  energyImparted_mJ: dose.energyImparted_mJ_per_mAs * tubeLoad_mAs,
  meanAbsorbedDose_mGy: dose.meanAbsorbedDose_mGy_per_mAs * tubeLoad_mAs,
  skinAbsorbedDose_mGy: dose.skinAbsorbedDose_mGy_per_mAs * tubeLoad_mAs,
});

/** Every dose quantity of a yield at a tube load, per frame, per run and per minute. */
export const doseAt = (
  made: Yield,
  acquisition: Acquisition,
  tubeLoad_mAs: number,
): DoseQuantities => {
  const frame = frameDose(made, tubeLoad_mAs);
  const frames = framesPerRun(acquisition);
  return {
    ...frame,
    layerAbsorbedDose_mGy: made.placement.stack.layers.map(({ name }, k) => ({
      layer: name,
      value: made.dose.layerAbsorbedDose_mGy_per_mAs[k] * tubeLoad_mAs,
    })),
    incidentAirKermaRate_mGy_per_min: rate_mGy_per_min(acquisition, frame.incidentAirKerma_mGy),
    perRun: {
      incidentAirKerma_mGy: frame.incidentAirKerma_mGy * frames,
      referenceAirKerma_mGy: frame.referenceAirKerma_mGy * frames,
      kermaAreaProduct_Gycm2: frame.kermaAreaProduct_Gycm2 * frames,
      energyImparted_mJ: frame.energyImparted_mJ * frames,
    },
  };
};

/** A single radiograph has no rate. */
export const rate_mGy_per_min = (acquisition: Acquisition, perFrame_mGy: number): number | null =>
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
    perIncidentAirKerma_per_mGy: per(square, dose.incidentAirKerma_mGy),
    perKermaAreaProduct_per_Gycm2: per(square, dose.kermaAreaProduct_Gycm2),
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
  const { readout } = made;
  const dose = frameDose(made, tubeLoad_mAs);
  return {
    incidentAirKerma: dose.incidentAirKerma_mGy,
    entranceSurfaceAirKerma: dose.entranceSurfaceAirKerma_mGy,
    kermaAreaProduct: dose.kermaAreaProduct_Gycm2,
    energyImparted: dose.energyImparted_mJ,
    meanAbsorbedDose: dose.meanAbsorbedDose_mGy,
    tubeLoad: tubeLoad_mAs,
    power: exposureAt(c, acquisition, made.setting.potential_kV, tubeLoad_mAs).power_kW,
    sdnr: sdnrAt(readout, tubeLoad_mAs),
    subjectContrast: readout.contrast.subject,
    detectedContrast: readout.contrast.detected,
  };
};
