import {
  compound,
  elementBySymbol,
  type Material,
  materialNames,
  namedMaterial,
} from '../../materials/index.js';
import { nearestKey } from '../../physics/case/index.js';
import { refuse } from './refusal.js';

/**
 * A material as named on the command line: a named material, an element by name or symbol, or a
 * chemical formula at a density. A density given for a named material replaces its own.
 */
export const materialNamed = (
  option: string,
  name: string,
  density_g_per_cm3?: number,
  densityRemedy = 'add --density in g/cm³',
): Material => {
  const known = namedMaterial(name) ?? namedMaterial(elementBySymbol(name)?.name ?? '');
  if (known) {
    return density_g_per_cm3 === undefined ? known : { ...known, density_g_per_cm3 };
  }
  return fromFormula(option, name, density_g_per_cm3, densityRemedy);
};

const fromFormula = (
  option: string,
  name: string,
  density: number | undefined,
  densityRemedy: string,
): Material => {
  const quoted = JSON.stringify(name);
  if (!/^[A-Z][A-Za-z0-9().]*$/.test(name)) {
    const near = nearestKey(name.toLowerCase(), materialNames);
    const remedy = near ? `did you mean "${near}"?` : 'name an element, a material or a formula';
    return refuse(option, quoted, 'must be a known material', remedy);
  }
  try {
    // Read at unit density first, so that a bad formula is not blamed on the density.
    const unit = compound(name, 1, name);
    if (density !== undefined) return { ...unit, density_g_per_cm3: density };
  } catch (error) {
    const [rule, remedy] = formulaFault(error);
    return refuse(option, quoted, rule, remedy);
  }
  return refuse(option, quoted, 'must come with a density when it is a formula', densityRemedy);
};

/** `formula: "Xy2": has …; write …` from materials, without the parts said already. */
const formulaFault = (error: unknown): [rule: string, remedy: string] => {
  const message = error instanceof Error ? error.message : '';
  const [, rule, remedy] = /: ([^:;]+); ([^;]+)$/.exec(message) ?? [];
  return [rule ?? 'must be a chemical formula', remedy ?? 'write element symbols such as H2O'];
};
