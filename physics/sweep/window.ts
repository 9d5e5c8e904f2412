import { type CostName, figureOfMerit } from './costs.js';
import type { SweepSetting } from './sweep-setting.js';

/** Share of the best figure of merit that still counts as good. */
export const windowShare = 0.9;

/**
 * The unbroken run of potentials around `best_kV` whose figure of merit is at least 90 % of that
 * there; limits are not asked, so the window shows how flat the optimum is.
 *
 * @param settings one filter at one size, ascending in potential.
 * @returns the run's ends; `best_kV` twice when it has no neighbour that good.
 */
export const window90_kV = (
  settings: readonly SweepSetting[],
  cost: CostName,
  best_kV: number,
): [number, number] => {
  const merits = settings.map(({ values }) => (values && figureOfMerit(values, cost)) ?? 0);
  const at = settings.findIndex(({ potential_kV }) => potential_kV === best_kV);
  if (at < 0) return [best_kV, best_kV];
  const enough = windowShare * merits[at];
  let [low, high] = [at, at];
  while (low > 0 && merits[low - 1] >= enough) low--;
  while (high < merits.length - 1 && merits[high + 1] >= enough) high++;
  return [settings[low].potential_kV, settings[high].potential_kV];
};
