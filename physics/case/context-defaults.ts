import { formulaFractions } from './formulas.js';
import { type Path, printedPath, valueAt } from './printed.js';

/** A default that depends on another part of the case and there replaces the usual one. */
export interface ContextDefault {
  readonly path: Path;
  readonly value: unknown;
}

/**
 * Defaults that depend on context: a material given by formula has the mass fractions of the formula;
 * in a room without a grid no technique has one in; subtraction has a mask of one frame.
 *
 * @param input a case, parsed or as read.
 */
export const contextDefaults = (input: unknown): readonly ContextDefault[] => [
  ...listAt(input, 'materials').flatMap((material, index) => {
    const formula = valueAt(material, ['formula']);
    const read = typeof formula === 'string' ? formulaFractions(formula.slice(0, 200)) : {};
    return 'massFractions' in read
      ? [{ path: ['materials', index, 'massFractions'], value: read.massFractions }]
      : [];
  }),
  ...listAt(input, 'techniques').flatMap((technique, index) => [
    ...((valueAt(input, ['room', 'grid']) ?? null) === null
      ? [{ path: ['techniques', index, 'grid'], value: 'out' }]
      : []),
    ...(valueAt(technique, ['acquisition', 'mode']) === 'subtraction'
      ? [{ path: ['techniques', index, 'acquisition', 'maskFrames'], value: 1 }]
      : []),
  ]),
];

const listAt = (input: unknown, key: string): readonly unknown[] => {
  const list = valueAt(input, [key]);
  return Array.isArray(list) ? list : [];
};

/** The same case with those defaults filled in where the file is silent. */
export const withContextDefaults = (input: unknown): unknown =>
  contextDefaults(input).reduce(
    (filled, { path, value }) =>
      valueAt(filled, path) === undefined ? withValue(filled, path, value) : filled,
    input,
  );

/** A copy along the path with one value set; the input stays as it was. */
export const withValue = (root: unknown, path: Path, value: unknown): unknown => {
  if (path.length === 0) return value;
  if (root === null || typeof root !== 'object') return root;
  const [key, ...rest] = path;
  const inner = withValue(valueAt(root, [key]), rest, value);
  if (!Array.isArray(root)) return { ...root, [key]: inner };
  return root.map((item: unknown, index) => (index === key ? inner : item));
};

/** The context's default at a path, if there is one. */
export const contextDefaultAt = (
  found: readonly ContextDefault[],
  path: Path,
): ContextDefault | undefined => {
  const printed = printedPath(path);
  return found.find((candidate) => printedPath(candidate.path) === printed);
};
