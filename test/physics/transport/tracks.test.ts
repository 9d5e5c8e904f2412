import { describe, expect, it } from 'vitest';
import { runBatch } from '../../../physics/jobs/index.js';
import { layoutOf } from '../../../physics/transport/batch.js';
import { recordTracks, trackPoints } from '../../../physics/transport/index.js';
import { flyThrough, named, slabStack } from './slab-runs.js';

describe('tracks', () => {
  const stack = slabStack([[named('water'), 15]], { beam: 'point', exitToDetector_mm: 80 });
  const { input } = flyThrough(stack, 60, { photons: 12_000, seed: 3 }, { fluorescence: true });
  const count = 300;
  const tracks = recordTracks(input, count);
  const kindAt = (track: (typeof tracks)[number], i: number) => trackPoints[track.kinds[i]];

  it('are as many as asked for, and the same again', () => {
    expect(tracks).toHaveLength(count);
    expect(recordTracks(input, count)).toEqual(tracks);
  });

  it('are the photons of the run: what they leave is what its first batch absorbs', () => {
    const absorbed = tracks.reduce((sum, { points, isDetected, kinds }) => {
      const last = kinds.length - 1;
      const hasLeft = trackPoints[kinds[last]] === 'left';
      expect(isDetected && !hasLeft).toBe(false);
      return sum + 60 - (hasLeft ? points[4 * last + 3] : 0);
    }, 0);
    expect(count).toBe(input.photons / 40);
    const { scores } = runBatch(input, { index: 0, photons: count });
    const layout = layoutOf(input);
    const tally = scores.subarray(layout.absorbed, layout.escaped).reduce((a, b) => a + b, 0);
    expect(absorbed / tally).toBeCloseTo(1, 5);
  });

  it('start at the source with the beam’s energy and end absorbed or outside', () => {
    for (const track of tracks) {
      expect(kindAt(track, 0)).toBe('start');
      expect([...track.points.subarray(0, 2)].every((value) => Math.abs(value) < 1e-4)).toBe(true);
      expect(track.points[2]).toBeCloseTo(-stack.sourceToSkin_mm / 10, 4);
      expect(track.points[3]).toBe(60);
      expect(['absorbed', 'left', 'compton']).toContain(kindAt(track, track.kinds.length - 1));
      if (track.isDetected) {
        const z = track.points[track.points.length - 2];
        expect(z).toBeCloseTo(input.geometry.detector_cm, 4);
      }
    }
  });

  it('lose energy in Compton collisions and none in Rayleigh', () => {
    const seen = new Set<string>();
    for (const track of tracks) {
      for (let i = 1; i < track.kinds.length; i++) {
        const lost = track.points[4 * i - 1] - track.points[4 * i + 3];
        const kind = kindAt(track, i);
        seen.add(kind);
        if (kind === 'rayleigh' || kind === 'left') expect(lost).toBe(0);
        if (kind === 'compton') expect(lost).toBeGreaterThan(0);
      }
    }
    expect([...seen].sort()).toEqual(['absorbed', 'compton', 'left', 'rayleigh']);
  });
});
