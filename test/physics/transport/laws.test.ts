import { describe, expect, it } from 'vitest';
import {
  combineBatches,
  planBatches,
  runBatch,
  transportBatches,
} from '../../../physics/jobs/index.js';
import {
  backscatterFactor,
  energyBalance,
  estimated,
  impartedEnergy_keV,
  layerEnergy_keV,
  scatterToPrimary,
} from '../../../physics/transport/index.js';
import { deviation, flyThrough, named, slabStack } from './slab-runs.js';
import { sevenLayers } from './unit-numbers.js';

const water = named('water');

describe('a run', () => {
  const run = { photons: 40_000, seed: 5 };

  it('gives the same bits again from the same seed, and others from another', () => {
    const first = flyThrough(slabStack([[water, 10]]), 60, run).scores;
    expect(flyThrough(slabStack([[water, 10]]), 60, run).scores).toEqual(first);
    const other = flyThrough(slabStack([[water, 10]]), 60, { ...run, seed: 6 }).scores;
    expect(other.batches[0]).not.toEqual(first.batches[0]);
  });

  it('does not depend on the order in which its batches come back', () => {
    const { input, scores } = flyThrough(slabStack([[water, 10]]), 60, run);
    const backwards = transportBatches(input)
      .reverse()
      .map((batch) => runBatch(input, batch));
    expect(combineBatches(input, backwards)).toEqual(scores);
  });

  it('is labelled incomplete until its last batch is in', () => {
    const { input } = flyThrough(slabStack([[water, 10]]), 60, run);
    const [first, ...others] = transportBatches(input).map((batch) => runBatch(input, batch));
    expect(combineBatches(input, [first]).isComplete).toBe(false);
    expect(combineBatches(input, [first, ...others]).isComplete).toBe(true);
  });

  it('survives structured cloning', () => {
    const { input, scores } = flyThrough(slabStack([[water, 10]]), 60, { photons: 4000, seed: 5 });
    const clone = structuredClone(input);
    const again = transportBatches(clone).map((batch) => runBatch(clone, batch));
    expect(combineBatches(clone, again)).toEqual(scores);
  });

  it('splits into batches that hold every photon once', () => {
    for (const photons of [1, 39, 40, 41, 99_999, 3_000_001, 1e9]) {
      const batches = planBatches(photons);
      expect(batches.reduce((sum, batch) => sum + batch.photons, 0)).toBe(photons);
      expect(batches.map(({ index }) => index)).toEqual([...batches.keys()]);
      expect(Math.min(...batches.map((batch) => batch.photons))).toBeGreaterThan(0);
    }
    expect(() => planBatches(0.5)).toThrow('photons: 0.5: must be a whole number');
  });
});

describe('energy', () => {
  it('in equals absorbed plus escaped, by slabs and by a finite body alike', () => {
    const stack = sevenLayers();
    const point = { ...stack, beam: 'point' as const, exitToDetector_mm: 50, sourceToSkin_mm: 740 };
    const run = { photons: 20_000, seed: 9 };
    const finite = { lateral_mm: [200, 300] as const, air: true, fluorescence: true };
    for (const { input, scores } of [
      flyThrough(stack, 60, run, { fluorescence: true }),
      flyThrough(point, 60, run, finite),
    ]) {
      const balance = energyBalance(input, scores);
      expect(balance.sum).toBeCloseTo(1, 10);
      const { sum, ...parts } = balance;
      expect(Object.values(parts).reduce((a, b) => a + b, 0)).toBeCloseTo(sum, 10);
    }
  });

  it('passes unscattered as exp(−τ) says', () => {
    const { input, scores } = flyThrough(slabStack([[water, 10]]), 60, {
      photons: 200_000,
      seed: 1,
    });
    const { transmittedPrimary } = energyBalance(input, scores);
    const expected = input.primary.atDetector[0] / 60;
    const error = Math.sqrt((expected * (1 - expected)) / 200_000);
    expect(Math.abs(transmittedPrimary - expected)).toBeLessThan(4 * error);
  });

  it('absorbed in a layer does not change when the layer is split', () => {
    const run = { photons: 150_000, seed: 3 };
    const whole = flyThrough(slabStack([[water, 12]]), 60, run);
    const halves = flyThrough(
      slabStack([
        [water, 5],
        [water, 7],
      ]),
      60,
      { ...run, seed: 4 },
    );
    const expected = impartedEnergy_keV(whole.input, whole.scores);
    const found = impartedEnergy_keV(halves.input, halves.scores);
    expect(Math.abs(deviation(found, expected.value, expected.standardError ?? 0))).toBeLessThan(4);
    const whole30 = scatterToPrimary(whole.input, whole.scores);
    const halves30 = scatterToPrimary(halves.input, halves.scores);
    const off = deviation(halves30, whole30.value, whole30.standardError ?? 0);
    expect(Math.abs(off)).toBeLessThan(4);
  });

  it('leaves an iodine layer as K photons and goes to its neighbours', () => {
    const run = { photons: 100_000, seed: 8 };
    const stack = sevenLayers();
    const silent = flyThrough(stack, 60, run);
    const shining = flyThrough(stack, 60, run, { fluorescence: true });
    const layer = (which: typeof silent, i: number) =>
      layerEnergy_keV(which.input, which.scores, i).value;
    expect(layer(shining, 3)).toBeLessThan(0.85 * layer(silent, 3));
    expect(layer(shining, 4)).toBeGreaterThan(1.03 * layer(silent, 4));
  });
});

