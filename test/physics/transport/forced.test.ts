import { describe, expect, it } from 'vitest';
import {
  energyBalance,
  impartedEnergy_keV,
  scatterToPrimary,
} from '../../../physics/transport/index.js';
import { deviation, flyThrough, named, type Run, slabStack } from './slab-runs.js';

const water = named('water');
const spr = ({ input, scores }: Run) => scatterToPrimary(input, scores);
/** A water insert in water: forces the bounded geometry and forced detection, changes nothing. */
const waterInsert = {
  shape: 'cylinder',
  layerIndex: 0,
  material: water,
  centreDepth_mm: 40,
  size_mm: [30, 100],
} as const;

describe('forced detection in a parallel field', () => {
  for (const gap_mm of [0, 100]) {
    it(`agrees with the pencil at a gap of ${gap_mm} mm`, () => {
      const stack = slabStack([[water, 10]], { exitToDetector_mm: gap_mm });
      const pencil = spr(flyThrough(stack, 60, { photons: 200_000, seed: 1 }));
      const run = { photons: 100_000, seed: 2 };
      const forced = spr(flyThrough(stack, 60, run, { insert: waterInsert }));
      const off = deviation(forced, pencil.value, pencil.standardError ?? 0);
      expect(Math.abs(off), `${forced.value}, ${pencil.value}`).toBeLessThan(4);
    });
  }

  it('passes an insert of the layer’s own matter, and far sides, as if they were not there', () => {
    const stack = slabStack([[water, 10]], { exitToDetector_mm: 100 });
    const run = { photons: 20_000, seed: 4 };
    const box = { ...waterInsert, shape: 'box', size_mm: [50, 40, 20] } as const;
    const cylinder = flyThrough(stack, 60, run, { insert: waterInsert });
    for (const options of [{ insert: box }, { lateral_mm: [4000, 4000] as const }]) {
      const other = flyThrough(stack, 60, run, options);
      const imparted = impartedEnergy_keV(cylinder.input, cylinder.scores).value;
      expect(impartedEnergy_keV(other.input, other.scores).value / imparted).toBeCloseTo(1, 4);
      expect(spr(other).value / spr(cylinder).value).toBeCloseTo(1, 3);
    }
  });

  it('sends the primary through the insert: e^−τ along its chord', () => {
    const stack = slabStack([[water, 4]], { field_mm: [0.2, 0.2], exitToDetector_mm: 100 });
    const insert = {
      shape: 'cylinder',
      layerIndex: 0,
      material: named('aluminium'),
      centreDepth_mm: 20,
      size_mm: [20, 50],
    } as const;
    const { input, scores } = flyThrough(stack, 60, { photons: 100_000, seed: 3 }, { insert });
    const expected = (input.primary.atDetector[0] * 0.02 * 0.02) / 60;
    const { transmittedPrimary } = energyBalance(input, scores);
    const error = Math.sqrt((expected * (1 - expected)) / 100_000);
    expect(expected).toBeLessThan(0.25);
    expect(Math.abs(transmittedPrimary - expected)).toBeLessThan(4 * error);
  });

  it('refuses an insert that sticks out of its layer', () => {
    const stack = slabStack([[water, 5]]);
    const insert = { ...waterInsert, size_mm: [90, 100] };
    expect(() => flyThrough(stack, 60, { photons: 10, seed: 1 }, { insert })).toThrow(
      'insert: must lie inside its layer',
    );
  });
});

describe('a point source', () => {
  it('far away gives the scatter of a parallel beam; at 1 m a 30 cm field gives 5 to 15 % more', () => {
    const at = (sourceToDetector_mm: number) =>
      slabStack([[water, 10]], { beam: 'point', sourceToDetector_mm, exitToDetector_mm: 100 });
    const parallel = slabStack([[water, 10]], { exitToDetector_mm: 100 });
    const reference = spr(flyThrough(parallel, 60, { photons: 200_000, seed: 1 }));
    const far = spr(flyThrough(at(1e5), 60, { photons: 60_000, seed: 5 }));
    const off = deviation(far, reference.value, reference.standardError ?? 0);
    expect(Math.abs(off)).toBeLessThan(4);
    const near = spr(flyThrough(at(1000), 60, { photons: 60_000, seed: 6 }));
    expect(near.value / reference.value).toBeGreaterThan(1.05);
    expect(near.value / reference.value).toBeLessThan(1.15);
  });

  it('loses what passes beside a body smaller than its field, through the sides or unscattered', () => {
    const stack = slabStack([[water, 10]], { beam: 'point', exitToDetector_mm: 50 });
    const run = { photons: 20_000, seed: 7 };
    const small = flyThrough(stack, 60, run, { lateral_mm: [100, 100] });
    const wide = flyThrough(stack, 60, run, { lateral_mm: [1000, 1000] });
    const narrow = energyBalance(small.input, small.scores);
    const broad = energyBalance(wide.input, wide.scores);
    expect(narrow.absorbed).toBeLessThan(0.3 * broad.absorbed);
    expect(narrow.transmittedPrimary).toBeGreaterThan(0.8);
    expect(narrow.sum).toBeCloseTo(1, 10);
  });
});
