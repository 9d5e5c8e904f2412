import type { DepthProfiles } from '../../../physics/depth-profiles.js';
import type { DepthProfile, Shading } from '../../../scenes/stack-scene-data.js';
import { stepProfile } from '../../../scenes/step-profile.js';
import { type DeskModel, sizeShown } from '../model/desk-model.js';

type DepthInk = Omit<Shading, 'perTechnique'> & {
  readonly profileOf: (profiles: DepthProfiles) => DepthProfile | null;
};

/** Inks that show what happens along the depth; they are computed once one of them is chosen. */
const depthInks: readonly DepthInk[] = [
  {
    quantity: 'energy absorbed per depth',
    unit: 'mJ/mm per frame',
    scale: 'log',
    extent: 'body',
    profileOf: ({ absorbed }) =>
      absorbed && stepProfile(absorbed.faces_mm, absorbed.energy_mJ_per_mm),
  },
  {
    quantity: 'absorbed energy that scatter brings',
    unit: '%',
    scale: 'linear',
    extent: 'body',
    profileOf: ({ absorbed }) =>
      absorbed &&
      stepProfile(
        absorbed.faces_mm,
        absorbed.energy_mJ_per_mm.map((energy, k) =>
          energy > 0 ? (100 * absorbed.fromScattered_mJ_per_mm[k]) / energy : 0,
        ),
      ),
  },
  {
    quantity: 'first scatter at the detector',
    unit: '% of primary/cm',
    scale: 'linear',
    extent: 'beam',
    profileOf: ({ firstScatter }) =>
      stepProfile(
        firstScatter.faces_mm,
        firstScatter.scatterToPrimary_per_cm.map((ratio) => 100 * ratio),
      ),
  },
];

export const isDepthInk = (quantity: string): boolean =>
  depthInks.some((ink) => ink.quantity === quantity);

const made = new WeakMap<DeskModel, readonly Shading[]>();

/** Absorbed energy and scatter as ink; without values until they were asked for. */
export function depthShadingsOf(model: DeskModel): readonly Shading[] {
  const known = made.get(model);
  if (known) return known;
  const { draft, left, right } = model;
  const shown = [left, ...(right === null ? [] : [right])];
  const size = sizeShown(model).name;
  const profiles = shown.map((index) =>
    model.depths?.find(
      (entry) => entry.technique === draft.case.techniques[index].name && entry.size === size,
    ),
  );
  const shadings = depthInks.map(
    ({ profileOf, ...ink }): Shading => ({
      ...ink,
      perTechnique: profiles.map((entry) => (entry ? profileOf(entry) : null)),
    }),
  );
  made.set(model, shadings);
  return shadings;
}
