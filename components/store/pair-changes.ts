import { type Json, valueAtPath, withValueAt } from './path.js';

const at = (path: string, key: string | number): string =>
  typeof key === 'number' ? `${path}[${key}]` : `${path}.${key}`;

/**
 * One of two values that are given together or not at all: with both emptied (`null`) the pair is
 * null; with one emptied it is left out, which is a fault until it is entered or both are emptied.
 *
 * @param keys names of an object, or 0 and 1 of a list.
 */
export const setInPair =
  (
    path: string,
    keys: readonly [string, string] | readonly [0, 1],
    index: 0 | 1,
    value: Json,
  ): ((document: Json) => Json) =>
  (document) => {
    const pair = keys.map((key, i) =>
      i === index ? value : (valueAtPath(document, at(path, key)) ?? null),
    );
    if (pair.every((entry) => entry === null)) return withValueAt(document, path, null);
    const [first] = keys;
    const given = keys.flatMap((key, i) => (pair[i] === null ? [] : [[key, pair[i]] as const]));
    return withValueAt(
      document,
      path,
      typeof first === 'number' ? pair : Object.fromEntries(given),
    );
  };
