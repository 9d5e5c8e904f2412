import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { locate, locatorOf } from '../../../physics/numeric/locate.js';
import { energyNodes, isEdge } from '../../../physics/scatter/energy-nodes.js';
import { responsesOn, type ScatterResponses } from '../../../physics/scatter/index.js';

describe('energy nodes', () => {
  const { energies_keV, fine_keV, fineIndex } = energyNodes([33.169, 88.0045, 5, 200]);

  it('run from 10 to 150 keV, ascending, at most 2, 3 and 4 keV apart', () => {
    expect(energies_keV[0]).toBe(10);
    expect(energies_keV.at(-1)).toBe(150);
    for (let i = 1; i < energies_keV.length; i++) {
      const from = energies_keV[i - 1];
      const allowed = from < 40 ? 2 : from < 80 ? 3 : 4;
      expect(energies_keV[i]).toBeGreaterThan(from);
      expect(energies_keV[i] - from).toBeLessThanOrEqual(allowed + 1e-9);
    }
  });
  it('hold each edge inside the range twice, a hair apart', () => {
    const edges = [...energies_keV].filter((_, i) => isEdge(energies_keV, i));
    expect(edges.map((energy) => Math.round(energy * 1000) / 1000)).toEqual([33.169, 88.004]);
    expect([...energies_keV]).toContain(33.169);
  });
  it('all lie on the fine grid', () => {
    expect([...fineIndex].map((i) => fine_keV[i])).toEqual([...energies_keV]);
  });
  it('are the same object for the same edges', () => {
    expect(energyNodes([88.0045, 33.169])).toBe(energyNodes([33.169, 88.0045]));
  });
  it('are found by the locator wherever an energy lies', () => {
    fc.assert(
      fc.property(fc.double({ min: 10, max: 149.999, noNaN: true }), (energy) => {
        const i = locate(locatorOf(fine_keV), energy);
        expect(fine_keV[i]).toBeLessThanOrEqual(energy);
        expect(fine_keV[i + 1]).toBeGreaterThan(energy);
      }),
    );
  });
});

describe('responses on the channels of a spectrum', () => {
  const { energies_keV } = energyNodes([33.169]);
  const step = energies_keV.map((energy) => (energy < 33.169 ? energy ** 2 : 100));
  const scatter = { signal: step, noise: step, counts: step, airKerma: step };
  const responses: ScatterResponses = {
    energies_keV,
    withoutGrid: scatter,
    behindGrid: null,
    backscatter: step,
    layerAbsorbedFraction: [step],
  };
  const channels = Float64Array.of(5, 21.3, 33.1, 33.2, 77, 149, 200);
  const on = responsesOn(responses, channels);

  it('keep a power of energy exactly and never mix the sides of an edge', () => {
    const expected = [10 ** 2, 21.3 ** 2, 33.1 ** 2, 100, 100, 100, 100];
    const errors = expected.map((value, i) => Math.abs(on.withoutGrid.signal[i] - value));
    expect(Math.max(...errors)).toBeLessThan(1e-6);
    expect(on.layerAbsorbedFraction?.[0]).toEqual(on.backscatter);
  });
  it('keep their identity while their arguments do', () => {
    expect(responsesOn(responses, channels)).toBe(on);
  });
});
