import type { Point } from '../geometry.js';
import { techniqueInkName } from '../inks.js';
import type { StackLayout } from '../stack-layout.js';
import { type TrackKind, type Tracks, trackKinds } from '../stack-scene-data.js';
import type { Pen, Stroke } from './drawing.js';

/** Pieces of a path differ in weight and dash as well as by what they mean. */
export const trackPens: Record<TrackKind, Omit<Pen, 'ink'>> = {
  primary: { width_px: 0.7, opacity: 0.4, over: true },
  compton: { width_px: 1, opacity: 0.6, over: true },
  rayleigh: { width_px: 1.1, opacity: 0.7, dash: [1.5, 2.5], over: true },
  fluorescence: { width_px: 1, opacity: 0.7, dash: [5, 3], over: true },
  absorbed: { width_px: 3.6, opacity: 1, over: true },
};

/** Heights, in true distance, at which the scale along the beam bends between two others. */
const bendsBetween = (layout: StackLayout, a_mm: number, b_mm: number): number[] =>
  layout.along.knots
    .map((knot) => knot.distance_mm)
    .filter((distance) => (distance - a_mm) * (distance - b_mm) < 0)
    .sort((p, q) => (p - q) * Math.sign(b_mm - a_mm));

/** Photon paths as strokes; a piece that crosses into shortened air bends where the scale does. */
export function trackStrokes(
  tracks: Tracks,
  layout: StackLayout,
  sourceToSkin_mm: number,
): Stroke[] {
  const ink = techniqueInkName(tracks.technique);
  const s = tracks.segments_mm;
  return Array.from(tracks.kinds).flatMap((kindNumber, k): Stroke[] => {
    const kind = trackKinds[kindNumber];
    if (!kind) return [];
    const pen: Pen = { ink, ...trackPens[kind] };
    const [x0, y0, d0, x1, y1, d1] = s.subarray(6 * k, 6 * k + 6);
    const [from, to] = [d0 + sourceToSkin_mm, d1 + sourceToSkin_mm];
    const at = (distance: number): Point => {
      const share = to === from ? 1 : (distance - from) / (to - from);
      return [x0 + (x1 - x0) * share, -layout.along.drawnAt(distance), y0 + (y1 - y0) * share];
    };
    const end: Point = [x1, -layout.along.drawnAt(to), y1];
    if (kind === 'absorbed') return [{ from: end, to: end, pen }];
    const start: Point = [x0, -layout.along.drawnAt(from), y0];
    const points = [start, ...bendsBetween(layout, from, to).map(at), end];
    return points.slice(1).map((next, i) => ({ from: points[i], to: next, pen }));
  });
}
