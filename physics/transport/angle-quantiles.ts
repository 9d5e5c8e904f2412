import { cutoffEnergy_keV, greatestEnergy_keV, nodeEnergies_keV } from './energy-nodes.js';

/** Rows of the inverse distributions: 61 energies in equal ratios from 1 to 150 keV. */
export const rowCount = 61;
/** cosθ at cumulative probability k/256, k = 0 … 256, from forward to backward. */
export const quantileCount = 257;

const logRange = Math.log(greatestEnergy_keV / cutoffEnergy_keV);

export const rowEnergies_keV: Float64Array = Float64Array.from(
  { length: rowCount },
  (_, row) => cutoffEnergy_keV * Math.exp((logRange * row) / (rowCount - 1)),
);

/**
 * Where each energy node lies between rows, as row + fraction, in ln E. A photon takes the row above
 * with that fraction as probability, which on average interpolates the distribution linearly.
 */
export const rowPositions: Float64Array = nodeEnergies_keV.map(
  (energy_keV) => ((rowCount - 1) * Math.log(energy_keV / cutoffEnergy_keV)) / logRange,
);

/** Steps of the running integral per row; equal in sin(θ/2), so forward peaks are resolved. */
const steps = 2048;

/**
 * Inverse distribution of cosθ for a scattering shape per solid angle, row after row. With
 * s = sin(θ/2), dΩ = 8π s ds; the running integral is by trapezoids in s, inverted linearly in s².
 */
export function angleQuantiles(
  shape: (energy_keV: number, cosTheta: number) => number,
): Float32Array {
  const cosines = new Float32Array(rowCount * quantileCount);
  const cumulative = new Float64Array(steps + 1);
  rowEnergies_keV.forEach((energy_keV, row) => {
    accumulate(cumulative, (cosTheta) => shape(energy_keV, cosTheta));
    invert(cumulative, cosines.subarray(row * quantileCount, (row + 1) * quantileCount));
  });
  return cosines;
}

/** ∫ shape dΩ at every row energy. */
export function shapeIntegrals(
  shape: (energy_keV: number, cosTheta: number) => number,
): Float64Array {
  const cumulative = new Float64Array(steps + 1);
  return rowEnergies_keV.map((energy_keV) => {
    accumulate(cumulative, (cosTheta) => shape(energy_keV, cosTheta));
    return cumulative[steps];
  });
}

function accumulate(cumulative: Float64Array, shape: (cosTheta: number) => number): void {
  const width = 1 / steps;
  let before = 0;
  for (let i = 1; i <= steps; i++) {
    const s = i * width;
    const density = 8 * Math.PI * s * shape(1 - 2 * s * s);
    cumulative[i] = cumulative[i - 1] + 0.5 * width * (before + density);
    before = density;
  }
}

function invert(cumulative: Float64Array, cosines: Float32Array): void {
  const total = cumulative[steps];
  let step = 0;
  for (let k = 0; k < quantileCount; k++) {
    const target = (total * k) / (quantileCount - 1);
    while (step < steps - 1 && cumulative[step + 1] < target) step++;
    const share = (target - cumulative[step]) / (cumulative[step + 1] - cumulative[step]);
    const lower = (step / steps) ** 2;
    const upper = ((step + 1) / steps) ** 2;
    cosines[k] = 1 - 2 * (lower + share * (upper - lower));
  }
  cosines[quantileCount - 1] = -1;
}
