import type { Case } from '../case/schema.js';
import { isAllowed } from '../limits.js';
import type { OperatingPoint } from '../operating-point.js';
import { roomPotentials_kV } from '../scan.js';
import { type Setting, settingLabel } from '../setting.js';
import { sweepSetting } from '../sweep/sweep-setting.js';

/** Changing to the next filter in the room's list counts as much as this much potential. */
const filterStep_kV = 5;

/** Settings of the room, nearest to one first: potential in kV, filters by place in the list. */
const byNearness = (c: Case, from: Setting): Setting[] => {
  const filters = c.room.filters.map(({ name }) => name);
  const place = filters.indexOf(from.filter);
  const settings = filters.flatMap((filter, i) =>
    roomPotentials_kV(c).map((potential_kV) => ({
      setting: { potential_kV, filter, grid: from.grid },
      far:
        Math.abs(potential_kV - from.potential_kV) +
        filterStep_kV * Math.abs(i - Math.max(0, place)),
    })),
  );
  return settings.sort((a, b) => a.far - b.far).map(({ setting }) => setting);
};

/**
 * The nearest setting of the room that nothing forbids at this size under the technique's own
 * control. Looks at every setting, nearest first, and stops at the first allowed.
 *
 * @returns null when the room allows none.
 */
export const nearestAllowed = (c: Case, point: OperatingPoint): Setting | null =>
  byNearness(c, point.made.setting).find((setting) => {
    const { values, findings } = sweepSetting(c, point, setting, 'asSet');
    return values !== null && isAllowed(findings);
  }) ?? null;

/** The same in words: `73 kV, 0.1 Cu`. */
export const nearestAllowedText = (c: Case, point: OperatingPoint): string | null => {
  const setting = nearestAllowed(c, point);
  return setting && settingLabel(setting);
};
