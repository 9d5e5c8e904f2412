import { kept } from '../../materials/kept.js';
import { exposureAt, type FrameDose, frameDose } from '../at-load.js';
import { valueLayer_mm } from '../beam/index.js';
import { referenceMaterial } from '../beam/reference-materials.js';
import type { Spectrum } from '../beam/spectrum.js';
import type { Acquisition, Case } from '../case/schema.js';
import { sdnrAt } from '../readout/index.js';
import type { Yield } from '../yield.js';

/** Every quantity of one setting at one size, one frame at the load its condition asks for. */
export interface SweepValues extends FrameDose {
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
  readonly halfValueLayer_mmAl: number | null;
  readonly elementMass_g: number | null;
}

/** First half-value layer in aluminium; kept with the beam, which every size shares. */
const halfValueLayers = new WeakMap<Spectrum, number | null>();

export const beamHalfValueLayer_mmAl = (output: Spectrum): number | null =>
  kept(halfValueLayers, output, () => valueLayer_mm(output, referenceMaterial('aluminium'), 0.5));

/** What a yield gives at a load. */
export const sweepValues = (
  c: Case,
  made: Yield,
  acquisition: Acquisition,
  tubeLoad_mAs: number,
): SweepValues => {
  const { readout, output, placement, setting } = made;
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
    ...frameDose(made, tubeLoad_mAs),
    halfValueLayer_mmAl: beamHalfValueLayer_mmAl(output),
    elementMass_g: placement.detail.agent?.elementMass_g ?? null,
  };
};
