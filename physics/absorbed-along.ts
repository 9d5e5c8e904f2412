import { massAttenuationOn, massEnergyAbsorptionOn } from '../materials/index.js';
import type { Spectrum } from './beam/spectrum.js';
import { type CutStack, cutStack } from './cut-stack.js';
import { mJ_per_keV } from './dose/deposition.js';
import { fieldArea_cm2 } from './dose/field-area.js';
import { KeptBy } from './numeric/kept-by.js';
import type { OperatingPoint } from './operating-point.js';
import { responsesOn, type ScatterResponses, scatterResponses } from './scatter/index.js';
import type { StackLayer } from './stack/stack.js';

/** Energy absorbed along the depth of the patient, of one frame. */
export interface AbsorbedAlong {
  /** Faces of the pieces the layers are cut into, from 0 at the skin; one more than the values. */
  readonly faces_mm: readonly number[];
  /** Layer each piece belongs to. */
  readonly layers: readonly number[];
  /** Absorbed per depth in the whole field; infinite-width average, as the layer doses. */
  readonly energy_mJ_per_mm: readonly number[];
  /** Of it, what scattered and fluorescence photons bring. */
  readonly fromScattered_mJ_per_mm: readonly number[];
}

/** Pieces the patient is cut into, one a layer at least. */
const pieces = 20;

/**
 * Absorbed energy along the depth by the scatter estimate, its layers cut into pieces (splitting a
 * layer changes nothing else). What primary photons leave where they interact is Σ Φ E (μen/μ) of
 * those that interact in the piece; scattered and fluorescence photons bring the rest.
 *
 * @returns null where the estimate gives no deposition.
 */
export const absorbedAlong = (point: OperatingPoint): AbsorbedAlong | null => {
  const { made, tubeLoad_mAs } = point;
  const { stack } = made.placement;
  const { cut, responses } = depositionOf(made);
  const { layerAbsorbedFraction } = responsesOn(responses, made.skin.energies_keV);
  if (layerAbsorbedFraction === null) return null;
  const area_mm2 = fieldArea_cm2(stack, stack.sourceToSkin_mm) * 100;
  const perFrame = (keV_per_mm2: number, thickness_mm: number): number =>
    (keV_per_mm2 * area_mm2 * mJ_per_keV * tubeLoad_mAs) / thickness_mm;
  const primary = primaryDeposits_keV_per_mm2(made.skin, cut.stack.layers);
  const total = layerAbsorbedFraction.map((fraction) => energySum(made.skin, fraction));
  const thicknesses = cut.stack.layers.map((layer) => layer.thickness_mm);
  return {
    faces_mm: cut.faces_mm,
    layers: cut.layerOf,
    energy_mJ_per_mm: total.map((energy, k) => perFrame(energy, thicknesses[k])),
    fromScattered_mJ_per_mm: total.map((energy, k) =>
      perFrame(Math.max(0, energy - primary[k]), thicknesses[k]),
    ),
  };
};

interface Deposition {
  readonly cut: CutStack;
  readonly responses: ScatterResponses;
}

const depositions = new KeptBy<Deposition>();

/** Kept with stack and detector, so that every technique shares one solution. */
const depositionOf = ({ placement, chain }: OperatingPoint['made']): Deposition =>
  depositions.get([placement.stack, chain.detector], () => {
    const cut = cutStack(placement.stack, pieces);
    return { cut, responses: scatterResponses(cut.stack, chain.detector, null) };
  });

const energySum = ({ energies_keV, fluence_per_mm2 }: Spectrum, share: Float64Array): number =>
  share.reduce((sum, value, i) => sum + fluence_per_mm2[i] * energies_keV[i] * value, 0);

/** What primary photons leave at their first interaction in each piece, per area at the skin. */
const primaryDeposits_keV_per_mm2 = (skin: Spectrum, layers: readonly StackLayer[]): number[] => {
  const { energies_keV } = skin;
  const arriving = new Float64Array(energies_keV.length).fill(1);
  return layers.map(({ material, thickness_mm }) => {
    const total = massAttenuationOn(material, energies_keV);
    const kept = massEnergyAbsorptionOn(material, energies_keV);
    const mass_g_per_cm2 = (material.density_g_per_cm3 * thickness_mm) / 10;
    const left = arriving.map((share, i) => {
      const passed = share * Math.exp(-total[i] * mass_g_per_cm2);
      arriving[i] = passed;
      return ((share - passed) * kept[i]) / total[i];
    });
    return energySum(skin, left);
  });
};
