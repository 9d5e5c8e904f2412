import type { z } from 'zod';
import { type Path, printedPath, valueAt } from './printed.js';
import { defaultOf, elementOf, shapeFor } from './schema-walk.js';

/** Keys that hold prose: they change no result, so no default of theirs is an assumption. */
export const proseKeys: ReadonlySet<string> = new Set(['title', 'question', 'dossier.text']);

/** A material is given by its formula or its mass fractions; the other is no assumption. */
const eitherGiven = /^materials\[\d+\]\.(formula|massFractions)$/;

/**
 * Every path whose value is a default because the input has no key there, in the order of the
 * schema: `room.tube.anodeAngle_deg`.
 *
 * @param input the case as handed in, the rows of its files in place.
 * @param parsed the same case with defaults filled in.
 */
export const assumedPaths = (schema: z.core.$ZodType, input: unknown, parsed: unknown): string[] =>
  defaultedPaths(schema, input, parsed, [])
    .map(printedPath)
    .filter((path) => !proseKeys.has(path) && !eitherGiven.test(path));

const defaultedPaths = (
  schema: z.core.$ZodType,
  input: unknown,
  parsed: unknown,
  path: Path,
): Path[] => {
  if (Array.isArray(parsed)) {
    const element = elementOf(schema);
    return parsed.flatMap((item, index) =>
      defaultedPaths(element, valueAt(input, [index]), item, [...path, index]),
    );
  }
  if (parsed === null || typeof parsed !== 'object') return [];
  const shape = shapeFor(schema, parsed);
  return Object.entries(shape).flatMap(([key, field]) => {
    const given = valueAt(input, [key]);
    const value = valueAt(parsed, [key]);
    const at = [...path, key];
    if (value === undefined) return [];
    if (given === undefined && defaultOf(field) !== undefined) return [at];
    return defaultedPaths(field, given, value, at);
  });
};
