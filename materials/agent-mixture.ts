import {
  type Agent,
  type Amount,
  agent,
  agentNames,
  compoundConcentration_mg_per_mL,
} from './agents.js';
import { addMass, makeMaterial } from './composition.js';
import { parseFormula } from './formula.js';
import type { Material } from './material.js';

/** An agent in its carrier. `elementConcentration_mg_per_mL` is of the attenuating element z. */
export interface AgentMixture {
  readonly agent: Agent;
  readonly material: Material;
  readonly z: number;
  readonly elementConcentration_mg_per_mL: number;
  /** Share of the volume that the solute takes. */
  readonly soluteVolumeFraction: number;
}

/** What `agentMixture` is given. */
export interface AgentRequest {
  readonly agent: string;
  readonly amount: Amount;
  readonly carrier: Material;
}

/**
 * The material of an agent at an amount in a carrier; volumes add. A gas takes the whole volume and
 * its amount is not used. Throws an Error (value, rule, remedy) on an unknown agent, a negative
 * amount, or one whose solute alone would fill more than the volume.
 */
export function agentMixture({ agent: name, amount, carrier }: AgentRequest): AgentMixture {
  const chosen = agent(name);
  if (!chosen)
    throw new Error(`agent: "${name}": is not known; choose one of ${agentNames.join(', ')}`);
  const solute_mg_per_mL =
    chosen.kind === 'gas'
      ? 1e3 / chosen.specificVolume_mL_per_g
      : compoundConcentration_mg_per_mL(chosen, amount);
  const soluteVolumeFraction = (solute_mg_per_mL / 1e3) * chosen.specificVolume_mL_per_g;
  if (soluteVolumeFraction > 1 + 1e-12) {
    const most = amount.value / soluteVolumeFraction;
    throw new Error(
      `${chosen.name}: ${amount.value} ${amount.unit}: the solute alone would fill ${Math.round(100 * soluteVolumeFraction)} % of the volume, must be at most 100 %; enter at most ${most.toPrecision(3)} ${amount.unit}`,
    );
  }
  return Object.freeze({
    agent: chosen,
    material: dissolve(chosen, solute_mg_per_mL, soluteVolumeFraction, carrier),
    z: chosen.z,
    elementConcentration_mg_per_mL: solute_mg_per_mL * chosen.elementMassFraction,
    soluteVolumeFraction,
  });
}

function dissolve(
  chosen: Agent,
  solute_mg_per_mL: number,
  soluteVolumeFraction: number,
  carrier: Material,
): Material {
  const carrierMass = (1 - soluteVolumeFraction) * carrier.density_g_per_cm3;
  const soluteMass = solute_mg_per_mL / 1e3;
  const massByZ = new Map<number, number>();
  if (carrierMass > 1e-15) addMass(massByZ, carrier, carrierMass);
  for (const [element, n] of parseFormula(chosen.formula)) {
    const mass = (soluteMass * n * element.atomicWeight_g_per_mol) / chosen.molarMass_g_per_mol;
    massByZ.set(element.z, (massByZ.get(element.z) ?? 0) + mass);
  }
  return makeMaterial({
    name: chosen.kind === 'gas' ? chosen.name : `${chosen.name} in ${carrier.name}`,
    density_g_per_cm3: carrierMass + soluteMass,
    massByZ,
    family: chosen.kind === 'gas' ? 'gas' : 'agent',
    source:
      chosen.kind === 'gas'
        ? chosen.source
        : `${chosen.source}; carrier ${carrier.name}: ${carrier.source}`,
    provenance: 'computed',
  });
}
