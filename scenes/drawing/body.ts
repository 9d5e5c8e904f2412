import type { StackLayout, Stretch } from '../stack-layout.js';
import type { SceneSlab, StackScene } from '../stack-scene-data.js';
import { blockDrawing } from './box.js';
import { type Drawing, joined, withoutRepeats } from './drawing.js';
import { cutPen, edgePen } from './pens.js';

/** The patient's layers and the support, cut open along the axis, each hatched by its family. */
export function bodyDrawing(scene: StackScene, layout: StackLayout): Drawing {
  const { halfWidth, depth } = layout.body;
  const block = (slab: SceneSlab, stretch: Stretch) =>
    blockDrawing(
      { left: -halfWidth, right: halfWidth, ...stretch, depth },
      {
        front: 'paper',
        hatch: slab.family,
        side: 'shade',
        above: 'paper',
        frontPen: cutPen,
        backPen: edgePen,
      },
    );
  const body = joined([
    ...scene.supportEntrance.map((slab, i) => block(slab, layout.supportEntrance[i])),
    ...scene.layers.map((slab, i) => block(slab, layout.layers[i])),
    ...scene.supportExit.map((slab, i) => block(slab, layout.supportExit[i])),
  ]);
  return { ...body, strokes: withoutRepeats(body.strokes) };
}
