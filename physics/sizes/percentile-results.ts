import type { Case, Size } from '../case/schema.js';
import { compare } from '../compare.js';
import { evaluate } from '../evaluate.js';
import { operatingPoint } from '../operating-point.js';
import type { Comparison, Evaluation, Finding } from '../results.js';
import { sizesOf } from '../stack/sizes.js';
import { percentileThickness_mm, shownPercentiles } from './percentile.js';

/** Every technique in a patient of one thickness, which need not be a size of the mix. */
export interface ThicknessResult {
  readonly thickness_mm: number;
  readonly evaluations: readonly Evaluation[];
  readonly comparisons: readonly Comparison[];
  readonly findings: readonly Finding[];
}

/** A percentile of the mix, evaluated at its own thickness. */
export interface PercentileResult extends ThicknessResult {
  readonly percentile: number;
}

/** Every technique at a size, and every Proposed against Current there. */
export const thicknessResult = (c: Case, size: Size): ThicknessResult => {
  const points = c.techniques.map((technique) => operatingPoint(c, technique, size));
  const [current, ...proposed] = points;
  return {
    thickness_mm: size.thickness_mm,
    evaluations: points.flatMap((point, i) => ('made' in point ? [evaluate(c, point, i)] : [])),
    comparisons:
      'made' in current
        ? proposed.flatMap((point) => ('made' in point ? [compare(c, current, point)] : []))
        : [],
    findings: points.flatMap((point) => ('made' in point ? [] : point.findings)),
  };
};

/** One percentile of the mix. */
export const percentileResult = (c: Case, percentile: number): PercentileResult => {
  const sizes = sizesOf(c.patient);
  const exact_mm = percentileThickness_mm(sizes, percentile);
  const size = sizes.find((one) => one.thickness_mm === exact_mm) ?? {
    name: `P${percentile}`,
    thickness_mm: Number(exact_mm.toPrecision(6)),
    weight: 0,
  };
  return { percentile, ...thicknessResult(c, size) };
};

/** The percentiles of the mix, each evaluated at its own thickness; none for a single size. */
export const percentileResults = (c: Case): PercentileResult[] =>
  sizesOf(c.patient).length > 1 ? shownPercentiles.map((p) => percentileResult(c, p)) : [];
