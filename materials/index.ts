// What matter does to photons, from the constants to the coefficients of a mixture.

// Constants and the arithmetic that everything shares.

export * from './constants.js';
export { evaluate, type HermiteCurve, monotoneCubic, naturalSpline } from './interpolation.js';
export { kept } from './kept.js';

// Elements and formulas.

export { type Element, elementBySymbol, elementByZ, elements } from './elements.js';
export { type AtomCounts, molarMass_g_per_mol, parseFormula } from './formula.js';

// Materials.

export * from './material.js';
export {
  compound,
  type EnteredMaterial,
  type MixturePart,
  materialFromFractions,
  mixture,
} from './mixture.js';
export { materialNames, namedMaterial } from './named-materials.js';

// Agents and what they are in their carriers.

export { type AgentMixture, type AgentRequest, agentMixture } from './agent-mixture.js';
export {
  type Agent,
  type AgentKind,
  type Amount,
  type AmountUnit,
  agent,
  agentNames,
  compoundConcentration_mg_per_mL,
  elementConcentration_mg_per_mL,
} from './agents.js';

// Attenuation and energy absorption.

export {
  energyAbsorptionCaution,
  massAttenuation,
  massAttenuationOn,
  massEnergyAbsorption,
  massEnergyAbsorptionOn,
  type PartialColumns,
  partialCoefficients,
  partialCoefficientsOn,
} from './attenuation.js';
export { type AbsorptionEdge, absorptionEdges } from './edges.js';
export { type PartialCoefficients, tabulatedEnergies_keV } from './element-coefficients.js';
export { comptonEnergyFraction, energyAbsorptionLimit_keV } from './energy-absorption.js';

// Scattering.

export { comptonEnergyRatio, kleinNishinaShape } from './klein-nishina.js';
export {
  atoms_per_g,
  electronDensity_per_cm3,
  electrons_per_g,
  formFactorSquaredPerGram,
  scatteringFunctionPerGram,
} from './per-mass.js';
export { formFactor, incoherentScatteringFunction } from './scattering-functions.js';

// Fluorescence.

export { type FluorescenceLine, type KShell, kShell } from './fluorescence.js';
