import type { Evaluation } from '../../../physics/results.js';
import { faceDepths_mm, type Shading, type StackScene } from '../../../scenes/stack-scene-data.js';
import { stepProfile } from '../../../scenes/step-profile.js';
import { type DeskModel, evaluationOf } from '../model/desk-model.js';
import { depthShadingsOf } from '../transport-section/depth-shadings.js';
import { stackSceneOf } from './stack-scene.js';

/** Mean absorbed dose of every layer as a profile; null while it is not computed. */
function absorbedDose(scene: StackScene, evaluation: Evaluation | null) {
  const doses = evaluation?.dose.layerAbsorbedDose_mGy;
  if (!doses || doses.length !== scene.layers.length) return null;
  return stepProfile(
    faceDepths_mm(scene),
    doses.map((dose) => dose.value),
  );
}

const made = new WeakMap<DeskModel, readonly Shading[]>();

/** What ink can show besides primary photons; empty before it is computed. */
export function stackShadingsOf(model: DeskModel): readonly Shading[] {
  const known = made.get(model);
  if (known) return known;
  const scene = stackSceneOf(model);
  const shown = model.right === null ? [model.left] : [model.left, model.right];
  const profiles = shown.map((index) => scene && absorbedDose(scene, evaluationOf(model, index)));
  const doses: Shading[] = profiles.some(Boolean)
    ? [
        {
          quantity: 'layer absorbed dose',
          unit: 'mGy per frame',
          scale: 'linear',
          extent: 'body',
          perTechnique: profiles,
        },
      ]
    : [];
  const shadings = [...doses, ...(scene ? depthShadingsOf(model) : [])];
  made.set(model, shadings);
  return shadings;
}
