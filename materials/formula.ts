import { type Element, elementBySymbol } from './elements.js';

/** Atoms of each element in one formula unit. */
export type AtomCounts = ReadonlyMap<Element, number>;

/**
 * Reads a chemical formula: symbols, counts (whole or decimal), nested parentheses; 'Ca10(PO4)6(OH)2'.
 * Throws an Error in plain words that names the formula, the place, the rule and the remedy.
 */
export function parseFormula(formula: string): AtomCounts {
  const text = formula.replace(/\s+/g, '');
  if (text === '') throw fault(formula, 'is empty', 'write element symbols such as H2O');
  const state = { text, at: 0 };
  const counts = readGroup(formula, state);
  if (state.at < text.length) {
    throw fault(
      formula,
      `has a closing parenthesis at place ${state.at + 1} that was never opened`,
      'remove it',
    );
  }
  return counts;
}

/** Molar mass of a formula unit in g/mol. */
export function molarMass_g_per_mol(counts: AtomCounts): number {
  return [...counts].reduce((sum, [element, n]) => sum + n * element.atomicWeight_g_per_mol, 0);
}

interface Cursor {
  readonly text: string;
  at: number;
}

function readGroup(formula: string, cursor: Cursor): Map<Element, number> {
  const counts = new Map<Element, number>();
  while (cursor.at < cursor.text.length && cursor.text[cursor.at] !== ')') {
    const part =
      cursor.text[cursor.at] === '('
        ? readParentheses(formula, cursor)
        : new Map([[readSymbol(formula, cursor), 1]]);
    const times = readCount(formula, cursor);
    for (const [element, n] of part) counts.set(element, (counts.get(element) ?? 0) + n * times);
  }
  return counts;
}

function readParentheses(formula: string, cursor: Cursor): Map<Element, number> {
  const opened = cursor.at + 1;
  cursor.at++;
  const inside = readGroup(formula, cursor);
  if (cursor.text[cursor.at] !== ')') {
    throw fault(formula, `opens a parenthesis at place ${opened} that is never closed`, 'close it');
  }
  if (inside.size === 0)
    throw fault(formula, `has empty parentheses at place ${opened}`, 'fill or remove them');
  cursor.at++;
  return inside;
}

function readSymbol(formula: string, cursor: Cursor): Element {
  const written = /^[A-Z][a-z]?/.exec(cursor.text.slice(cursor.at))?.[0] ?? '';
  const element = elementBySymbol(written);
  if (!element) {
    const shown = written || cursor.text[cursor.at];
    throw fault(
      formula,
      `has "${shown}" at place ${cursor.at + 1}, which is no element from H to U`,
      'write symbols with their usual capitals, as in BaSO4',
    );
  }
  cursor.at += element.symbol.length;
  return element;
}

function readCount(formula: string, cursor: Cursor): number {
  const digits = /^\d+(\.\d+)?|^\.\d+/.exec(cursor.text.slice(cursor.at))?.[0];
  if (digits === undefined) return 1;
  const count = Number(digits);
  if (!(count > 0))
    throw fault(
      formula,
      `has the count ${digits} at place ${cursor.at + 1}`,
      'counts must be above 0',
    );
  cursor.at += digits.length;
  return count;
}

function fault(formula: string, what: string, remedy: string): Error {
  return new Error(`formula: "${formula}": ${what}; ${remedy}`);
}
