import { isAllowed } from '../limits.js';
import { type CostName, costs } from './costs.js';
import type { SweepSetting } from './sweep-setting.js';

/** Equal to this relative difference counts as equal, so that rounding decides no dominance. */
const tolerance = 1e-9;

/** A setting that competes, with every coordinate such that less is better. */
interface Competitor {
  readonly index: number;
  readonly at: readonly number[];
}

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
  const bySize = new Map<string, Competitor[]>();
  settings.forEach((setting, index) => {
    const at = coordinatesOf(setting, chosen);
    if (!at) return;
    const competitors = bySize.get(setting.size) ?? [];
    competitors.push({ index, at });
    bySize.set(setting.size, competitors);
  });
  return [...bySize.values()].flatMap(unbeaten).sort((a, b) => a - b);
};

/** Costs and SdNR with its sign turned; null for a setting that does not compete. */
const coordinatesOf = (
  { values, findings }: SweepSetting,
  chosen: readonly CostName[],
): number[] | null => {
  if (!values || !isAllowed(findings)) return null;
  const at = [-values.sdnr];
  for (const cost of chosen) {
    const paid = costs[cost].of(values);
    if (paid === null) return null;
    at.push(paid);
  }
  return at;
};

/**
 * In order of the first coordinate, only what stands before a competitor (or within rounding of it)
 * can beat it, and of that only what is itself unbeaten need be looked at.
 */
const unbeaten = (competitors: readonly Competitor[]): number[] => {
  const ordered = [...competitors].sort((a, b) => inOrder(a.at, b.at));
  let front: Competitor[] = [];
  for (const one of ordered) {
    if (front.some((other) => beats(other.at, one.at))) continue;
    // One that stands before by rounding alone may yet be beaten.
    front = front.filter((other) => !beats(one.at, other.at));
    front.push(one);
  }
  return front.map(({ index }) => index);
};

const inOrder = (a: readonly number[], b: readonly number[]): number => {
  const differing = a.findIndex((value, i) => value !== b[i]);
  return differing < 0 ? 0 : a[differing] - b[differing];
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
