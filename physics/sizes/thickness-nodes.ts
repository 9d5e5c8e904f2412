import type { Case, Size } from '../case/schema.js';
import { isCurve } from '../control.js';
import { sizesOf } from '../stack/sizes.js';

/** Just short of a thickness: on the thin side of what a control curve does there. */
const hair_mm = 0.01;

/**
 * Thicknesses at which a chart over the mix must be computed: its sizes and, where a technique
 * follows a control curve, both sides of every change of filter and the curve's own rows between
 * the thinnest and the thickest size, so that a withdrawn filter shows as the jump it is.
 *
 * @returns ascending; sizes of the mix are the mix's own objects.
 */
export const thicknessNodes = (c: Case): Size[] => {
  const sizes = sizesOf(c.patient);
  const all_mm = sizes.map(({ thickness_mm }) => thickness_mm);
  const [thinnest_mm, thickest_mm] = [Math.min(...all_mm), Math.max(...all_mm)];
  const curveRows = c.techniques.flatMap(({ control }) =>
    isCurve(control) ? (control.rows ?? []) : [],
  );
  const jumps_mm = c.techniques.flatMap(({ control }) =>
    isCurve(control) ? filterChanges_mm(control.rows ?? []) : [],
  );
  const wanted_mm = [
    ...curveRows.map(({ thickness_mm }) => thickness_mm),
    ...jumps_mm.map((thickness_mm) => thickness_mm - hair_mm),
  ].filter((mm) => mm > thinnest_mm && mm < thickest_mm);
  const extra = [...new Set(wanted_mm)]
    .filter((mm) => !all_mm.includes(mm))
    .map((thickness_mm): Size => ({ name: `${thickness_mm} mm`, thickness_mm, weight: 0 }));
  return [...sizes, ...extra].sort((a, b) => a.thickness_mm - b.thickness_mm);
};

const filterChanges_mm = (
  rows: readonly { readonly thickness_mm: number; readonly filter: string }[],
): number[] =>
  rows.flatMap(({ thickness_mm, filter }, i) =>
    i > 0 && rows[i - 1].filter !== filter ? [thickness_mm] : [],
  );
