import type { Case, Size } from '../case/schema.js';
import { isAllowed } from '../limits.js';
import { operatingPoint } from '../operating-point.js';
import type { HoldConstant } from '../results.js';
import { roomPotentials_kV } from '../scan.js';
import type { Setting } from '../setting.js';
import { type CostName, costs, figureOfMerit } from '../sweep/costs.js';
import { type SweepSetting, sweepSetting } from '../sweep/sweep-setting.js';
import { type Answer, blockedBy, noAnswer } from './answer.js';

export interface BestSetting {
  readonly setting: Setting;
  readonly figureOfMerit: number;
  /** Potentials with the same filter whose figure of merit is within 90 % of the best. */
  readonly window90_kV: readonly [number, number];
}

/**
 * The room's best setting for SdNR² per a cost at a size, under a condition and every limit.
 *
 * The target is the figure of merit found in the map; the forward run evaluates the setting afresh.
 * When nothing is allowed, the findings are the limits of the best forbidden setting.
 */
export const bestSetting = (
  c: Case,
  size: Size,
  cost: CostName,
  holdConstant: HoldConstant,
): Answer<BestSetting> => {
  const reference = operatingPoint(c, c.techniques[0], size);
  if (!('made' in reference)) return noAnswer(null, reference.findings);
  const { grid } = c.techniques[0];
  const run = (setting: Setting): SweepSetting => sweepSetting(c, reference, setting, holdConstant);
  const mapped = c.room.filters.flatMap(({ name: filter }) =>
    roomPotentials_kV(c).map((potential_kV) => {
      const setting = { potential_kV, filter, grid };
      const made = run(setting);
      const merit = made.values && figureOfMerit(made.values, cost);
      return { setting, merit, findings: made.findings };
    }),
  );
  const ranked = mapped
    .filter((one): one is typeof one & { merit: number } => one.merit !== null)
    .sort((a, b) => b.merit - a.merit);
  if (ranked.length === 0) {
    return noAnswer(null, [
      blockedBy('costUnknown', `SdNR² per ${costs[cost].words} cannot be computed in this room.`),
    ]);
  }
  const best = ranked.find(({ findings }) => isAllowed(findings));
  if (!best) {
    const limits = ranked[0].findings.filter(({ severity }) => severity === 'limit');
    return noAnswer(ranked[0].merit, limits);
  }
  const near = ranked.filter(
    ({ setting, merit }) => setting.filter === best.setting.filter && merit >= 0.9 * best.merit,
  );
  const potentials = near.map(({ setting }) => setting.potential_kV);
  const again = run(best.setting).values;
  return {
    value: {
      setting: best.setting,
      figureOfMerit: best.merit,
      window90_kV: [Math.min(...potentials), Math.max(...potentials)],
    },
    target: best.merit,
    forward: again && figureOfMerit(again, cost),
    findings: best.findings,
  };
};
