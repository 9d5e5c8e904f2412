import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { noiseAt, sdnrAt, solveTubeLoad } from '../../../physics/readout/index.js';
import { evenScatter, readAbdomen } from './read-abdomen.js';

const { readout } = readAbdomen(
  { task: { backgroundNoise_fraction: 0.01 } },
  { scatterOn: evenScatter(1.5) },
);
const loads = fc.double({ min: 0.01, max: 500, noNaN: true });

describe('the tube load that holds a quantity constant', () => {
  it('gives back the load that made an SdNR, with electronic and static noise in play', () => {
    fc.assert(
      fc.property(loads, (load) => {
        const { tubeLoad_mAs } = solveTubeLoad(readout, 1, 'sdnr', sdnrAt(readout, load));
        expect((tubeLoad_mAs ?? 0) / load).toBeCloseTo(1, 8);
      }),
    );
  });

  it('meets detector air kerma, detector signal, incident air kerma and load in proportion', () => {
    fc.assert(
      fc.property(loads, (load) => {
        const targets = {
          detectorAirKerma: readout.detectorAirKerma_uGy_per_mAs * load,
          detectorSignal: readout.signalTotal_per_mm2_per_mAs * load,
          incidentAirKerma: 0.07 * load,
          tubeLoad: load,
        };
        for (const hold of Object.keys(targets) as (keyof typeof targets)[]) {
          const { tubeLoad_mAs } = solveTubeLoad(readout, 0.07, hold, targets[hold]);
          expect((tubeLoad_mAs ?? 0) / load).toBeCloseTo(1, 12);
        }
      }),
    );
  });

  it('does not exist for an SdNR that static noise forbids, and the reason names the ceiling', () => {
    const ceiling = sdnrAt(readout, 1e12);
    const { tubeLoad_mAs, reason } = solveTubeLoad(readout, 1, 'sdnr', ceiling * 1.001);
    expect(tubeLoad_mAs).toBeNull();
    expect(reason).toContain('cannot be reached at any tube load');
    expect(solveTubeLoad(readout, 1, 'sdnr', ceiling * 0.99).tubeLoad_mAs).toBeGreaterThan(0);
  });

  it('does not exist where the detail has no contrast', () => {
    const detail = { shape: 'slab', inLayer: 'abdomen', size_mm: 5, material: 'soft tissue' };
    const blind = readAbdomen({ detail }).readout;
    expect(solveTubeLoad(blind, 1, 'sdnr', 3).reason).toContain('no contrast');
  });

  it('is zero for a target of zero and refused for one that is no number', () => {
    expect(solveTubeLoad(readout, 1, 'sdnr', 0).tubeLoad_mAs).toBe(0);
    expect(solveTubeLoad(readout, 1, 'tubeLoad', Number.NaN).tubeLoad_mAs).toBeNull();
    expect(solveTubeLoad(readout, 0, 'incidentAirKerma', 1).tubeLoad_mAs).toBeNull();
  });

  it('without electronic and static noise doubles SdNR with four times the load', () => {
    const detector = { electronicNoiseKerma_uGy: 0, structureNoise_fraction: 0 };
    const room = { geometry: { sourceToDetector_mm: 1150 }, detector };
    const clean = readAbdomen({ room }).readout;
    const once = solveTubeLoad(clean, 1, 'sdnr', 5).tubeLoad_mAs ?? 0;
    const twice = solveTubeLoad(clean, 1, 'sdnr', 10).tubeLoad_mAs ?? 0;
    expect(twice / once).toBeCloseTo(4, 10);
    expect(noiseAt(clean, once).quantum).toBe(noiseAt(clean, once).total);
  });
});
