import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gridPerformance, imageImprovement } from '../../../physics/readout/index.js';

const transmission = fc.double({ min: 0.01, max: 1, noNaN: true });
const ratio = fc.double({ min: 0, max: 20, noNaN: true });

describe('the quantities of IEC 60627', () => {
  it('hold the identities of the standard for any grid and any scatter', () => {
    fc.assert(
      fc.property(transmission, transmission, ratio, (tp, ts, spr) => {
        const grid = gridPerformance(tp, ts, spr);
        // Tt = (Tp + Ts·SPR)/(1 + SPR); Σ = Tp/Ts; B = 1/Tt; K = Tp/Tt; Q = Tp²/Tt.
        expect(grid.totalTransmission * (1 + spr)).toBeCloseTo(tp + ts * spr, 12);
        expect(grid.selectivity * ts).toBeCloseTo(tp, 12);
        expect(grid.buckyFactor * grid.totalTransmission).toBeCloseTo(1, 12);
        expect(grid.contrastImprovement).toBeCloseTo(tp * grid.buckyFactor, 9);
        expect(imageImprovement(grid)).toBeCloseTo(tp * grid.contrastImprovement, 9);
      }),
    );
  });

  it('say that a grid improves contrast by the drop of scatter over primary', () => {
    fc.assert(
      fc.property(transmission, transmission, ratio, (tp, ts, spr) => {
        const behind = (spr * ts) / tp;
        const { contrastImprovement } = gridPerformance(tp, ts, spr);
        expect(contrastImprovement).toBeCloseTo((1 + spr) / (1 + behind), 9);
      }),
    );
  });

  it('are finite for a grid that passes nothing', () => {
    expect(Object.values(gridPerformance(0, 0, 3)).every(Number.isFinite)).toBe(true);
  });

  it('make a grid without scatter cost what it absorbs and nothing else', () => {
    const grid = gridPerformance(0.7, 0.1, 0);
    expect(grid.contrastImprovement).toBeCloseTo(1, 12);
    expect(grid.snrImprovement).toBeCloseTo(Math.sqrt(0.7), 12);
  });
});
