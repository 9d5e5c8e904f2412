/** A piece of a job: which one, and how many photons it flies. */
export interface Batch {
  readonly index: number;
  readonly photons: number;
}

/** Enough for a standard error good to 11 %. */
const leastBatches = 40;
/** Keeps the scores of all batches small enough to hold. */
const mostBatches = 400;
/** About 10 ms of flight: short enough to report and to cancel between batches. */
const photonsPerBatch = 25_000;

/**
 * How a run splits into batches: a function of the photon number alone, never of how many workers
 * there are. The first batches take one photon more where the number does not divide.
 */
export function planBatches(photons: number): Batch[] {
  if (!Number.isInteger(photons) || photons < 1) {
    throw new Error(`photons: ${photons}: must be a whole number from 1 upward`);
  }
  const wanted = Math.round(photons / photonsPerBatch);
  const count = Math.min(photons, Math.max(leastBatches, Math.min(mostBatches, wanted)));
  const each = Math.floor(photons / count);
  const extra = photons - each * count;
  return Array.from({ length: count }, (_, index) => ({
    index,
    photons: each + (index < extra ? 1 : 0),
  }));
}
