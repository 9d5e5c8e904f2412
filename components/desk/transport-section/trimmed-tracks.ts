import { type Track, trackPoints } from '../../../physics/transport/index.js';

/** Where paths are cut off for drawing, cm: beside the axis, and above the skin for those that leave. */
export interface TrackBounds {
  readonly beside_cm: number;
  readonly above_cm: number;
}

const left = trackPoints.indexOf('left');

/**
 * Paths cut where they leave the drawing: layers go on sideways without end, and a photon turned
 * back flies on to the height of the source. A path that has left does not come back.
 */
export const trimmedTracks = (tracks: readonly Track[], bounds: TrackBounds): Track[] =>
  tracks.map((track) => trimmed(track, bounds));

function trimmed(track: Track, { beside_cm, above_cm }: TrackBounds): Track {
  const { points, kinds } = track;
  for (let i = 1; i < kinds.length; i++) {
    const from = points.subarray(4 * (i - 1), 4 * i);
    const to = points.subarray(4 * i, 4 * i + 4);
    const share = Math.min(
      inside(from[0], to[0], -beside_cm, beside_cm),
      inside(from[1], to[1], -beside_cm, beside_cm),
      kinds[i] === left ? inside(from[2], to[2], -above_cm, Number.POSITIVE_INFINITY) : 1,
    );
    if (share >= 1) continue;
    const end = from.map((value, axis) => value + share * (to[axis] - value));
    return {
      ...track,
      points: Float32Array.from([...points.subarray(0, 4 * i), ...end]),
      kinds: Uint8Array.from([...kinds.subarray(0, i), left]),
    };
  }
  return track;
}

/** Share of the way from `a` to `b` that lies between `low` and `high`, `a` lying inside. */
const inside = (a: number, b: number, low: number, high: number): number => {
  if (b > high) return Math.max(0, (high - a) / (b - a));
  return b < low ? Math.max(0, (low - a) / (b - a)) : 1;
};
