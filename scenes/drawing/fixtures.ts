import type { Point } from '../geometry.js';
import { techniqueInkName } from '../inks.js';
import type { StackLayout } from '../stack-layout.js';
import type { StackScene } from '../stack-scene-data.js';
import { halves, lift_mm, ownerOf } from './beam.js';
import { blockDrawing } from './box.js';
import { type Drawing, drawing, joined, type Pen, polyline } from './drawing.js';
import { cutPen, edgePen } from './pens.js';

/** How far a filter reaches beyond the beam, and the least it measures, px. */
const filterReach_px = 10;
const filterLeast_px = 34;

/** The focal spot, of one size whatever the zoom; a parallel beam comes from a plane. */
export function focalSpot(scene: StackScene, layout: StackLayout): Drawing {
  const [x, z] = scene.beam === 'parallel' ? layout.halfField(0) : [0, 0];
  const pen: Pen = { ink: 'ink', width_px: x > 0 ? 2 : 9, opacity: 1, over: true };
  const corners: Point[] = [
    [-x, 0, 0],
    [x, 0, 0],
    [x, 0, -z],
    [-x, 0, -z],
  ];
  return drawing({
    strokes: x > 0 ? polyline([...corners, corners[0]], pen) : polyline(corners.slice(0, 2), pen),
  });
}

/** Each technique's filter in its half: a hatched plate, or a dashed line where there is none. */
export function filterDrawing(scene: StackScene, layout: StackLayout): Drawing {
  const { top, bottom } = layout.filter;
  const [x, z] = layout.halfField(bottom);
  const half = Math.max(x + filterReach_px / layout.px_per_mm, filterLeast_px / layout.px_per_mm);
  const depth = Math.max(z, half / 2);
  return joined(
    halves.map(({ side, technique }) => {
      const owner = ownerOf(scene, technique);
      const ink = techniqueInkName(owner);
      const middle = -(top + bottom) / 2;
      if (!scene.techniques[owner]?.filter) {
        const pen: Pen = { ink, width_px: 1, opacity: 0.8, dash: [2, 3] };
        return drawing({
          strokes: [{ from: [0, middle, lift_mm], to: [side * half, middle, lift_mm], pen }],
        });
      }
      return blockDrawing(
        { left: side < 0 ? -half : 0, right: side < 0 ? 0 : half, top, bottom, depth },
        {
          front: 'paper',
          hatch: 'metal',
          hatchInk: ink,
          side: 'shade',
          above: 'paper',
          frontPen: { ink, width_px: 1, opacity: 1 },
          backPen: { ink, width_px: 0.8, opacity: 0.6 },
        },
      );
    }),
  );
}

/** The detector as a solid slab whose entrance face shows the field. */
export function detectorDrawing(scene: StackScene, layout: StackLayout): Drawing {
  const reach = 4 / layout.px_per_mm;
  const halfWidth = Math.max(layout.body.halfWidth, scene.field_mm[0] / 2) + reach;
  const depth = Math.max(layout.body.depth, scene.field_mm[1] / 2);
  return blockDrawing(
    { left: -halfWidth, right: halfWidth, ...layout.detector, depth },
    {
      front: 'ink',
      side: 'ink',
      above: 'shade',
      frontPen: { ...cutPen, ink: 'ink' },
      backPen: edgePen,
    },
  );
}
