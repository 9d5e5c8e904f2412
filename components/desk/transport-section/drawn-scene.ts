import type { StackScene } from '../../../scenes/stack-scene-data.js';
import { type DeskModel, sizeShown } from '../model/desk-model.js';
import { sceneTracks } from '../stack-view/scene-tracks.js';
import { stackSceneOf } from '../stack-view/stack-scene.js';
import { trimmedTracks } from './trimmed-tracks.js';

/** Paths are drawn to this many half fields beside the axis, and so far above the skin on leaving. */
const beside = 1.25;
const above_mm = 60;

const made = new WeakMap<DeskModel, StackScene | null>();

/**
 * The stack as the desk draws it, with photon paths where the model holds some of a technique beside
 * the beam at the size looked at. The same object for the same model.
 */
export function drawnSceneOf(model: DeskModel): StackScene | null {
  const known = made.get(model);
  if (known !== undefined) return known;
  const scene = withTracks(model, stackSceneOf(model));
  made.set(model, scene);
  return scene;
}

function withTracks(model: DeskModel, scene: StackScene | null): StackScene | null {
  const { tracks } = model;
  if (!scene || !tracks || tracks.size !== sizeShown(model).name) return scene;
  const half = scene.techniques.findIndex(({ name }) => name === tracks.technique);
  if (half < 0) return scene;
  const shown = trimmedTracks(tracks.tracks, {
    beside_cm: (beside * Math.max(...scene.field_mm)) / 20,
    above_cm: Math.min(above_mm, scene.sourceToSkin_mm) / 10,
  });
  return { ...scene, tracks: sceneTracks(shown, half === 0 ? 0 : 1) };
}
