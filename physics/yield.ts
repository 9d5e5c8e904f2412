import { airKerma_uGy } from './beam/index.js';
import type { Spectrum } from './beam/spectrum.js';
import type { Acquisition, Case } from './case/schema.js';
import { backscatterFactor } from './dose/backscatter.js';
import { deposition } from './dose/deposition.js';
import { fieldArea_cm2 } from './dose/field-area.js';
import { beamAtSkin, beamInFreeAir, primaryAtDetector } from './dose/path.js';
import { skinToAirRatio } from './dose/skin.js';
import { chainOf, type Placement } from './placement.js';
import { prepare } from './prepare.js';
import {
  type LinearReadout,
  type ReadoutChain,
  readBeam,
  readoutWeights,
} from './readout/index.js';
import { responsesOn } from './scatter/index.js';
import type { Setting } from './setting.js';

/** Dose quantities of one frame per mAs; null where the scatter method does not give them. */
export interface DoseYield {
  readonly incidentAirKerma_mGy: number;
  readonly referenceAirKerma_mGy: number;
  readonly kermaAreaProduct_Gycm2: number;
  readonly backscatterFactor: number | null;
  readonly entranceSurfaceAirKerma_mGy: number | null;
  readonly skinAbsorbedDose_mGy: number | null;
  readonly energyImparted_mJ: number | null;
  readonly meanAbsorbedDose_mGy: number | null;
  readonly layerAbsorbedDose_mGy: Float64Array | null;
}

/** What one setting gives at one size, per mAs: everything else is this times the tube load. */
export interface Yield {
  readonly setting: Setting;
  readonly placement: Placement;
  readonly chain: ReadoutChain;
  /** Behind tube and filter at 1 m in vacuum. */
  readonly output: Spectrum;
  /** At the skin, behind air and support. */
  readonly skin: Spectrum;
  /** Primary of the plain stack at the detector plane, before the grid. */
  readonly primary: Spectrum;
  readonly dose: DoseYield;
  readonly readout: LinearReadout;
}

const mGy_per_uGy = 1e-3;
const Gy_per_mGy = 1e-3;

/** Follows the beam of a setting through the room: tube, air, support, patient, grid, detector. */
export const yieldOf = (
  c: Case,
  placement: Placement,
  setting: Setting,
  acquisition: Acquisition,
  output: Spectrum,
): Yield => {
  const { stack } = placement;
  const skin = beamAtSkin(output, stack);
  const primary = primaryAtDetector(skin, stack);
  const chain = chainOf(c, placement, setting.grid, acquisition);
  const weights = readoutWeights(chain, output.energies_keV);
  return {
    setting,
    placement,
    chain,
    output,
    skin,
    primary,
    dose: doseYield(c, placement, output, skin),
    readout: readBeam(weights, primary.fluence_per_mm2),
  };
};

const doseYield = (
  c: Case,
  { stack, responses }: Placement,
  output: Spectrum,
  skin: Spectrum,
): DoseYield => {
  const { referencePoint_mm } = c.room.geometry;
  const incidentAirKerma_mGy = airKerma_uGy(skin) * mGy_per_uGy;
  const referenceAirKerma_mGy =
    airKerma_uGy(beamInFreeAir(output, stack, referencePoint_mm)) * mGy_per_uGy;
  const { backscatter, layerAbsorbedFraction } = responsesOn(responses, skin.energies_keV);
  const factor = backscatter && backscatterFactor(skin, backscatter);
  const entrance_mGy = factor === null ? null : incidentAirKerma_mGy * factor;
  const deposited = layerAbsorbedFraction && deposition(skin, stack, layerAbsorbedFraction);
  return {
    incidentAirKerma_mGy,
    referenceAirKerma_mGy,
    kermaAreaProduct_Gycm2:
      referenceAirKerma_mGy * Gy_per_mGy * fieldArea_cm2(stack, referencePoint_mm),
    backscatterFactor: factor,
    entranceSurfaceAirKerma_mGy: entrance_mGy,
    skinAbsorbedDose_mGy:
      entrance_mGy === null
        ? null
        : entrance_mGy * skinToAirRatio(skin, prepare(c).material('skin')),
    energyImparted_mJ: deposited?.energyImparted_mJ ?? null,
    meanAbsorbedDose_mGy: deposited?.meanAbsorbedDose_mGy ?? null,
    layerAbsorbedDose_mGy: deposited?.layerAbsorbedDose_mGy ?? null,
  };
};
