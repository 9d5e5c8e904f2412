import { type Element, elementBySymbol } from './elements.js';
import { molarMass_g_per_mol, parseFormula } from './formula.js';
import type { Provenance } from './material.js';

/** Units in which an amount of agent may be given, always as it is in the lumen. */
export type AmountUnit = 'mg element/mL' | 'mg compound/mL' | 'mmol/mL' | '% w/v';

/** An amount of agent as it is in the lumen. */
export interface Amount {
  readonly value: number;
  readonly unit: AmountUnit;
}

/** How an agent shares the volume with its carrier. */
export type AgentKind = 'dissolved molecule' | 'suspension' | 'element in carrier' | 'gas';

/** A contrast agent. `mmol` count formula units; iodine counts three atoms in each. */
export interface Agent {
  readonly name: string;
  readonly kind: AgentKind;
  /** Symbol of the element that attenuates. */
  readonly element: string;
  readonly z: number;
  readonly formula: string;
  readonly molarMass_g_per_mol: number;
  readonly elementMassFraction: number;
  /** Volume that one gram of solute takes in the carrier. */
  readonly specificVolume_mL_per_g: number;
  /** True for anything but iodine, barium by mouth, gadolinium and CO2: labelled on every plot. */
  readonly investigational: boolean;
  /** Name of the carrier when a case names none. */
  readonly defaultCarrier: string;
  readonly source: string;
  readonly provenance: Provenance;
}

const organicIodine = 'C19H26I3N3O9';

const agents: readonly Agent[] = [
  makeAgent('iodine', 'dissolved molecule', 'I', organicIodine, 0.46, 'blood', {
    source: 'non-ionic monomer, M 821 g/mol; partial specific volume 0.46 mL/g',
    provenance: 'recalled',
  }),
  makeAgent('elemental iodine', 'element in carrier', 'I', 'I', undefined, 'blood'),
  makeAgent('barium sulfate', 'suspension', 'Ba', 'BaSO4', 1 / 4.5, 'water', {
    source: 'volumes add: ρ = 1 + w(1 − 1/4.5), w in g/mL; BaSO4 4.50 g/cm³',
    provenance: 'computed',
  }),
  makeAgent('gadolinium chelate', 'dissolved molecule', 'Gd', 'C28H54GdN5O20', 0.58, 'blood', {
    source: 'gadopentetate dimeglumine; partial specific volume from 1.195 g/mL at 0.5 mol/L',
    provenance: 'recalled',
  }),
  makeAgent('carbon dioxide', 'gas', 'C', 'CO2', 1 / 0.00184, 'carbon dioxide', {
    source: 'gas at 20 °C and 1 atm, 1.84 mg/cm³; takes the place of the carrier entirely',
    provenance: 'computed',
  }),
  ...['Ta', 'Yb', 'Au', 'Bi', 'W'].map((symbol) =>
    makeAgent(named(symbol).name, 'element in carrier', symbol, symbol, undefined, 'blood', {
      investigational: true,
    }),
  ),
];

/** Names of the agents; the first is the default. */
export const agentNames: readonly string[] = agents.map(({ name }) => name);

/** The agent of a name, or undefined. */
export function agent(name: string): Agent | undefined {
  return agents.find((candidate) => candidate.name === name.trim().toLowerCase());
}

/** An amount of an agent in mg of its attenuating element per mL. */
export function elementConcentration_mg_per_mL(chosen: Agent, amount: Amount): number {
  return compoundConcentration_mg_per_mL(chosen, amount) * chosen.elementMassFraction;
}

/** An amount of an agent in mg of the compound per mL; throws on a negative amount or unknown unit. */
export function compoundConcentration_mg_per_mL(chosen: Agent, { value, unit }: Amount): number {
  if (!(value >= 0 && value < Infinity)) {
    throw new Error(
      `${chosen.name}: ${value} ${unit}: must be 0 or positive; enter the amount as it is in the lumen`,
    );
  }
  switch (unit) {
    case 'mg element/mL':
      return value / chosen.elementMassFraction;
    case 'mg compound/mL':
      return value;
    case 'mmol/mL':
      return value * chosen.molarMass_g_per_mol;
    case '% w/v':
      return 10 * value;
    default:
      throw new Error(
        `${chosen.name}: unit "${String(unit)}": is not known; use mg element/mL, mg compound/mL, mmol/mL or % w/v`,
      );
  }
}

function makeAgent(
  name: string,
  kind: AgentKind,
  symbol: string,
  formula: string,
  specificVolume_mL_per_g: number | undefined,
  defaultCarrier: string,
  more: Partial<Pick<Agent, 'source' | 'provenance' | 'investigational'>> = {},
): Agent {
  const element = named(symbol);
  const atoms = parseFormula(formula);
  const mass = molarMass_g_per_mol(atoms);
  return Object.freeze({
    name,
    kind,
    element: symbol,
    z: element.z,
    formula,
    molarMass_g_per_mol: mass,
    elementMassFraction: ((atoms.get(element) ?? 0) * element.atomicWeight_g_per_mol) / mass,
    specificVolume_mL_per_g: specificVolume_mL_per_g ?? 1 / element.density_g_per_cm3,
    investigational: false,
    defaultCarrier,
    source: `element in its carrier, volume from the element's density ${element.density_g_per_cm3} g/cm³`,
    provenance: 'assumed' as const,
    ...more,
  });
}

function named(symbol: string): Element {
  const element = elementBySymbol(symbol);
  if (!element) throw new Error(`${symbol}: no such element`);
  return element;
}
