import type { AlongBeam } from '../../../physics/along-beam.js';
import type { Size } from '../../../physics/case/schema.js';
import type { DepthProfiles } from '../../../physics/depth-profiles.js';
import type { Comparison, Evaluation, Weighing } from '../../../physics/results.js';
import { type PlacedDetail, placeDetail } from '../../../physics/stack/place-detail.js';
import { placeStack } from '../../../physics/stack/place-stack.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import type { Stack } from '../../../physics/stack/stack.js';
import type { Track } from '../../../physics/transport/index.js';
import type { Draft } from '../../store/draft.js';

/** Photon paths to be drawn in the stack, and whose they are. */
export interface DrawnTracks {
  readonly technique: string;
  readonly size: string;
  readonly tracks: readonly Track[];
}

/** Everything the elements of the desk are handed: what is edited, and the last answer to it. */
export interface DeskModel {
  readonly draft: Draft;
  /** The last answer at the size looked at; null before the first. */
  readonly weighing: Weighing | null;
  /** Answers at the other sizes of the mix, as far as they have come. */
  readonly others: readonly Weighing[];
  /** The beam along the axis at the size looked at, per technique that could be computed. */
  readonly along: readonly AlongBeam[];
  /** Absorbed energy and scatter along the depth, once an ink shows them. */
  readonly depths?: readonly DepthProfiles[];
  /** Paths of the photons of a check, while they are to be drawn. */
  readonly tracks?: DrawnTracks | null;
  /** True while `weighing` belongs to an earlier state of the draft. */
  readonly stale: boolean;
  readonly sizeName: string;
  /** Numbers of the techniques on the left and right of the beam. */
  readonly left: number;
  readonly right: number | null;
}

/** The sizes of the case, and the one looked at. */
export const sizeShown = (model: DeskModel): Size => {
  const sizes = sizesOf(model.draft.case.patient);
  return sizes.find((size) => size.name === model.sizeName) ?? sizes[0];
};

/** The answer for technique number `index` at the size looked at. */
export function evaluationOf(model: DeskModel, index: number | null): Evaluation | null {
  if (index === null || !model.weighing) return null;
  const name = model.draft.case.techniques[index]?.name;
  const size = sizeShown(model).name;
  return model.weighing.evaluations.find((e) => e.technique === name && e.size === size) ?? null;
}

/** The comparison of the two techniques shown at the size looked at. */
export function comparisonOf(model: DeskModel): Comparison | null {
  const { techniques } = model.draft.case;
  const to = model.right === null ? undefined : techniques[model.right]?.name;
  const size = sizeShown(model).name;
  return model.weighing?.comparisons.find((c) => c.to === to && c.size === size) ?? null;
}

/** The patient at the size looked at and the detail in it; null where it has no place. */
export function placed(model: DeskModel): { stack: Stack | null; detail: PlacedDetail | null } {
  const stack = placeStack(model.draft.case, sizeShown(model));
  if ('findings' in stack) return { stack: null, detail: null };
  const detail = placeDetail(model.draft.case, stack);
  return { stack, detail: 'layerIndex' in detail ? detail : null };
}
