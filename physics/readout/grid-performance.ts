import type { GridPerformance } from '../results.js';

/**
 * The quantities of IEC 60627:2013 from the transmissions of primary Tp and scatter Ts and the
 * scatter-to-primary ratio in front of the grid: Tt = (Tp + Ts·SPR)/(1 + SPR), selectivity Tp/Ts,
 * Bucky factor 1/Tt, contrast improvement Tp/Tt; and the SNR improvement Tp/√Tt at equal incident
 * air kerma, which holds for a detector whose noise is all quantum noise.
 *
 * @returns ratios; a quotient by zero (a grid that passes nothing) is 0.
 */
export const gridPerformance = (
  primaryTransmission: number,
  scatterTransmission: number,
  spr: number,
): GridPerformance => {
  const totalTransmission = (primaryTransmission + scatterTransmission * spr) / (1 + spr);
  const over = (value: number, divisor: number): number => (divisor > 0 ? value / divisor : 0);
  return {
    primaryTransmission,
    scatterTransmission,
    totalTransmission,
    selectivity: over(primaryTransmission, scatterTransmission),
    buckyFactor: over(1, totalTransmission),
    contrastImprovement: over(primaryTransmission, totalTransmission),
    snrImprovement: over(primaryTransmission, Math.sqrt(totalTransmission)),
  };
};

/** Image improvement factor Tp²/Tt (IEC 60627): above 1 where a grid is worth its dose. */
export const imageImprovement = (grid: GridPerformance): number => grid.snrImprovement ** 2;
