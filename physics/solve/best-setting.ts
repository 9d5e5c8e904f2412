import type { Case, Size } from '../case/schema.js';
import { limitsOf } from '../findings.js';
import { isAllowed } from '../limits.js';
import { operatingPoint } from '../operating-point.js';
import type { HoldConstant } from '../results.js';
import { roomPotentials_kV } from '../room-potentials.js';
import type { Setting } from '../setting.js';
import { type CostName, costs, figureOfMerit } from '../sweep/costs.js';
import { type SweepSetting, sweepSetting } from '../sweep/sweep-setting.js';
import { window90_kV } from '../sweep/window.js';
import { type Answer, blockedBy, noAnswer } from './answer.js';

export interface BestSetting {
  readonly setting: Setting;
  readonly figureOfMerit: number;
  /** Potentials around the best, same filter, whose figure of merit is within 90 % of it. */
  readonly window90_kV: readonly [number, number];
  /** Detector air kerma the room must hold to deliver it. */
  readonly detectorAirKerma_uGy: number;
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
  const run = ({ potential_kV, filter }: Pick<Setting, 'potential_kV' | 'filter'>): SweepSetting =>
    sweepSetting(c, reference, { potential_kV, filter, grid }, holdConstant);
  const mapped = c.room.filters.flatMap(({ name: filter }) =>
    roomPotentials_kV(c).map((potential_kV) => run({ potential_kV, filter })),
  );
  const ranked = mapped
    .flatMap((made) => {
      const merit = made.values && figureOfMerit(made.values, cost);
      return merit === null ? [] : [{ made, merit }];
    })
    .sort((a, b) => b.merit - a.merit);
  if (ranked.length === 0) {
    const stopped = limitsOf(mapped[0]?.findings ?? []);
    const unknown = `SdNR² per ${costs[cost].words} cannot be computed in this room.`;
    return noAnswer(null, stopped.length > 0 ? stopped : [blockedBy('costUnknown', unknown)]);
  }
  const best = ranked.find(({ made }) => isAllowed(made.findings));
  if (!best) return noAnswer(ranked[0].merit, limitsOf(ranked[0].made.findings));
  const { potential_kV, filter } = best.made;
  const again = run(best.made);
  return {
    value: {
      setting: { potential_kV, filter, grid },
      figureOfMerit: best.merit,
      window90_kV: window90_kV(
        mapped.filter((made) => made.filter === filter),
        cost,
        potential_kV,
      ),
      detectorAirKerma_uGy: again.values?.detectorAirKerma_uGy ?? 0,
    },
    target: best.merit,
    forward: again.values && figureOfMerit(again.values, cost),
    findings: again.findings,
  };
};
