import { halfValueLayer_mm, monoenergetic } from '../beam/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { numberAfter, referenceRows } from './reference-rows.js';

/** Half-value layers of single energies in aluminium. */
export const monoChecks = (): CheckRow[] =>
  referenceRows('tg195')
    .filter(({ set }) => set === 'mono HVL')
    .map((row) => {
      const beam = monoenergetic(numberAfter(row.item, 'at'));
      return checkRow(row, halfValueLayer_mm(beam, materialOf('aluminium')), { relative: 0.01 });
    });
