import { describe, expect, it } from 'vitest';
import { trimmedTracks } from '../../../components/desk/transport-section/trimmed-tracks.js';
import { type Track, trackPoints } from '../../../physics/transport/index.js';

type Step = readonly [(typeof trackPoints)[number], number, number, number];
const track = (...steps: readonly Step[]): Track => ({
  points: Float32Array.from(steps.flatMap(([, x, y, z]) => [x, y, z, 50])),
  kinds: Uint8Array.from(steps, ([what]) => trackPoints.indexOf(what)),
  isDetected: false,
});
const bounds = { beside_cm: 10, above_cm: 5 };
const trimmed = (...steps: readonly Step[]): Step[] => {
  const [{ points, kinds }] = trimmedTracks([track(...steps)], bounds);
  return Array.from(kinds, (kind, i) => [
    trackPoints[kind],
    points[4 * i],
    points[4 * i + 1],
    points[4 * i + 2],
  ]);
};

describe('paths cut at the edge of the drawing', () => {
  it('stay as they are inside it', () => {
    const inside: Step[] = [
      ['start', 0, 0, -80],
      ['compton', 1, 0, 4],
      ['absorbed', 9, -9, 6],
    ];
    expect(trimmed(...inside)).toEqual(inside);
  });

  it('end where they pass its side, whatever came after', () => {
    const cut = trimmed(
      ['start', 0, 0, -80],
      ['compton', 0, 0, 4],
      ['rayleigh', 20, 0, 8],
      ['absorbed', 0, 0, 9],
    );
    expect(cut).toEqual([
      ['start', 0, 0, -80],
      ['compton', 0, 0, 4],
      ['left', 10, 0, 6],
    ]);
  });

  it('end a little above the skin where a photon leaves towards the source', () => {
    const cut = trimmed(['start', 0, 0, -80], ['compton', 0, 0, 5], ['left', 0, 8, -75]);
    expect(cut.at(-1)).toEqual(['left', 0, 1, -5]);
  });
});
