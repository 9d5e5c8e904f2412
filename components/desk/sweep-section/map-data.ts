import { holdConstantWords } from '../../../physics/compare.js';
import { isAllowed } from '../../../physics/limits.js';
import type { Finding } from '../../../physics/results.js';
import { type CostName, costs, figureOfMerit } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { window90_kV } from '../../../physics/sweep/window.js';
import { limitName } from '../../charts/limit-names.js';
import type { MapBest, MapCell, MapMark, SweepMapData } from '../../charts/sweep-map-layout.js';
import { investigationalWords } from '../curve-panel/curve-data.js';
import { type DeskModel, evaluationOf } from '../model/desk-model.js';
import type { SweepState } from './sweep-state.js';

/** The name of the first limit a setting breaks; null where nothing forbids it. */
export const forbiddenBy = (findings: readonly Finding[]): string | null => {
  const limit = findings.find(({ severity }) => severity === 'limit');
  return limit ? limitName(limit.code) : null;
};

/** The techniques shown, where they stand at the size: as set, also where a control curve leads. */
export const techniqueMarks = (model: DeskModel): MapMark[] =>
  [model.left, ...(model.right === null ? [] : [model.right])].map((ink) => {
    const technique = model.draft.case.techniques[ink];
    const { potential_kV, filter } = evaluationOf(model, ink)?.setting ?? technique;
    return { ink, name: technique.name, potential_kV, filter };
  });

/** The best allowed setting by a cost; null where none is allowed or known. */
export const bestOf = (settings: readonly SweepSetting[], cost: CostName): MapBest | null => {
  let best: { setting: SweepSetting; merit: number } | null = null;
  for (const setting of settings) {
    const merit = setting.values && figureOfMerit(setting.values, cost);
    if (merit === null || !isAllowed(setting.findings) || merit <= (best?.merit ?? 0)) continue;
    best = { setting, merit };
  }
  if (!best) return null;
  const { potential_kV, filter } = best.setting;
  const line = settings.filter((setting) => setting.filter === filter);
  return {
    potential_kV,
    filter,
    merit: best.merit,
    window90_kV: window90_kV(line, cost, potential_kV),
  };
};

/** `SdNR² per incident air kerma`. */
export const meritName = (cost: CostName): string => `SdNR² per ${costs[cost].words}`;

/** What the map of one size shows. */
export function mapData(
  model: DeskModel,
  { request }: SweepState,
  size: string,
  settings: readonly SweepSetting[],
  cost: CostName,
): SweepMapData {
  const { potentials_kV, filters } = request.axes;
  return {
    meritName: meritName(cost),
    meritUnit: `per ${costs[cost].unit}`,
    holdConstant: holdConstantWords[request.holdConstant],
    size,
    potentials_kV,
    rows: filters.map((filter) => ({
      filter,
      cells: settings
        .filter((setting) => setting.filter === filter)
        .map(
          ({ values, findings }): MapCell => ({
            merit: values && figureOfMerit(values, cost),
            forbidden: forbiddenBy(findings),
          }),
        ),
    })),
    marks: techniqueMarks(model),
    best: bestOf(settings, cost),
    investigational: investigationalWords(model.draft.case),
  };
}
