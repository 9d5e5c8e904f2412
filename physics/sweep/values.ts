import { kept } from '../../materials/kept.js';
import { exposureAt } from '../at-load.js';
import { valueLayer_mm } from '../beam/index.js';
import { referenceMaterial } from '../beam/reference-materials.js';
import type { Spectrum } from '../beam/spectrum.js';
import type { Acquisition, Case } from '../case/schema.js';
import { sdnrAt } from '../readout/index.js';
import type { Yield } from '../yield.js';

/** Every quantity of one setting at one size, one frame at the load its condition asks for. */
export interface SweepValues {
  readonly tubeLoad_mAs: number;
  readonly tubeCurrent_mA: number | null;
  readonly exposureTime_ms: number | null;
  readonly power_kW: number | null;
  /** Potential times load; null without a tube. */
  readonly tubeEnergy_kJ: number | null;
  readonly sdnr: number;
  readonly subjectContrast: number;
  readonly detectedContrast: number;
  readonly sprBehindGrid: number;
  readonly detectorAirKerma_uGy: number;
  readonly incidentAirKerma_mGy: number;
  readonly entranceSurfaceAirKerma_mGy: number | null;
  readonly skinAbsorbedDose_mGy: number | null;
  readonly kermaAreaProduct_Gycm2: number;
  readonly energyImparted_mJ: number | null;
  readonly meanAbsorbedDose_mGy: number | null;
  readonly halfValueLayer_mmAl: number | null;
  readonly elementMass_g: number | null;
}

/** First half-value layer in aluminium; kept with the beam, which every size shares. */
const halfValueLayers = new WeakMap<Spectrum, number | null>();

export const beamHalfValueLayer_mmAl = (output: Spectrum): number | null =>
  kept(halfValueLayers, output, () => valueLayer_mm(output, referenceMaterial('aluminium'), 0.5));

const times = (value: number | null, load: number): number | null =>
  value === null ? null : value * load;

/** What a yield gives at a load. */
export const sweepValues = (
  c: Case,
  made: Yield,
  acquisition: Acquisition,
  tubeLoad_mAs: number,
): SweepValues => {
  const { dose, readout, output, placement, setting } = made;
  const exposure = exposureAt(c, acquisition, setting.potential_kV, tubeLoad_mAs);
  return {
    tubeLoad_mAs,
    tubeCurrent_mA: exposure.tubeCurrent_mA,
    exposureTime_ms: exposure.exposureTime_ms,
    power_kW: exposure.power_kW,
    tubeEnergy_kJ: c.room.source ? null : (setting.potential_kV * tubeLoad_mAs) / 1000,
    sdnr: sdnrAt(readout, tubeLoad_mAs),
    subjectContrast: readout.contrast.subject,
    detectedContrast: readout.contrast.detected,
    sprBehindGrid: readout.sprBehindGrid,
    detectorAirKerma_uGy: readout.detectorAirKerma_uGy_per_mAs * tubeLoad_mAs,
    incidentAirKerma_mGy: dose.incidentAirKerma_mGy * tubeLoad_mAs,
    entranceSurfaceAirKerma_mGy: times(dose.entranceSurfaceAirKerma_mGy, tubeLoad_mAs),
    skinAbsorbedDose_mGy: times(dose.skinAbsorbedDose_mGy, tubeLoad_mAs),
    kermaAreaProduct_Gycm2: dose.kermaAreaProduct_Gycm2 * tubeLoad_mAs,
    energyImparted_mJ: times(dose.energyImparted_mJ, tubeLoad_mAs),
    meanAbsorbedDose_mGy: times(dose.meanAbsorbedDose_mGy, tubeLoad_mAs),
    halfValueLayer_mmAl: beamHalfValueLayer_mmAl(output),
    elementMass_g: placement.detail.agent?.elementMass_g ?? null,
  };
};
