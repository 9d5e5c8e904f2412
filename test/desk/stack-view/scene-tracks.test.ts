import { describe, expect, test } from 'vitest';
import { sceneTracks } from '../../../components/desk/stack-view/scene-tracks.js';
import { type Track, trackPoints } from '../../../physics/transport/tracks.js';
import { trackKinds } from '../../../scenes/index.js';

const track = (
  steps: readonly (readonly [(typeof trackPoints)[number], number, number, number])[],
): Track => ({
  points: Float32Array.from(steps.flatMap(([, x, y, z]) => [x, y, z, 50])),
  kinds: Uint8Array.from(steps, ([what]) => trackPoints.indexOf(what)),
  isDetected: false,
});

describe('recorded photons in the layer view', () => {
  test('each piece is drawn by what happened where it begins, in mm', () => {
    const { segments_mm, kinds } = sceneTracks(
      [
        track([
          ['start', 0, 0, -85],
          ['compton', 1, 0, 4],
          ['rayleigh', 2, 1, 6],
          ['absorbed', 2, 3, 7],
        ]),
      ],
      0,
    );
    expect([...kinds].map((kind) => trackKinds[kind])).toEqual([
      'primary',
      'compton',
      'rayleigh',
      'absorbed',
    ]);
    expect([...segments_mm.subarray(0, 6)]).toEqual([0, 0, -850, 10, 0, 40]);
    expect([...segments_mm.subarray(18, 24)]).toEqual([20, 30, 70, 20, 30, 70]);
  });

  test('a photon that leaves ends without a point, one of fluorescence has its own line', () => {
    const { kinds } = sceneTracks(
      [
        track([
          ['start', 0, 0, -85],
          ['left', 3, 0, 30],
        ]),
        track([
          ['start', 0, 0, -85],
          ['fluorescence', 0, 0, 2],
          ['left', 0, 3, 30],
        ]),
      ],
      1,
    );
    expect([...kinds].map((kind) => trackKinds[kind])).toEqual([
      'primary',
      'primary',
      'fluorescence',
    ]);
  });

  test('no photons are no pieces', () => {
    expect(sceneTracks([], 0).kinds).toHaveLength(0);
  });
});