describe('scatter at the field centre', () => {
  const options = { gaps_mm: [0, 50, 100], fieldWidths_mm: [0.001, 100, 200, 300] };
  const { input, scores } = flyThrough(
    slabStack([[water, 10]]),
    60,
    { photons: 100_000, seed: 2 },
    options,
  );
  const spr = (gap: number, field: number) => scatterToPrimary(input, scores, { gap, field }).value;

  it('vanishes with the field', () => {
    expect(spr(0, 0)).toBeLessThan(1e-3);
  });

  it('grows with the field and falls with the gap, except in an infinite field', () => {
    for (const gap of [0, 1, 2]) {
      for (const field of [1, 2, 3, 4])
        expect(spr(gap, field)).toBeGreaterThan(spr(gap, field - 1));
    }
    for (const field of [1, 2, 3]) {
      expect(spr(1, field)).toBeLessThan(spr(0, field));
      expect(spr(2, field)).toBeLessThan(spr(1, field));
    }
    expect(spr(2, 4)).toBeCloseTo(spr(0, 4), 10);
  });

  it('is the sum of first Compton, first Rayleigh and multiple', () => {
    const parts = (['firstCompton', 'firstRayleigh', 'multiple'] as const).map(
      (component) => scatterToPrimary(input, scores, { field: 3, component }).value,
    );
    expect(parts.reduce((a, b) => a + b, 0)).toBeCloseTo(spr(0, 3), 10);
  });

  it('weighs more by count than by energy, and more by fluence than by count', () => {
    const counts = scatterToPrimary(input, scores, { field: 3, quantity: 'counts' }).value;
    const kerma = scatterToPrimary(input, scores, { field: 3, quantity: 'airKerma' }).value;
    expect(counts).toBeGreaterThan(spr(0, 3));
    expect(kerma).toBeGreaterThan(counts);
  });

  it('comes with backscatter that grows with the field', () => {
    const factor = (field: number) => backscatterFactor(input, scores, field).value;
    expect(factor(0)).toBeCloseTo(1, 2);
    expect(factor(2)).toBeGreaterThan(factor(1));
    expect(factor(4)).toBeLessThan(2);
  });
});

it('standard errors tell the spread of independent runs', () => {
  const values = Array.from({ length: 24 }, (_, seed) => {
    const { input, scores } = flyThrough(slabStack([[water, 5]]), 60, { photons: 4000, seed });
    return impartedEnergy_keV(input, scores);
  });
  const mean = values.reduce((sum, { value }) => sum + value, 0) / values.length;
  const variance =
    values.reduce((sum, { value }) => sum + (value - mean) ** 2, 0) / (values.length - 1);
  const claimed =
    values.reduce((sum, { standardError }) => sum + (standardError ?? 0) ** 2, 0) / values.length;
  // Ratio of variances: F with 23 and many degrees of freedom, 0.2 % tails.
  expect(variance / claimed).toBeGreaterThan(0.3);
  expect(variance / claimed).toBeLessThan(2.3);
});

it('one photon alone has no standard error', () => {
  const { scores } = flyThrough(slabStack([[water, 5]]), 60, { photons: 1, seed: 1 });
  expect(estimated(scores, () => 1).standardError).toBeNull();
});
