import { describe, expect, it } from 'vitest';
import { massEnergyAbsorption } from '../../../materials/index.js';
import { tungstenSpectrum } from '../../../physics/beam/index.js';
import { runTransport } from '../../../physics/jobs/index.js';
import {
  buildTransportInput,
  idealDetector,
  transportResult,
} from '../../../physics/transport/index.js';
import { monoenergetic, named, slabStack } from './slab-runs.js';

const labels = { technique: 'Current', size: 'median', estimate: null, photonsPerSecond: null };
const water = named('water');
const air = named('air');

describe('the transport answer', () => {
  const stack = slabStack(
    [
      [water, 6],
      [named('muscle'), 4],
    ],
    { beam: 'point', exitToDetector_mm: 100 },
  );
  const run = { photons: 20_000, seed: 12 };

  it('holds what was promised of it, all finite, and clones', () => {
    const input = buildTransportInput(stack, monoenergetic(60), idealDetector, null, run);
    const answer = transportResult(input, runTransport(input), { ...labels, hasGrid: false });
    expect(answer).toMatchObject({
      technique: 'Current',
      size: 'median',
      photons: 20_000,
      seed: 12,
    });
    expect(answer.isComplete).toBe(true);
    expect(answer.sprBehindGrid).toBeNull();
    expect(answer.scatterFraction).toBeCloseTo(answer.spr.value / (1 + answer.spr.value), 12);
    expect(answer.layers.map(({ layer }) => layer)).toEqual(['layer 1', 'layer 2']);
    expect(JSON.stringify(answer)).not.toContain('NaN');
    expect(structuredClone(answer)).toEqual(answer);
    const { firstCompton, firstRayleigh, multiple } = answer.components;
    const sum = firstCompton.value + firstRayleigh.value + multiple.value;
    expect(sum).toBeCloseTo(answer.spr.value, 10);
  });

  it('gives dose per incident air kerma: a thin layer at the skin gets (μen/ρ) over air’s, and backscatter', () => {
    const thin = slabStack(
      [
        [water, 0.05],
        [water, 9.95],
      ],
      { field_mm: [300, 300] },
    );
    const many = { photons: 400_000, seed: 13 };
    const input = buildTransportInput(thin, monoenergetic(60), idealDetector, null, many);
    const [skin] = transportResult(input, runTransport(input), {
      ...labels,
      hasGrid: false,
    }).layers;
    const ratio = (massEnergyAbsorption(water, 60) ?? 0) / (massEnergyAbsorption(air, 60) ?? 1);
    // The tally is of an infinite field, whose backscatter factor in 10 cm of water is about 1.7.
    const expected = ratio * 1.7;
    const error = skin.absorbedDose_standardError ?? 0;
    expect(Math.abs(skin.absorbedDose_mGy_per_mGyIncident - expected)).toBeLessThan(
      4 * error + 0.05 * expected,
    );
  });

  it('takes a tube spectrum, and passes scatter through a grid by its angle', () => {
    const beam = tungstenSpectrum({ potential_kV: 80, anodeAngle_deg: 12 });
    const answer = (grid: (energy_keV: number, cosBeta: number) => number) => {
      const input = buildTransportInput(stack, beam, idealDetector, grid, run);
      return transportResult(input, runTransport(input), { ...labels, hasGrid: true });
    };
    const grey = answer(() => 0.4);
    expect((grey.sprBehindGrid?.value ?? 0) / grey.spr.value).toBeCloseTo(1, 10);
    const narrow = answer((_, cosBeta) => cosBeta ** 8);
    expect(narrow.spr.value).toBe(grey.spr.value);
    expect(narrow.sprBehindGrid?.value).toBeLessThan(0.7 * narrow.spr.value);
  });

  it('refuses photons it has no tables for', () => {
    const build = (energy_keV: number) => () =>
      buildTransportInput(stack, monoenergetic(energy_keV), idealDetector, null, run);
    expect(build(662)).toThrow('spectrum: 662 to 662 keV: transport covers 1 to 150 keV');
    expect(build(0.5)).toThrow('transport covers 1 to 150 keV');
  });

  it('sees a support behind the patient in the scatter and not in the layers', () => {
    const supportExit = [{ name: 'aluminium', material: named('aluminium'), thickness_mm: 10 }];
    const input = buildTransportInput(
      { ...stack, supportExit },
      monoenergetic(60),
      idealDetector,
      null,
      run,
    );
    const bare = buildTransportInput(stack, monoenergetic(60), idealDetector, null, run);
    expect(input.layers).toHaveLength(2);
    expect(input.primary.atDetector[0]).toBeLessThan(0.6 * bare.primary.atDetector[0]);
    expect(input.primary.kermaAtSkin).toBe(bare.primary.kermaAtSkin);
  });
});
