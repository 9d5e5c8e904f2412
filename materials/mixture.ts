import { addMass, makeMaterial } from './composition.js';
import { elementBySymbol } from './elements.js';
import { molarMass_g_per_mol, parseFormula } from './formula.js';
import type { Material, MaterialFamily, Provenance } from './material.js';

/** A chemical compound by formula ('BaSO4', 'Ca10(PO4)6(OH)2') at a density. */
export function compound(
  formula: string,
  density_g_per_cm3: number,
  name = formula,
  family?: MaterialFamily,
): Material {
  const atoms = parseFormula(formula);
  const total = molarMass_g_per_mol(atoms);
  return makeMaterial({
    name,
    density_g_per_cm3,
    massByZ: new Map([...atoms].map(([e, n]) => [e.z, (n * e.atomicWeight_g_per_mol) / total])),
    family,
    source: `formula ${formula}`,
    provenance: 'computed',
  });
}

/** A component of a mixture and its share of the mass. */
export interface MixturePart {
  readonly material: Material;
  readonly massFraction: number;
}

/**
 * A mixture by mass (shares are normalised). Without a density volumes add: 1/ρ = Σ wᵢ/ρᵢ.
 */
export function mixture(
  name: string,
  parts: readonly MixturePart[],
  density_g_per_cm3?: number,
): Material {
  const massByZ = new Map<number, number>();
  let mass = 0;
  let volume = 0;
  for (const { material, massFraction } of parts) {
    addMass(massByZ, material, massFraction);
    mass += massFraction;
    volume += massFraction / material.density_g_per_cm3;
  }
  return makeMaterial({
    name,
    density_g_per_cm3: density_g_per_cm3 ?? mass / volume,
    massByZ,
    source: `mixture of ${parts.map(({ material }) => material.name).join(', ')}`,
    provenance: 'computed',
  });
}

/** A material as a user enters it: element symbols with their shares of the mass. */
export interface EnteredMaterial {
  readonly name: string;
  readonly density_g_per_cm3: number;
  readonly massFractions: Readonly<Record<string, number>>;
  readonly family?: MaterialFamily;
  readonly source?: string;
  readonly provenance?: Provenance;
}

/** How far entered shares may sum from 1 before they are refused. */
const sumTolerance = 0.02;

/**
 * A material from mass fractions. They must sum to 1 within 0.02 (published compositions are rounded)
 * and are then normalised. Throws on an unknown symbol, a negative share, a wrong sum or density.
 */
export function materialFromFractions(entered: EnteredMaterial): Material {
  const { name, density_g_per_cm3, massFractions, family } = entered;
  const massByZ = new Map<number, number>();
  for (const [symbol, massFraction] of Object.entries(massFractions)) {
    const element = elementBySymbol(symbol);
    if (!element) {
      throw new Error(
        `${name}: massFractions: "${symbol}": is no element from H to U; use symbols such as Ca`,
      );
    }
    massByZ.set(element.z, massFraction);
  }
  const sum = [...massByZ.values()].reduce((total, share) => total + share, 0);
  if (massByZ.size > 0 && Math.abs(sum - 1) > sumTolerance) {
    throw new Error(
      `${name}: massFractions: sum ${sum.toPrecision(4)}: must be 1 within ${sumTolerance}; enter shares of the mass`,
    );
  }
  return makeMaterial({
    name,
    density_g_per_cm3,
    massByZ,
    family,
    source: entered.source ?? 'entered by the user',
    provenance: entered.provenance ?? 'entered',
  });
}
