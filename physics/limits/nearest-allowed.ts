import type { Case } from '../case/schema.js';
import { isCurve } from '../control.js';
import { isAllowedBySetting } from '../limits.js';
import type { OperatingPoint } from '../operating-point.js';
import { roomPotentials_kV } from '../room-potentials.js';
import { type Setting, settingLabel } from '../setting.js';
import { distance_kV } from '../sweep/nearness.js';
import { sweepSetting } from '../sweep/sweep-setting.js';

/** Settings of the room, nearest to one first: potential in kV, filters by place in the list. */
const byNearness = (c: Case, from: Setting): Setting[] => {
  const filters = c.room.filters.map(({ name }) => name);
  const here = {
    potential_kV: from.potential_kV,
    filterPlace: Math.max(0, filters.indexOf(from.filter)),
  };
  const settings = filters.flatMap((filter, filterPlace) =>
    roomPotentials_kV(c).map((potential_kV) => ({
      setting: { potential_kV, filter, grid: from.grid },
      far_kV: distance_kV(here, { potential_kV, filterPlace }),
    })),
  );
  return settings.sort((a, b) => a.far_kV - b.far_kV).map(({ setting }) => setting);
};

/**
 * The nearest setting of the room that is forbidden by nothing another setting could meet, at this
 * size under the technique's own control; a control curve speaks for its own settings only, so there
 * the detector air kerma is held. Looks at every setting, nearest first, and stops at the first.
 *
 * @returns null when the room allows none.
 */
export const nearestAllowed = (c: Case, point: OperatingPoint): Setting | null => {
  const hold = isCurve(point.technique.control) ? 'detectorAirKerma' : 'asSet';
  const allowed = byNearness(c, point.made.setting).find((setting) => {
    const { values, findings } = sweepSetting(c, point, setting, hold);
    return values !== null && isAllowedBySetting(findings);
  });
  return allowed ?? null;
};

/** The same as a sentence for a finding, and the setting alone: `73 kV, 0.1 Cu`. */
export const nearestAllowedWords = (
  c: Case,
  point: OperatingPoint,
): { readonly nearest: string | null; readonly sentence: string } => {
  const setting = nearestAllowed(c, point);
  const nearest = setting && settingLabel(setting);
  const condition = isCurve(point.technique.control)
    ? 'at the same detector air kerma'
    : 'under this control';
  return {
    nearest,
    sentence: nearest
      ? `Nearest allowed ${condition}: ${nearest}.`
      : `No setting of this room is allowed at this size ${condition}.`,
  };
};
