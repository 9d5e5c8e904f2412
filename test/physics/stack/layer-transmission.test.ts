/** Laws of the primary beam through a stack. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { massAttenuation } from '../../../materials/index.js';
import { attenuate, monoenergetic, tungstenSpectrum } from '../../../physics/beam/index.js';
import { layerTransmission, slabTransmissionOn } from '../../../physics/stack/index.js';
import { material, stackOf } from '../scatter/stacks.js';

const names = ['adipose', 'muscle', 'soft tissue', 'cortical bone', 'blood', 'lung', 'water'];
const slabs = fc.array(
  fc.tuple(fc.constantFrom(...names.map(material)), fc.double({ min: 0.1, max: 6, noNaN: true })),
  { minLength: 1, maxLength: 7 },
);
const beam = attenuate(
  tungstenSpectrum({ potential_kV: 80, anodeAngle_deg: 12, ripple_percent: 0, outputFactor: 1 }),
  [{ material: material('aluminium'), thickness_mm: 2.5 }],
);
const { energies_keV } = beam;

/** Relative, but for what lies below the smallest number of full precision. */
const expectSameAtEachEnergy = (a: Float64Array, b: Float64Array): void => {
  a.forEach((value, i) => {
    expect(Math.abs(value - b[i])).toBeLessThanOrEqual(1e-12 * b[i] + 1e-300);
  });
};

describe('primary transmission of a stack', () => {
  it('through no layers is one', () => {
    expect(slabTransmissionOn([], energies_keV).every((value) => value === 1)).toBe(true);
  });

  it('does not depend on the order of the layers, to 1e-12 at each energy', () => {
    fc.assert(
      fc.property(slabs, (layers) => {
        const forward = slabTransmissionOn(stackOf(layers).layers, energies_keV);
        const backward = slabTransmissionOn(stackOf([...layers].reverse()).layers, energies_keV);
        expectSameAtEachEnergy(forward, backward);
      }),
    );
  });

  it('does not change when a layer is split, to 1e-12 at each energy', () => {
    fc.assert(
      fc.property(slabs, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (layers, share) => {
        const [[matter, thickness], ...rest] = layers;
        const split = [
          [matter, thickness * share],
          [matter, thickness * (1 - share)],
          ...rest,
        ] as const;
        expectSameAtEachEnergy(
          slabTransmissionOn(stackOf(layers).layers, energies_keV),
          slabTransmissionOn(stackOf(split).layers, energies_keV),
        );
      }),
    );
  });

  it('is kept for one list and grid', () => {
    const { layers } = stackOf([[material('water'), 10]]);
    expect(slabTransmissionOn(layers, energies_keV)).toBe(slabTransmissionOn(layers, energies_keV));
  });
});

describe('transmission layer by layer', () => {
  it('of one energy is exp(−μt) by every meter', () => {
    const { primary, layers } = layerTransmission(
      stackOf([[material('water'), 20]]),
      monoenergetic(60),
    );
    const expected = Math.exp(
      -massAttenuation(material('water'), 60) * material('water').density_g_per_cm3 * 20,
    );
    expect(primary / expected).toBeCloseTo(1, 12);
    expect(layers[0].cumulativeByNumber / expected).toBeCloseTo(1, 12);
    expect(layers[0].cumulativeByEnergyFluence / expected).toBeCloseTo(1, 12);
    expect(layers[0].meanEnergy_keV).toBeCloseTo(60, 9);
    expect(layers[0].effectiveEnergy_keV).toBeCloseTo(60, 3);
  });

  it('multiplies: each layer’s own shares make up the whole', () => {
    fc.assert(
      fc.property(slabs, (layers) => {
        const result = layerTransmission(stackOf(layers), beam);
        const product = result.layers.reduce((value, { own }) => value * own, 1);
        expect(product / result.primary).toBeCloseTo(1, 10);
        const last = result.layers[result.layers.length - 1];
        expect(last.cumulative).toBe(result.primary);
        expect(last.meanEnergy_keV).toBeCloseTo(result.exitMeanEnergy_keV, 9);
      }),
      { numRuns: 30 },
    );
  });

  it('in soft tissue hardens the beam: energy fluence passes better than number', () => {
    const { layers } = layerTransmission(
      stackOf([
        [material('adipose'), 3],
        [material('soft tissue'), 15],
      ]),
      beam,
    );
    for (const each of layers) {
      expect(each.cumulativeByEnergyFluence).toBeGreaterThan(each.cumulativeByNumber);
    }
    expect(layers[1].meanEnergy_keV).toBeGreaterThan(layers[0].meanEnergy_keV);
    expect(layers[1].effectiveEnergy_keV ?? 0).toBeGreaterThan(layers[0].effectiveEnergy_keV ?? 0);
  });

  it('stays finite behind matter that passes nothing', () => {
    const { primary, layers, exitMeanEnergy_keV } = layerTransmission(
      stackOf([
        [material('lead'), 60],
        [material('water'), 1],
      ]),
      monoenergetic(30),
    );
    expect([primary, exitMeanEnergy_keV, layers[1].own]).toEqual([0, 0, 0]);
    expect(layers[1].effectiveEnergy_keV).toBeNull();
  });
});
