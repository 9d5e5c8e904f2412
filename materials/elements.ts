import { elementFacts } from './tables/element-facts.js';

/** A chemical element, Z = 1 to 92. Sources: tables/element-facts.ts. */
export interface Element {
  readonly z: number;
  readonly symbol: string;
  readonly name: string;
  readonly atomicWeight_g_per_mol: number;
  readonly density_g_per_cm3: number;
}

/** All elements in order of atomic number. */
export const elements: readonly Element[] = elementFacts.map(
  ([symbol, name, atomicWeight_g_per_mol, density_g_per_cm3], i) =>
    Object.freeze({ z: i + 1, symbol, name, atomicWeight_g_per_mol, density_g_per_cm3 }),
);

const bySymbol = new Map(elements.map((element) => [element.symbol, element]));

/** The element of a symbol in its usual capitals ('Cu'), or undefined. */
export function elementBySymbol(symbol: string): Element | undefined {
  return bySymbol.get(symbol);
}

/** The element of atomic number z; throws outside 1 to 92. */
export function elementByZ(z: number): Element {
  const element = elements[z - 1];
  if (!element)
    throw new RangeError(
      `z: ${z}: must be a whole number from 1 to 92; no other element is tabulated`,
    );
  return element;
}
