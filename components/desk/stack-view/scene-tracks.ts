import { type Track, trackPoints } from '../../../physics/transport/tracks.js';
import { type TrackKind, type Tracks, trackKinds } from '../../../scenes/stack-scene-data.js';

const numbersPerPoint = 4;
const mm_per_cm = 10;

/** How the piece of path behind a point is drawn. */
const kindAfter: Record<(typeof trackPoints)[number], TrackKind | null> = {
  start: 'primary',
  compton: 'compton',
  rayleigh: 'rayleigh',
  fluorescence: 'fluorescence',
  absorbed: null,
  left: null,
};

/** Recorded photons as the layer view draws them: straight pieces, and a point where one is absorbed. */
export function sceneTracks(tracks: readonly Track[], technique: 0 | 1): Tracks {
  const segments: number[] = [];
  const kinds: number[] = [];
  for (const { points, kinds: happened } of tracks) {
    const place = (i: number) =>
      Array.from(
        points.subarray(i * numbersPerPoint, i * numbersPerPoint + 3),
        (cm) => cm * mm_per_cm,
      );
    happened.forEach((what, i) => {
      const name = trackPoints[what];
      const kind = kindAfter[name];
      if (name === 'absorbed') {
        segments.push(...place(i), ...place(i));
        kinds.push(trackKinds.indexOf('absorbed'));
      } else if (kind && i + 1 < happened.length) {
        segments.push(...place(i), ...place(i + 1));
        kinds.push(trackKinds.indexOf(kind));
      }
    });
  }
  return { technique, segments_mm: Float32Array.from(segments), kinds: Uint8Array.from(kinds) };
}
