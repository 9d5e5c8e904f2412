import type { Evaluation } from '../../../physics/results.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { quantity } from '../../charts/quantities.js';
import type { ThicknessData } from '../../charts/thickness-chart.js';
import { investigationalWords } from '../curve-panel/curve-data.js';
import type { DeskModel } from '../model/desk-model.js';
import { forbiddenBy } from '../sweep-section/map-data.js';
import { mixOf } from './mix-of.js';
import type { SizesAnswer } from './sizes-ask.js';

const titled = (id: string): string => {
  const { name, per, unit } = quantity(id);
  return `${name}${per ? ` ${per}` : ''}${unit ? `, ${unit}` : ''}`;
};

/** What the chart along thickness shows: the dose the case leads with, and SdNR, both techniques. */
export function thicknessData(model: DeskModel, answer: SizesAnswer | null): ThicknessData {
  const { case: c } = model.draft;
  const shown = [model.left, ...(model.right === null ? [] : [model.right])];
  const panels = [c.compare.primaryDose, 'sdnr'];
  const evaluations: readonly Evaluation[] = [
    ...mixOf(model).evaluations,
    ...(answer?.between ?? []).flatMap((result) => result.evaluations),
  ];
  const sizes = sizesOf(c.patient);
  const total = sizes.reduce((sum, { weight }) => sum + weight, 0);
  return {
    panels: panels.map(titled),
    lines: shown
      .map((ink) => ({
        ink,
        name: c.techniques[ink].name,
        points: evaluations
          .filter(({ technique }) => technique === c.techniques[ink].name)
          .sort((a, b) => a.thickness_mm - b.thickness_mm)
          .map((evaluation) => ({
            thickness_mm: evaluation.thickness_mm,
            values: panels.map((id) => quantity(id).of(evaluation)),
            filter: evaluation.setting.filter,
            potential_kV: evaluation.setting.potential_kV,
            forbidden: forbiddenBy(evaluation.findings),
          })),
      }))
      .filter(({ points }) => points.length > 0),
    sizes: sizes.map(({ thickness_mm, weight }) => ({
      thickness_mm,
      share: total > 0 ? weight / total : 1 / sizes.length,
    })),
    percentiles: (answer?.percentiles ?? []).map(({ percentile, thickness_mm }) => ({
      percentile,
      thickness_mm,
    })),
    investigational: investigationalWords(c),
  };
}
