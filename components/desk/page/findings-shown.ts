import { distinctFindings, limitsOf } from '../../../physics/findings.js';
import type { Finding } from '../../../physics/results.js';
import { marginHolds } from '../comparison-table/margin-holds.js';
import { comparisonOf, type DeskModel, evaluationOf } from '../model/desk-model.js';

/**
 * What the margin says of the techniques shown: everything at the size looked at, and what forbids
 * them at the other sizes. Each finding tells whose it is as data.
 */
export function findingsShown(model: DeskModel): Finding[] {
  const { left, right, draft, weighing, others } = model;
  const shown = [left, right].flatMap((i) => (i === null ? [] : draft.case.techniques[i].name));
  const concerns = ({ technique }: Finding) => technique === undefined || shown.includes(technique);
  const compared = (comparisonOf(model)?.rows ?? []).filter(({ holdConstant }) =>
    marginHolds.includes(holdConstant),
  );
  const elsewhere = others.flatMap(({ evaluations, findings }) => [
    ...evaluations.flatMap((evaluation) => evaluation.findings),
    ...findings,
  ]);
  return distinctFindings([
    ...[left, right].flatMap((index) => evaluationOf(model, index)?.findings ?? []),
    ...compared.flatMap((row) => row.findings),
    ...(weighing?.findings ?? []).filter(concerns),
    ...limitsOf(elsewhere).filter(concerns),
  ]);
}
