/** The linear energy grid of every transport table: 0.1 keV from 0 to 150 keV, 1501 nodes. */
export const energyNodeCount = 1501;
export const nodesPerKeV = 10;
export const greatestEnergy_keV = (energyNodeCount - 1) / nodesPerKeV;

/** Room for one table: its last node stands twice, so that interpolation at 150 keV stays inside. */
export const tableStride = energyNodeCount + 1;

/** A photon below this energy is absorbed where it is: its range in tissue is a few µm. */
export const cutoffEnergy_keV = 1;

/** Nodes below the cut-off repeat the values there, so that no coefficient is asked below 1 keV. */
export const nodeEnergies_keV: Float64Array = Float64Array.from({ length: tableStride }, (_, i) =>
  Math.min(greatestEnergy_keV, Math.max(cutoffEnergy_keV, i / nodesPerKeV)),
);
