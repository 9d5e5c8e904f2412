import type { Point } from '../geometry.js';
import type { StackLayout } from '../stack-layout.js';
import type { SceneDetail } from '../stack-scene-data.js';
import { type Drawing, drawing, type Pen, polyline } from './drawing.js';
import { hiddenPen } from './pens.js';

const roundCorners = 48;
/** A rim of paper keeps a small detail apart from the ink around it. */
const paperRim: Pen = { ink: 'paper', width_px: 4, opacity: 1, over: true };
const inkRim: Pen = { ink: 'ink', width_px: 1.6, opacity: 1, over: true };

/** The detail's outline in the cut face, about its centre. */
function outline({ form, height_mm, breadth_mm }: SceneDetail): [number, number][] {
  if (form === 'cylinder') {
    return Array.from({ length: roundCorners }, (_, i): [number, number] => {
      const angle = (2 * Math.PI * i) / roundCorners;
      return [(height_mm / 2) * Math.cos(angle), (height_mm / 2) * Math.sin(angle)];
    });
  }
  const [x, y] = [breadth_mm / 2, height_mm / 2];
  return [
    [-x, y],
    [x, y],
    [x, -y],
    [-x, -y],
  ];
}

/**
 * The detail cut in half: filled in the cut face, its part behind drawn with hidden lines. One that
 * is an absence is left empty.
 */
export function detailDrawing(detail: SceneDetail | null, layout: StackLayout): Drawing {
  if (!detail || layout.detail === null) return drawing({});
  const middle = -layout.detail;
  const rim = outline(detail);
  const at = (z: number) => rim.map(([x, y]): Point => [x, middle + y, z]);
  const closed = (points: readonly Point[]) => [...points, points[0]];
  const back = -detail.length_mm / 2;
  const corners = detail.form === 'cylinder' ? [0, roundCorners / 2] : [0, 1, 2, 3];
  return drawing({
    faces: [{ corners: at(0), fill: detail.isAbsence ? 'paper' : 'ink', over: true }],
    strokes: [
      ...polyline(closed(at(0)), paperRim),
      ...polyline(closed(at(back)), hiddenPen),
      ...corners.map((i) => ({ from: at(0)[i], to: at(back)[i], pen: hiddenPen })),
      ...(detail.isAbsence ? polyline(closed(at(0)), inkRim) : []),
    ],
  });
}
