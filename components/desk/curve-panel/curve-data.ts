import { agent } from '../../../materials/index.js';
import type { Case } from '../../../physics/case/schema.js';
import { costs } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import type { DoseCurveData } from '../../charts/dose-curve.js';
import { limitName } from '../../charts/limit-names.js';
import { type Quantity, quantity } from '../../charts/quantities.js';
import { type DeskModel, evaluationOf, sizeShown } from '../model/desk-model.js';

/** The words for an agent that is not in clinical use; null for one that is, or none. */
export const investigationalWords = (c: Case): string | null => {
  const name = c.task.detail.agent?.name;
  return name && agent(name)?.investigational
    ? `${name}: investigational agent, not in clinical use`
    : null;
};

/** The quantities on the two axes, as the case chooses them. */
export const curveAxes = ({ compare }: Case): { value: Quantity; dose: Quantity } => ({
  value: quantity(compare.leading),
  dose: quantity(compare.primaryDose),
});

/** What the curve shows, from the scan and the techniques as set. */
export function curveData(
  model: DeskModel,
  scan: readonly SweepSetting[],
  holdConstant: string,
): DoseCurveData {
  const { case: c } = model.draft;
  const { value, dose } = curveAxes(c);
  const shown = [model.left, ...(model.right === null ? [] : [model.right])];
  const inkOf = (filter: string): number | null =>
    shown.find((i) => c.techniques[i].filter === filter) ?? null;
  const lines = c.room.filters.map(({ name }) => ({
    filter: name,
    ink: inkOf(name),
    points: scan
      .filter((point) => point.filter === name)
      .flatMap(({ potential_kV, values, findings }) => {
        const cost = values && costs[c.compare.primaryDose].of(values);
        if (values === null || cost === null) return [];
        const limit = findings.find(({ severity }) => severity === 'limit');
        const forbidden = limit ? limitName(limit.code) : null;
        return [{ potential_kV, dose: cost, value: values[c.compare.leading], forbidden }];
      }),
  }));
  const marks = shown.flatMap((index) => {
    const evaluation = evaluationOf(model, index);
    const cost = evaluation && dose.of(evaluation);
    const shows = evaluation && value.of(evaluation);
    return evaluation && cost !== null && shows !== null
      ? [
          {
            ink: index,
            name: c.techniques[index].name,
            potential_kV: evaluation.setting.potential_kV,
            dose: cost,
            value: shows,
          },
        ]
      : [];
  });
  return {
    valueName: `${value.name} of the ${c.task.detail.shape}`,
    doseName: `${dose.name.toLowerCase()} ${dose.per}`.trim(),
    doseUnit: dose.unit,
    holdConstant,
    size: sizeShown(model).name,
    lines: lines.filter((line) => line.points.length > 0),
    marks,
    rose: c.compare.leading === 'sdnr' ? c.task.roseThreshold : null,
    investigational: investigationalWords(c),
  };
}
