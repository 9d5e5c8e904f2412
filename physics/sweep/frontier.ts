import { isAllowed } from '../limits.js';
import { type CostName, costs } from './costs.js';
import type { SweepSetting } from './sweep-setting.js';

/** Equal to this relative difference counts as equal, so that rounding decides no dominance. */
const tolerance = 1e-9;

/**
 * Settings that no other setting of the same size beats: none is at least as good in every chosen
 * cost (lower) and in SdNR (higher) and better in one. Only settings that nothing forbids compete.
 *
 * @returns indices into `settings`, ascending.
 */
export const frontierOf = (
  settings: readonly SweepSetting[],
  chosen: readonly CostName[],
): number[] => {
  const competing = settings.flatMap((setting, index) => {
    if (!setting.values || !isAllowed(setting.findings)) return [];
    const paid = chosen.map((cost) => costs[cost].of(setting.values as never));
    if (paid.some((value) => value === null)) return [];
    // Every coordinate is to be small.
    return [{ index, size: setting.size, at: [...(paid as number[]), -setting.values.sdnr] }];
  });
  return competing
    .filter((one) => !competing.some((other) => other.size === one.size && beats(other.at, one.at)))
    .map(({ index }) => index);
};

const beats = (a: readonly number[], b: readonly number[]): boolean => {
  let isBetter = false;
  for (let i = 0; i < a.length; i++) {
    const slack = tolerance * Math.max(Math.abs(a[i]), Math.abs(b[i]));
    if (a[i] > b[i] + slack) return false;
    if (a[i] < b[i] - slack) isBetter = true;
  }
  return isBetter;
};
