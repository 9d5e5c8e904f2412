import type { Case } from '../../../physics/case/schema.js';
import type { ScanRequest } from '../../workers/evaluation-host.js';
import type { ScanHold } from '../../workers/scan-slice.js';

/** Potentials computed at a time: short enough that an edit never waits long behind them. */
const slice = 6;
/** No more potentials a line than can be told apart on the plot. */
const most = 76;

/** The potentials of a room's tube that the curve shows. */
export function scanPotentials_kV({ min, max, step }: Case['room']['tube']['potential_kV']): number[] {
  const stride = step * Math.max(1, Math.ceil((max - min) / step / (most - 1)));
  const count = Math.floor((max - min) / stride + 1e-9) + 1;
  return Array.from({ length: Math.max(1, count) }, (_, i) => Number((min + i * stride).toFixed(6)));
}

/** The potential scan of a case in slices, the filters of the techniques first. */
export function scanPlan(c: Case, size: string, hold: ScanHold): ScanRequest[] {
  const used = c.techniques.map(({ filter }) => filter);
  const rank = (name: string) => (used.includes(name) ? used.indexOf(name) : used.length);
  const filters = c.room.filters.map(({ name }) => name).sort((a, b) => rank(a) - rank(b));
  const potentials = scanPotentials_kV(c.room.tube.potential_kV);
  return filters.flatMap((filter) =>
    Array.from({ length: Math.ceil(potentials.length / slice) }, (_, i) => ({
      size,
      filter,
      hold,
      potentials_kV: potentials.slice(i * slice, (i + 1) * slice),
    })),
  );
}
