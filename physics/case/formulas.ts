import { compound, elementByZ } from '../../materials/index.js';

/** Mass fractions by element symbol that a chemical formula means, or why it means none. */
export const formulaFractions = (
  formula: string,
):
  | { readonly massFractions: Record<string, number> }
  | { readonly rule: string; readonly remedy: string } => {
  try {
    const parts = compound(formula, 1).massFractions;
    const shares = parts.map(
      ({ z, massFraction }) => [elementByZ(z).symbol, massFraction] as const,
    );
    return { massFractions: Object.fromEntries(shares) };
  } catch (error) {
    // Said by materials as `formula: "Xy": rule; remedy`.
    const [, rule, remedy] = /": (.*); (.*)$/.exec((error as Error).message) ?? [];
    return { rule: rule ?? 'must be a chemical formula', remedy: remedy ?? 'correct it' };
  }
};
