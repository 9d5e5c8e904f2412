import type { AbsorbedAlong } from '../../../physics/absorbed-along.js';
import type { DepthProfile, Shading } from '../../../scenes/stack-scene-data.js';
import { stepProfile } from '../../../scenes/step-profile.js';
import { type DeskModel, sizeShown } from '../model/desk-model.js';

type EnergyInk = Omit<Shading, 'perTechnique' | 'extent'> & {
  readonly valuesOf: (along: AbsorbedAlong) => readonly number[];
};

/** Inks that show absorbed energy; they are computed once one of them is chosen. */
export const energyInks: readonly EnergyInk[] = [
  {
    quantity: 'energy absorbed per depth',
    unit: 'mJ/mm per frame',
    scale: 'log',
    valuesOf: ({ energy_mJ_per_mm }) => energy_mJ_per_mm,
  },
  {
    quantity: 'absorbed energy that scatter brings',
    unit: '%',
    scale: 'linear',
    valuesOf: ({ energy_mJ_per_mm, fromScattered_mJ_per_mm }) =>
      energy_mJ_per_mm.map((energy, k) =>
        energy > 0 ? (100 * fromScattered_mJ_per_mm[k]) / energy : 0,
      ),
  },
];

export const isEnergyInk = (quantity: string): boolean =>
  energyInks.some((ink) => ink.quantity === quantity);

const made = new WeakMap<DeskModel, readonly Shading[]>();

/** Absorbed energy as ink, in all and from scatter; without values until it was asked for. */
export function energyShadingsOf(model: DeskModel): readonly Shading[] {
  const known = made.get(model);
  if (known) return known;
  const shadings = energyInks.map(
    ({ valuesOf, ...ink }): Shading => ({
      ...ink,
      extent: 'body',
      perTechnique: shownTechniques(model).map((name) => profileOf(model, name, valuesOf)),
    }),
  );
  made.set(model, shadings);
  return shadings;
}

const shownTechniques = ({ draft, left, right }: DeskModel): string[] =>
  [left, ...(right === null ? [] : [right])].map((index) => draft.case.techniques[index].name);

function profileOf(
  model: DeskModel,
  technique: string,
  valuesOf: EnergyInk['valuesOf'],
): DepthProfile | null {
  const size = sizeShown(model).name;
  const found = model.absorbed?.find(
    (entry: AbsorbedAlong) => entry.technique === technique && entry.size === size,
  );
  return found ? stepProfile(found.faces_mm, valuesOf(found)) : null;
}
