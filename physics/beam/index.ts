// The beam from the anode to the patient, in the order a photon meets it.

// Channels.

export { type EnergyGrid, energyGrid } from './energy-grid.js';
export { kEdges_keV } from './k-edges.js';
export { binCount, type Spectrum, scaleSpectrum, withFluence } from './spectrum.js';

// Sources.

export { lineSpectrum, monoenergetic } from './line-sources.js';
export { type ReferenceBeamName, referenceBeam } from './reference-beam.js';
export { referenceQualities, referenceQualitySource } from './reference-beam-table.js';
export { rippleVoltages_kV } from './ripple.js';
export { sourceBeam } from './source-beam.js';
export { outputDistance_mm, type TubeSetting, tungstenSpectrum } from './tube-spectrum.js';
export {
  rescaleToAirKerma,
  type SourceBeam,
  type SpectrumRows,
  spectrumFromCsv,
  spectrumFromRows,
} from './user-spectrum.js';

// The room's own tube.

export type { CalibrationOptions } from './believed-readings.js';
export { calibrate, readingFaults } from './calibrate.js';
export { anchorPotential_kV, outputFactorAt_kV, type TubeFit } from './calibration-fit.js';
export { beamFaults } from './filtration-faults.js';

// What stands in the way.

export { airPath } from './air-path.js';
export { attenuate, type MaterialLayer, opticalDepth } from './attenuate.js';

// What a beam is.

export { airKerma_uGy, airKermaPerPhoton_uGy_mm2, broadBeamAirKerma_uGy } from './air-kerma.js';
export { aluminiumEquivalent_mm, aluminiumForHalfValueLayer_mm } from './aluminium-equivalent.js';
export { beamQuality } from './beam-quality.js';
export { effectiveEnergy_keV, energyOfHalfValueLayer_keV } from './effective-energy.js';
export {
  energyFluence_keV_per_mm2,
  energyWeightedMeanEnergy_keV,
  meanEnergy_keV,
  soleEnergy_keV,
  totalFluence_per_mm2,
} from './fluence.js';
export {
  effectiveAttenuation_per_cm,
  halfValueLayer_mm,
  homogeneityCoefficient,
  quarterValueLayer_mm,
  tenthValueLayer_mm,
} from './half-value-layer.js';
export { idealSnrSquaredPerAirKerma_per_mm2_uGy } from './ideal-snr.js';
export { type SpectrumRow, spectrumRows } from './spectrum-rows.js';
export { type ValueLayers, valueLayer_mm, valueLayers } from './value-layer.js';
