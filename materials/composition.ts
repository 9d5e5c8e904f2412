import { elementByZ } from './elements.js';
import type { MassFraction, Material, MaterialFamily } from './material.js';

/** What a new material is made from; masses need not sum to 1. */
export interface MaterialParts extends Omit<Material, 'massFractions' | 'family'> {
  readonly massByZ: ReadonlyMap<number, number>;
  readonly family?: MaterialFamily;
}

/** A frozen material: elements ascending in Z, zero shares dropped, mass fractions summing to 1. */
export function makeMaterial({ massByZ, family, ...rest }: MaterialParts): Material {
  const { name, density_g_per_cm3 } = rest;
  if (!(density_g_per_cm3 > 0 && density_g_per_cm3 < 30)) {
    throw new Error(
      `${name}: density_g_per_cm3: ${density_g_per_cm3}: must be above 0 and below 30; enter it in g/cm³`,
    );
  }
  const massFractions = normalised(name, massByZ);
  return Object.freeze({
    ...rest,
    massFractions,
    family: family ?? familyOf(massFractions, density_g_per_cm3),
  });
}

/** Adds `mass` of every element of `material`, share by share, to a running tally. */
export function addMass(massByZ: Map<number, number>, material: Material, mass: number): void {
  for (const { z, massFraction } of material.massFractions) {
    massByZ.set(z, (massByZ.get(z) ?? 0) + mass * massFraction);
  }
}

function normalised(name: string, massByZ: ReadonlyMap<number, number>): readonly MassFraction[] {
  const present = [...massByZ].filter(([, mass]) => mass !== 0).sort(([a], [b]) => a - b);
  const wrong = present.find(([, mass]) => !(mass > 0 && mass < Infinity));
  if (wrong) {
    const { symbol } = elementByZ(wrong[0]);
    throw new Error(
      `${name}: massFractions.${symbol}: ${wrong[1]}: must be 0 or positive; enter a share of the mass`,
    );
  }
  const total = present.reduce((sum, [, mass]) => sum + mass, 0);
  if (total === 0) {
    throw new Error(
      `${name}: massFractions: none given: must name at least one element; enter shares of the mass`,
    );
  }
  return Object.freeze(
    present.map(([z, mass]) => Object.freeze({ z, massFraction: mass / total })),
  );
}

// Only how a layer is drawn: a gas, a mainly heavy solid, a detector-like one or a plastic.
function familyOf(
  massFractions: readonly MassFraction[],
  density_g_per_cm3: number,
): MaterialFamily {
  const heavy = massFractions.reduce(
    (sum, { z, massFraction }) => sum + (z > 10 ? massFraction : 0),
    0,
  );
  if (density_g_per_cm3 < 0.02) return 'gas';
  return heavy > 0.5 ? 'metal' : 'plastic';
}
