import { airKerma_uGy } from './beam/index.js';
import type { Spectrum } from './beam/spectrum.js';
import type { Acquisition, Case } from './case/schema.js';
import { backscatterFactor } from './dose/backscatter.js';
import { deposition } from './dose/deposition.js';
import { fieldArea_cm2 } from './dose/field-area.js';
import { skinToAirRatio } from './dose/skin.js';
import { numberText } from './number-text.js';
import { outputBeam } from './output-beam.js';
import { chainOf, type Placement } from './placement.js';
import { prepare } from './prepare.js';
import {
  type HeldQuantity,
  type LinearReadout,
  type ReadoutChain,
  readBeam,
  readoutWeights,
  type SolvedLoad,
  solveTubeLoad,
} from './readout/index.js';
import type { Finding } from './results.js';
import { responsesOn } from './scatter/index.js';
import { type Setting, settingLabel } from './setting.js';
import { beamAtSkin, beamInFreeAir, primaryAtDetector } from './stack/beam-path.js';

/** Dose quantities of one frame for each mAs. */
export interface DosePerLoad {
  readonly incidentAirKerma_mGy_per_mAs: number;
  readonly referenceAirKerma_mGy_per_mAs: number;
  readonly kermaAreaProduct_Gycm2_per_mAs: number;
  readonly backscatterFactor: number;
  readonly entranceSurfaceAirKerma_mGy_per_mAs: number;
  readonly skinAbsorbedDose_mGy_per_mAs: number;
  readonly energyImparted_mJ_per_mAs: number;
  readonly meanAbsorbedDose_mGy_per_mAs: number;
  readonly layerAbsorbedDose_mGy_per_mAs: Float64Array;
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
  readonly dose: DosePerLoad;
  readonly readout: LinearReadout;
}

const mGy_per_uGy = 1e-3;
const Gy_per_mGy = 1e-3;

/** A setting's yield, or why it has none; and what had to be said about its beam. */
export interface Delivered {
  readonly made: Yield | null;
  readonly findings: readonly Finding[];
}

/** The yield of a setting of the room for a placed patient: the room's beam, followed. */
export const deliver = (
  c: Case,
  placement: Placement,
  setting: Setting,
  acquisition: Acquisition,
): Delivered => {
  const { spectrum, findings } = outputBeam(prepare(c), setting.potential_kV, setting.filter);
  if (!spectrum) return { made: null, findings };
  const made = yieldOf(c, placement, setting, acquisition, spectrum);
  return made.readout.signalPrimary_per_mm2_per_mAs > leastSignal_per_mm2_per_mAs
    ? { made, findings }
    : { made: null, findings: [...findings, nothingArrives(placement, setting)] };
};

/** Detector signal (keV or counts) below which a primary beam is none: no tube makes 10⁹ mAs. */
const leastSignal_per_mm2_per_mAs = 1e-12;

const nothingArrives = ({ stack }: Placement, setting: Setting): Finding => ({
  code: 'nothingArrives',
  severity: 'limit',
  message: `No primary photon of ${settingLabel(setting)} reaches the detector at ${numberText(stack.thickness_mm)} mm; nothing can be shown.`,
});

/** Tube load at which a quantity of one frame meets a target; null with the reason where none does. */
export const loadFor = ({ readout, dose }: Yield, hold: HeldQuantity, target: number): SolvedLoad =>
  solveTubeLoad(readout, dose.incidentAirKerma_mGy_per_mAs, hold, target);

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
    dose: dosePerLoad(c, placement, output, skin),
    readout: readBeam(weights, primary.fluence_per_mm2),
  };
};

const dosePerLoad = (
  c: Case,
  { stack, responses }: Placement,
  output: Spectrum,
  skin: Spectrum,
): DosePerLoad => {
  const { referencePoint_mm } = c.room.geometry;
  const incident = airKerma_uGy(skin) * mGy_per_uGy;
  const reference = airKerma_uGy(beamInFreeAir(output, stack, referencePoint_mm)) * mGy_per_uGy;
  const onSkin = responsesOn(responses, skin.energies_keV);
  const factor = backscatterFactor(skin, onSkin.backscatter);
  const deposited = deposition(skin, stack, onSkin.layerAbsorbedFraction);
  return {
    incidentAirKerma_mGy_per_mAs: incident,
    referenceAirKerma_mGy_per_mAs: reference,
    kermaAreaProduct_Gycm2_per_mAs:
      reference * Gy_per_mGy * fieldArea_cm2(stack, referencePoint_mm),
    backscatterFactor: factor,
    entranceSurfaceAirKerma_mGy_per_mAs: incident * factor,
    skinAbsorbedDose_mGy_per_mAs:
      incident * factor * skinToAirRatio(skin, prepare(c).material('skin')),
    energyImparted_mJ_per_mAs: deposited.energyImparted_mJ,
    meanAbsorbedDose_mGy_per_mAs: deposited.meanAbsorbedDose_mGy,
    layerAbsorbedDose_mGy_per_mAs: deposited.layerAbsorbedDose_mGy,
  };
};
