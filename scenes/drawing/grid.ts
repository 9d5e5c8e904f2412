import type { Point } from '../geometry.js';
import type { StackLayout } from '../stack-layout.js';
import type { StackScene } from '../stack-scene-data.js';
import { halves, ownerOf } from './beam.js';
import { type Drawing, drawing, type Pen, polyline, type Stroke } from './drawing.js';

/** Strips are drawn this far apart: hundreds would be a grey band. */
const pitch_px = 5.5;
const stripPen: Pen = { ink: 'ink', width_px: 1.4, opacity: 0.8 };
const receding: Pen = { ink: 'ink', width_px: 0.7, opacity: 0.22 };
const absent: Pen = { ink: 'soft', width_px: 0.8, opacity: 0.6, dash: [2, 3] };

/**
 * The grid's strips, leaning toward the focal spot in a point beam, in the half of each technique
 * that uses it; a dotted outline where one has it out.
 */
export function gridDrawing(scene: StackScene, layout: StackLayout): Drawing {
  const { grid } = layout;
  if (!grid) return drawing({});
  const halfWidth = Math.max(layout.body.halfWidth, scene.field_mm[0] / 2);
  const depth = Math.max(layout.body.depth, scene.field_mm[1] / 2);
  const pitch = pitch_px / layout.px_per_mm;
  const count = Math.floor(halfWidth / pitch);
  const lean = (x: number) =>
    scene.beam === 'parallel'
      ? x
      : (x * layout.along.distanceAt(grid.bottom)) / layout.along.distanceAt(grid.top);
  const strip = (x: number): Stroke[] => {
    const top: Point = [x, -grid.top, 0];
    return [
      { from: top, to: [lean(x), -grid.bottom, 0], pen: stripPen },
      { from: top, to: [x, -grid.top, -depth], pen: receding },
    ];
  };
  return drawing({
    strokes: halves.flatMap(({ side, technique }) => {
      if (scene.techniques[ownerOf(scene, technique)]?.isGridIn) {
        return Array.from({ length: count }, (_, i) => strip(side * (i + 0.5) * pitch)).flat();
      }
      const x = side * halfWidth;
      return polyline(
        [
          [0, -grid.top, 0],
          [x, -grid.top, 0],
          [x, -grid.bottom, 0],
          [0, -grid.bottom, 0],
        ],
        absent,
      );
    }),
  });
}
