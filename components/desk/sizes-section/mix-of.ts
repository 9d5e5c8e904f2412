import type { Comparison, Evaluation } from '../../../physics/results.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import type { DeskModel } from '../model/desk-model.js';

/** What the desk has weighed so far across the size mix. */
export interface Mix {
  readonly evaluations: readonly Evaluation[];
  readonly comparisons: readonly Comparison[];
  /** Sizes that came back, computable or not, and how many there are. */
  readonly weighed: number;
  readonly sizes: number;
}

export const mixOf = ({ weighing, others, draft }: DeskModel): Mix => {
  const all = [...(weighing ? [weighing] : []), ...others];
  return {
    evaluations: all.flatMap(({ evaluations }) => evaluations),
    comparisons: all.flatMap(({ comparisons }) => comparisons),
    weighed: all.length,
    sizes: sizesOf(draft.case.patient).length,
  };
};
