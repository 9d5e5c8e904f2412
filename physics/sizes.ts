import type { Case, Size, Technique } from './case/schema.js';
import { compare } from './compare.js';
import { evaluate } from './evaluate.js';
import { isAllowed } from './limits.js';
import { numberText } from './number-text.js';
import { operatingPoint } from './operating-point.js';
import type { Comparison, Evaluation, Finding } from './results.js';
import { sizesOf } from './stack/sizes.js';

/** A percentile of the mix, evaluated at its own thickness. */
export interface PercentileResult {
  readonly percentile: number;
  readonly thickness_mm: number;
  readonly evaluations: readonly Evaluation[];
  readonly comparisons: readonly Comparison[];
  readonly findings: readonly Finding[];
}

/** What a Proposed technique means for the whole mix, as set. Shares are of patients, 0 to 1. */
export interface MixOutcome {
  readonly technique: string;
  /** Σw·K(proposed)/Σw·K(current) of incident air kerma per run, and of energy imparted per run. */
  readonly incidentAirKermaRatio: number | null;
  readonly energyImpartedRatio: number | null;
  /** Patients whose incident air kerma rises or whose SdNR falls by more than the margin. */
  readonly worseOffShare: number;
  /** Patients at whose size a limit forbids the technique. */
  readonly infeasibleShare: number;
  readonly worseOffSizes: readonly string[];
  readonly infeasibleSizes: readonly string[];
}

/** A row of the technique table the room would need. */
export interface TechniqueRow {
  readonly size: string;
  readonly thickness_mm: number;
  readonly share: number;
  readonly technique: string;
  readonly potential_kV: number;
  readonly filter: string;
  readonly grid: 'in' | 'out';
  readonly tubeCurrent_mA: number | null;
  readonly exposureTime_ms: number | null;
  readonly tubeLoad_mAs: number;
  readonly sdnr: number;
  readonly incidentAirKerma_mGy: number;
  readonly isAllowed: boolean;
}

/**
 * Thickness at a percentile of a weighted mix: each size stands at the middle of its own share of
 * the patients, and the percentile is interpolated between those middles; the ends hold.
 */
export const percentileThickness_mm = (sizes: readonly Size[], percentile: number): number => {
  const sorted = [...sizes].sort((a, b) => a.thickness_mm - b.thickness_mm);
  const total = sorted.reduce((sum, { weight }) => sum + weight, 0);
  if (!(total > 0)) return sorted[Math.floor(sorted.length / 2)].thickness_mm;
  let before = 0;
  const places = sorted.map(({ weight, thickness_mm }) => {
    const at = (before + weight / 2) / total;
    before += weight;
    return { at, thickness_mm };
  });
  const wanted = percentile / 100;
  const after = places.findIndex(({ at }) => at >= wanted);
  if (after <= 0) return places[after < 0 ? places.length - 1 : 0].thickness_mm;
  const low = places[after - 1];
  const high = places[after];
  const share = (wanted - low.at) / (high.at - low.at);
  return low.thickness_mm + share * (high.thickness_mm - low.thickness_mm);
};

/** Percentiles every size mix is shown at. */
export const shownPercentiles: readonly number[] = [5, 50, 95];

/** The evaluations of every technique at one size of the mix; null where there is none. */
interface AtSize {
  readonly size: Size;
  readonly share: number;
  readonly evaluations: readonly (Evaluation | null)[];
}

const acrossSizes = (c: Case, evaluations: readonly Evaluation[]): AtSize[] => {
  const sizes = sizesOf(c.patient);
  const total = sizes.reduce((sum, { weight }) => sum + weight, 0);
  return sizes.map((size) => ({
    size,
    share: total > 0 ? size.weight / total : 1 / sizes.length,
    evaluations: c.techniques.map(
      ({ name }) =>
        evaluations.find((one) => one.technique === name && one.size === size.name) ?? null,
    ),
  }));
};

/**
 * What a weighed case means across its size mix: averages, who is worse off, the technique table.
 *
 * @param evaluations those of `weigh` for the same case.
 */
