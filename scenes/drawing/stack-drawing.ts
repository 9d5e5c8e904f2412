import type { StackLayout } from '../stack-layout.js';
import type { StackScene } from '../stack-scene-data.js';
import { beamDrawing } from './beam.js';
import { bodyDrawing } from './body.js';
import { breakDrawing } from './break-mark.js';
import { detailDrawing } from './detail.js';
import { type Drawing, joined } from './drawing.js';
import { detectorDrawing, filterDrawing, focalSpot } from './fixtures.js';
import { gridDrawing } from './grid.js';

/** What the beam is inked by: the chosen quantity, else the primary photons. */
export const shownShading = (scene: StackScene) => scene.shading ?? scene.primary;

/** The whole stack, in the order a photon meets it. */
export const stackDrawing = (scene: StackScene, layout: StackLayout): Drawing =>
  joined([
    focalSpot(scene, layout),
    filterDrawing(scene, layout),
    breakDrawing(layout),
    bodyDrawing(scene, layout),
    detailDrawing(scene.detail, layout),
    gridDrawing(scene, layout),
    detectorDrawing(scene, layout),
    beamDrawing(scene, layout, shownShading(scene)),
  ]);
