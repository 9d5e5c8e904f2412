import { beforeAll, describe, expect, it } from 'vitest';
import { statedAccuracy_percent } from '../../../physics/check-by-transport/index.js';
import { scatterResponses } from '../../../physics/scatter/index.js';
import { readReference } from '../../reference/read-reference.js';
import { accuracyDetector, accuracyGrid } from './accuracy-stacks.js';
import { skinBeam, skinEstimate, skinPotentials_kV, skinScenes } from './skin-scenes.js';
import { spectrumSpr } from './spectrum-spr.js';

/** The estimate computed now over the transport result committed, less 1, in percent. */
interface Difference {
  readonly row: string;
  readonly backscatter: number;
  readonly dose: number;
  readonly spr: number;
}

const rows = readReference('skin-accuracy.csv');
const differences: Difference[] = [];

beforeAll(() => {
  for (const { name, stack } of skinScenes) {
    const responses = scatterResponses(stack, accuracyDetector, accuracyGrid);
    for (const row of rows.filter(({ scene }) => scene === name)) {
      const potential_kV = Number(row.potential_kV);
      const estimate = skinEstimate(stack, responses, potential_kV);
      const beam = skinBeam(potential_kV);
      const spr = spectrumSpr(stack, responses, beam, accuracyDetector, accuracyGrid);
      const percent = (value: number, column: string) => 100 * (value / Number(row[column]) - 1);
      differences.push({
        row: `${name}, ${potential_kV} kV`,
        backscatter: percent(estimate.backscatterFactor, 'backscatter'),
        dose: percent(estimate.firstLayerDose_mGy_per_mGy, 'dose'),
        spr: percent(spr.open, 'spr'),
      });
    }
  }
}, 120_000);

const mean = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

// Transport's own standard errors (backscatter 0.2 to 1.8 %) are part of the differences.
describe('what the skin receives behind a support, against photon transport', () => {
  it('has a transport result for every scene and potential', () => {
    expect(differences).toHaveLength(skinScenes.length * skinPotentials_kV.length);
  });

  it('backscatter factor: each within its stated 3 %, 1 % on average', () => {
    for (const { row, backscatter } of differences) {
      expect(Math.abs(backscatter), row).toBeLessThan(statedAccuracy_percent.backscatterFactor);
    }
    expect(Math.abs(mean(differences.map(({ backscatter }) => backscatter)))).toBeLessThan(1);
  });

  // A wide cone brings less energy to the rim of the field than to its axis: up to 3 % here.
  it('absorbed dose of the first layer: each within its stated accuracy', () => {
    for (const { row, dose } of differences) {
      expect(Math.abs(dose), row).toBeLessThan(statedAccuracy_percent.layerAbsorbedDose);
    }
  });

  it('scatter to primary: each within its stated accuracy', () => {
    for (const { row, spr } of differences) {
      expect(Math.abs(spr), row).toBeLessThan(statedAccuracy_percent.spr);
    }
  });

  it('a support in contact adds to what the skin receives, by a tenth and more', () => {
    const factor = (name: string) =>
      Number(rows.find((row) => row.scene === name && row.potential_kV === '80')?.backscatter);
    expect(factor('soft tissue on a bare table')).toBeGreaterThan(
      1.1 * factor('soft tissue, no support'),
    );
  });
});
