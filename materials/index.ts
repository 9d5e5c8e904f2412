/** What matter does to photons: elements, materials, agents, coefficients. In order of use. */

export {
  type Agent,
  type AgentKind,
  type AgentMixture,
  type AgentRequest,
  type AmountUnit,
  agent,
  agentMixture,
  agentNames,
  elementConcentration_mg_per_mL,
} from './agents.js';
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
export * from './constants.js';
export { type AbsorptionEdge, absorptionEdges } from './edges.js';
export { type PartialCoefficients, tabulatedEnergies_keV } from './element-coefficients.js';
export { type Element, elementBySymbol, elementByZ, elements } from './elements.js';
export { comptonEnergyFraction, energyAbsorptionLimit_keV } from './energy-absorption.js';
export { type FluorescenceLine, type KShell, kShell } from './fluorescence.js';
export { type AtomCounts, molarMass_g_per_mol, parseFormula } from './formula.js';
export {
  evaluate,
  type HermiteCurve,
  monotoneCubic,
  naturalSpline,
} from './interpolation.js';
export { kept } from './kept.js';
export { comptonEnergyRatio, kleinNishinaShape } from './klein-nishina.js';
export * from './material.js';
export {
  compound,
  type EnteredMaterial,
  type MixturePart,
  materialFromFractions,
  mixture,
} from './mixture.js';
export { materialNames, namedMaterial } from './named-materials.js';
export {
  atoms_per_g,
  electronDensity_per_cm3,
  electrons_per_g,
  formFactorSquaredPerGram,
  scatteringFunctionPerGram,
} from './per-mass.js';
export { formFactor, incoherentScatteringFunction } from './scattering-functions.js';
