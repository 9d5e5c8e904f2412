import type { Point } from '../geometry.js';
import type { StackLayout } from '../stack-layout.js';
import { lift_mm } from './beam.js';
import { type Drawing, drawing, polyline } from './drawing.js';
import { breakPen } from './pens.js';

/** The conventional mark, px about the axis: half the gap, half width and height of the kink. */
export const breakShape = { gap_px: 3, kink_px: 7, rise_px: 8, reach_px: 14 } as const;

/**
 * Two kinked lines across the beam wherever free air is drawn shorter than it is. The kink passes
 * through (−k, 0), (−k/2, rise), (k/2, −rise), (k, 0).
 */
export function breakDrawing(layout: StackLayout): Drawing {
  const mm = (px: number) => px / layout.px_per_mm;
  const kink = mm(breakShape.kink_px);
  const rise = mm(breakShape.rise_px);
  return drawing({
    strokes: layout.shortened.flatMap(({ at }) => {
      const reach = layout.halfField(at)[0] + mm(breakShape.reach_px);
      return [-1, 1].flatMap((sign) => {
        const y = -at + sign * mm(breakShape.gap_px);
        const points: Point[] = [
          [-reach, y, lift_mm],
          [-kink, y, lift_mm],
          [-kink / 2, y + rise, lift_mm],
          [kink / 2, y - rise, lift_mm],
          [kink, y, lift_mm],
          [reach, y, lift_mm],
        ];
        return polyline(points, breakPen);
      });
    }),
  });
}