export const mixOutcomes = (
  c: Case,
  evaluations: readonly Evaluation[],
): { readonly outcomes: readonly MixOutcome[]; readonly table: readonly TechniqueRow[] } => {
  const across = acrossSizes(c, evaluations);
  return {
    outcomes: c.techniques.slice(1).map((technique, i) => outcomeOf(c, technique, i + 1, across)),
    table: across.flatMap(tableRows),
  };
};

/** The percentiles of the mix, each evaluated at its own thickness; none for a single size. */
export const percentileResults = (c: Case): PercentileResult[] => {
  const sizes = sizesOf(c.patient);
  return sizes.length > 1 ? shownPercentiles.map((p) => percentileResult(c, sizes, p)) : [];
};

const percentileResult = (
  c: Case,
  sizes: readonly Size[],
  percentile: number,
): PercentileResult => {
  const thickness_mm = percentileThickness_mm(sizes, percentile);
  const size = sizes.find((one) => one.thickness_mm === thickness_mm) ?? {
    name: `P${percentile}`,
    thickness_mm: Number(thickness_mm.toPrecision(6)),
    weight: 0,
  };
  const points = c.techniques.map((technique) => operatingPoint(c, technique, size));
  const [current, ...proposed] = points;
  return {
    percentile,
    thickness_mm,
    evaluations: points.flatMap((point, i) => ('made' in point ? [evaluate(c, point, i)] : [])),
    comparisons:
      'made' in current
        ? proposed.flatMap((point) => ('made' in point ? [compare(c, current, point)] : []))
        : [],
    findings: points.flatMap((point) => ('made' in point ? [] : point.findings)),
  };
};

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
    return (
      proposed.dose.perRun.incidentAirKerma_mGy >
        current.dose.perRun.incidentAirKerma_mGy * (1 + 1e-9) ||
      proposed.sdnr < current.sdnr * margin
    );
  };
  const isInfeasible = ({ evaluations }: AtSize): boolean =>
    !evaluations[index] || !isAllowed(evaluations[index].findings);
  const shareOf = (rows: readonly AtSize[]): number =>
    rows.reduce((sum, { share }) => sum + share, 0);
  const worse = across.filter(isWorse);
  const infeasible = across.filter(isInfeasible);
  return {
    technique: technique.name,
    incidentAirKermaRatio: mixRatio(across, index, (e) => e.dose.perRun.incidentAirKerma_mGy),
    energyImpartedRatio: mixRatio(across, index, (e) => e.dose.perRun.energyImparted_mJ),
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

const tableRows = ({ size, share, evaluations }: AtSize): TechniqueRow[] =>
  evaluations.flatMap((evaluation) =>
    evaluation
      ? [
          {
            size: size.name,
            thickness_mm: size.thickness_mm,
            share,
            technique: evaluation.technique,
            ...evaluation.setting,
            tubeCurrent_mA: evaluation.exposure.tubeCurrent_mA,
            exposureTime_ms: evaluation.exposure.exposureTime_ms,
            tubeLoad_mAs: evaluation.exposure.tubeLoad_mAs,
            sdnr: evaluation.sdnr,
            incidentAirKerma_mGy: evaluation.dose.incidentAirKerma_mGy,
            isAllowed: isAllowed(evaluation.findings),
          },
        ]
      : [],
  );

/** The sentence a board reads first about the mix. */
export const outcomeSentence = (outcome: MixOutcome): string => {
  const percent = (share: number): string => `${numberText(100 * share, 3)} %`;
  const saving =
    outcome.incidentAirKermaRatio === null
      ? 'incident air kerma cannot be compared'
      : `incident air kerma per run ×${numberText(outcome.incidentAirKermaRatio)} averaged over the size mix`;
  return `${outcome.technique}, as set: ${saving}; ${percent(outcome.worseOffShare)} of patients worse off, ${percent(outcome.infeasibleShare)} at sizes the room forbids.`;
};
