import { patientThickness_mm, type StackScene } from './stack-scene-data.js';

/** How far a mm of depth recedes to the right and up in the oblique view. */
export const recede = { right: 0.38, up: 0.17 } as const;

/** How much wider than the field an unbounded body is drawn, and a bounded one at most. */
const beyondField = 1.18;
const widestBody = 1.6;
/** Space at the sides of the page, px; share of its height for the patient and the support. */
const side_px = 16;
const solidShare = 0.54;

/** Widths of the drawing, and the scale that brings it onto a page. */
export interface PageScale {
  readonly px_per_mm: number;
  /** Half width of the cut face; depth of the half body behind it. */
  readonly body: { readonly halfWidth: number; readonly depth: number };
  /** Half width of whatever is widest, and px of the whole drawing with what recedes. */
  readonly widest: number;
  readonly width_px: number;
  /** Half width and half height of the field at a distance from the focal spot. */
  readonly halfFieldAt: (distance_mm: number) => readonly [number, number];
}

const total_mm = (slabs: readonly { readonly thickness_mm: number }[]): number =>
  slabs.reduce((sum, slab) => sum + slab.thickness_mm, 0);

/** One scale for widths and for the patient's thickness: as large as the page allows. */
export function pageScale(scene: StackScene, width_px: number, height_px: number): PageScale {
  const thickness = patientThickness_mm(scene);
  const toExit = scene.sourceToSkin_mm + thickness;
  const toDetector = Math.max(scene.sourceToDetector_mm, toExit);
  const half = [scene.field_mm[0] / 2, scene.field_mm[1] / 2] as const;
  const halfFieldAt = (distance_mm: number): [number, number] => {
    const spread = scene.beam === 'parallel' ? 1 : distance_mm / toDetector;
    return [half[0] * spread, half[1] * spread];
  };
  const atExit = halfFieldAt(toExit);
  const bodyHalf = (i: 0 | 1) => {
    const own = scene.lateral_mm?.[i];
    return own === undefined ? atExit[i] * beyondField : Math.min(own / 2, atExit[i] * widestBody);
  };
  const body = { halfWidth: bodyHalf(0), depth: bodyHalf(1) };
  const widest = Math.max(body.halfWidth, half[0]);
  const across = 2 * widest + recede.right * Math.max(body.depth, half[1]);
  const solid = thickness + total_mm(scene.supportEntrance) + total_mm(scene.supportExit);
  const px_per_mm = Math.min(
    Math.max(40, width_px - 2 * side_px) / across,
    (solidShare * height_px) / solid,
  );
  return { px_per_mm, body, widest, width_px: across * px_per_mm, halfFieldAt };
}
