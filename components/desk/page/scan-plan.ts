import type { Case } from '../../../physics/case/schema.js';
import type { HoldConstant } from '../../../physics/results.js';
import { roomPotentials_kV } from '../../../physics/room-potentials.js';
import type { ScanRequest } from '../../workers/scan-slice.js';

/** Potentials computed at a time: short enough that an edit never waits long behind them. */
const slice = 6;
/** No more potentials a line than can be told apart on the plot. */
const most = 76;

/** The potential scan of a case in slices, the filters of the techniques first. */
export function scanPlan(c: Case, size: string, hold: HoldConstant): ScanRequest[] {
  const used = c.techniques.map(({ filter }) => filter);
  const rank = (name: string) => (used.includes(name) ? used.indexOf(name) : used.length);
  const filters = c.room.filters.map(({ name }) => name).sort((a, b) => rank(a) - rank(b));
  const potentials = roomPotentials_kV(c, most);
  return filters.flatMap((filter) =>
    Array.from({ length: Math.ceil(potentials.length / slice) }, (_, i) => ({
      size,
      filter,
      hold,
      potentials_kV: potentials.slice(i * slice, (i + 1) * slice),
    })),
  );
}
