import { materialFromFractions } from '../../../materials/index.js';
import { airKerma_uGy, attenuate, type Spectrum } from '../../../physics/beam/index.js';
import { backscatterFactor } from '../../../physics/dose/backscatter.js';
import { deposition } from '../../../physics/dose/deposition.js';
import { responsesOn, type ScatterResponses } from '../../../physics/scatter/index.js';
import type { Stack, StackLayer } from '../../../physics/stack/stack.js';
import { accuracyBeam } from './accuracy-stacks.js';
import { material, stackOf } from './stacks.js';

/** A body behind a support (all invented), on which what reaches the skin is held against transport. */
export interface SkinScene {
  readonly name: string;
  readonly stack: Stack;
}

/** An invented polyurethane foam. */
const foam = materialFromFractions({
  name: 'mattress foam',
  density_g_per_cm3: 0.05,
  massFractions: { H: 0.08, C: 0.61, N: 0.06, O: 0.25 },
});

const slab = (name: string, thickness_mm: number): StackLayer => ({
  name,
  material: name === foam.name ? foam : material(name),
  thickness_mm,
});
const mattress = [slab('carbon fibre', 2), slab(foam.name, 40)];

const soft = [[material('soft tissue'), 20]] as const;
const child = [[material('soft tissue'), 10]] as const;
const abdomen = [
  [material('adipose'), 2],
  [material('soft tissue'), 15],
  [material('spongiosa'), 2.5],
  [material('muscle'), 1],
] as const;
const chest = [
  [material('muscle'), 3],
  [material('lung'), 14],
  [material('soft tissue'), 4],
] as const;

const scene = (
  name: string,
  supportEntrance: readonly StackLayer[],
  layers: Parameters<typeof stackOf>[0],
  field_cm: number,
  beam: Stack['beam'] = 'point',
): SkinScene => ({
  name,
  stack: stackOf(layers, {
    beam,
    supportEntrance,
    sourceToDetector_mm: 1100,
    exitToDetector_mm: 100,
    field_mm: [field_cm * 10, field_cm * 10],
  }),
});

export const skinScenes: readonly SkinScene[] = [
  scene('soft tissue, no support', [], soft, 25),
  scene('soft tissue on table and mattress', mattress, soft, 25),
  scene('abdomen on table and mattress, small field', mattress, abdomen, 12),
  scene('abdomen on table and mattress, large field', mattress, abdomen, 40),
  scene('soft tissue on a bare table', [slab('carbon fibre', 4)], soft, 25),
  scene('chest on a thick mattress', [slab('carbon fibre', 3), slab(foam.name, 80)], chest, 35),
  scene('child on an acrylic top and pad', [slab('pmma', 10), slab(foam.name, 20)], child, 15),
  scene('soft tissue on table and mattress, parallel', mattress, soft, 20, 'parallel'),
];

export const skinPotentials_kV = [60, 80, 120] as const;

/** The beam before the support: tungsten, 12°, 3 mm aluminium. */
export const skinBeam = (potential_kV: number): Spectrum => accuracyBeam(potential_kV, []);

/** What the estimate says of the skin and of the layer behind it. */
export interface SkinEstimate {
  readonly backscatterFactor: number;
  /** Absorbed dose of the first layer over incident air kerma. */
  readonly firstLayerDose_mGy_per_mGy: number;
}

export function skinEstimate(
  stack: Stack,
  responses: ScatterResponses,
  potential_kV: number,
): SkinEstimate {
  const skin = attenuate(skinBeam(potential_kV), stack.supportEntrance);
  const { backscatter, layerAbsorbedFraction } = responsesOn(responses, skin.energies_keV);
  const [first] = deposition(skin, stack, layerAbsorbedFraction).layerAbsorbedDose_mGy;
  return {
    backscatterFactor: backscatterFactor(skin, backscatter),
    firstLayerDose_mGy_per_mGy: first / (airKerma_uGy(skin) * 1e-3),
  };
}
