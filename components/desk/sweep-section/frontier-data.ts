import { holdConstantWords } from '../../../physics/compare.js';
import { isAllowed } from '../../../physics/limits.js';
import type { HoldConstant } from '../../../physics/results.js';
import { type CostName, costs } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import type { SweepValues } from '../../../physics/sweep/values.js';
import type { FrontierData } from '../../charts/frontier-chart.js';
import { investigationalWords } from '../curve-panel/curve-data.js';
import type { DeskModel } from '../model/desk-model.js';
import { techniqueMarks } from './map-data.js';

/** One axis of the frontier's chart. */
export interface FrontierAxis {
  readonly words: string;
  readonly unit: string;
  readonly of: (values: SweepValues) => number | null;
}

const sdnr: FrontierAxis = { words: 'SdNR', unit: '', of: (values) => values.sdnr };

/**
 * The axes: first cost across, SdNR up. Held equal, SdNR tells no setting from another, so the
 * second cost takes its place.
 */
export const frontierAxes = (
  chosen: readonly CostName[],
  hold: HoldConstant,
): readonly [FrontierAxis, FrontierAxis] => [
  costs[chosen[0]],
  hold === 'sdnr' ? costs[chosen[1] ?? chosen[0]] : sdnr,
];

const named = ({ words, unit }: FrontierAxis): string => (unit ? `${words}, ${unit}` : words);

/** Where a setting lies on the chart; null where a value is missing. */
export const pointOf = (
  [x, y]: readonly [FrontierAxis, FrontierAxis],
  values: SweepValues | null,
): { readonly x: number; readonly y: number } | null => {
  const [across, up] = [values && x.of(values), values && y.of(values)];
  return across === null || up === null ? null : { x: across, y: up };
};

/** What the frontier's chart shows at one size; techniques stand where the condition puts them. */
export function frontierData(
  model: DeskModel,
  size: string,
  settings: readonly SweepSetting[],
  isMember: ReadonlySet<number>,
  chosen: readonly CostName[],
  hold: HoldConstant,
): FrontierData {
  const axes = frontierAxes(chosen, hold);
  const points = settings.flatMap(({ values, findings }, i) => {
    const at = isAllowed(findings) ? pointOf(axes, values) : null;
    return at ? [{ ...at, onFrontier: isMember.has(i) }] : [];
  });
  const marks = techniqueMarks(model).flatMap(({ ink, name, potential_kV, filter }) => {
    const setting = settings.find(
      (one) => one.potential_kV === potential_kV && one.filter === filter,
    );
    const at = setting && pointOf(axes, setting.values);
    return at ? [{ ink, name, ...at }] : [];
  });
  return {
    xName: named(axes[0]),
    yName: named(axes[1]),
    holdConstant: holdConstantWords[hold],
    size,
    points,
    isLine: hold === 'sdnr' && chosen.length === 2,
    marks,
    investigational: investigationalWords(model.draft.case),
  };
}
