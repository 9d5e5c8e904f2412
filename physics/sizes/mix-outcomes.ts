import type { Case, Technique } from '../case/schema.js';
import { isAllowed } from '../limits.js';
import { numberText } from '../number-text.js';
import type { Comparison, Evaluation } from '../results.js';
import { type AtSize, acrossSizes } from './across-sizes.js';
import { type TechniqueRow, techniqueRows } from './technique-rows.js';

/** What a Proposed technique means for the whole mix, as set. Shares are of patients, 0 to 1. */
export interface MixOutcome {
  readonly technique: string;
  /** Σw·K(proposed)/Σw·K(current) per run, over the sizes at which both can be computed. */
  readonly incidentAirKermaRatio: number | null;
  readonly kermaAreaProductRatio: number | null;
  readonly energyImpartedRatio: number | null;
  /** Share of patients those ratios speak for. */
  readonly comparedShare: number;
  /** Patients whose incident air kerma rises or whose SdNR falls by more than the margin. */
  readonly worseOffShare: number;
  /** Patients at whose size a limit forbids the technique. */
  readonly infeasibleShare: number;
  readonly worseOffSizes: readonly string[];
  readonly infeasibleSizes: readonly string[];
}

/**
 * What a weighed case means across its size mix: averages, who is worse off, the technique table.
 *
 * @param evaluations those of `weigh` for the same case.
 * @param comparisons likewise; without them the table leaves out what equal SdNR would take.
 */
export const mixOutcomes = (
  c: Case,
  evaluations: readonly Evaluation[],
  comparisons: readonly Comparison[] = [],
): { readonly outcomes: readonly MixOutcome[]; readonly table: readonly TechniqueRow[] } => {
  const across = acrossSizes(c, evaluations, comparisons);
  return {
    outcomes: c.techniques.slice(1).map((technique, i) => outcomeOf(c, technique, i + 1, across)),
    table: across.flatMap(techniqueRows),
  };
};

const shareOf = (rows: readonly AtSize[]): number =>
  rows.reduce((sum, { share }) => sum + share, 0);

const outcomeOf = (
  c: Case,
  technique: Technique,
  index: number,
  across: readonly AtSize[],
): MixOutcome => {
  const margin = 1 - c.compare.sdnrMargin_percent / 100;
  const isWorse = ({ evaluations }: AtSize): boolean => {
    const [current, proposed] = [evaluations[0], evaluations[index]];
    if (!current || !proposed) return false;
    const [before, after] = [current, proposed].map((e) => e.dose.perRun.incidentAirKerma_mGy);
    return after > before * (1 + 1e-9) || proposed.sdnr < current.sdnr * margin;
  };
  const isInfeasible = ({ evaluations }: AtSize): boolean =>
    !evaluations[index] || !isAllowed(evaluations[index].findings);
  const worse = across.filter(isWorse);
  const infeasible = across.filter(isInfeasible);
  const compared = across.filter(({ evaluations }) => evaluations[0] && evaluations[index]);
  return {
    technique: technique.name,
    incidentAirKermaRatio: mixRatio(across, index, (e) => e.dose.perRun.incidentAirKerma_mGy),
    kermaAreaProductRatio: mixRatio(across, index, (e) => e.dose.perRun.kermaAreaProduct_Gycm2),
    energyImpartedRatio: mixRatio(across, index, (e) => e.dose.perRun.energyImparted_mJ),
    comparedShare: shareOf(compared),
    worseOffShare: shareOf(worse),
    infeasibleShare: shareOf(infeasible),
    worseOffSizes: worse.map(({ size }) => size.name),
    infeasibleSizes: infeasible.map(({ size }) => size.name),
  };
};

/** Σw·q(proposed)/Σw·q(current) over the sizes at which both can be computed. */
const mixRatio = (
  across: readonly AtSize[],
  index: number,
  quantity: (evaluation: Evaluation) => number | null,
): number | null => {
  let above = 0;
  let below = 0;
  for (const { share, evaluations } of across) {
    const [current, proposed] = [evaluations[0], evaluations[index]];
    const [from, to] = [current && quantity(current), proposed && quantity(proposed)];
    if (from === null || to === null) continue;
    below += share * from;
    above += share * to;
  }
  return below > 0 ? above / below : null;
};

/** The sentence a board reads first about the mix. */
export const outcomeSentence = (outcome: MixOutcome): string => {
  const percent = (share: number): string => `${numberText(100 * share, 3)} %`;
  const saving =
    outcome.incidentAirKermaRatio === null
      ? 'incident air kerma cannot be compared'
      : `incident air kerma per run ×${numberText(outcome.incidentAirKermaRatio)} averaged over the size mix`;
  return `${outcome.technique}, as set: ${saving}; ${percent(outcome.worseOffShare)} of patients worse off, ${percent(outcome.infeasibleShare)} at sizes the room forbids.`;
};
