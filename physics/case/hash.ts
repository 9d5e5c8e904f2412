import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import canonicalize from 'canonicalize';
import type { z } from 'zod';
import { proseKeys } from './assumed.js';
import { type ContextDefault, contextDefaultAt, contextDefaults } from './context-defaults.js';
import { type Path, printedPath } from './printed.js';
import { type Case, caseSchema } from './schema.js';
import { defaultOf, elementOf, isPrefilled, shapeFor } from './schema-walk.js';

/**
 * What tells one case from another: SHA-256, in hexadecimal, of the case in RFC 8785 canonical
 * JSON, without keys equal to their default and without prose (`title`, `question`,
 * `dossier.text`). Writing a default out, or adding optional keys to the format, keeps the hash.
 */
export const caseHash = (c: Case): string => {
  const essence = withoutDefaults(caseSchema, c, [], contextDefaults(c));
  return bytesToHex(sha256(utf8ToBytes(canonicalize(essence) ?? '')));
};

const withoutDefaults = (
  schema: z.core.$ZodType,
  value: unknown,
  path: Path,
  context: readonly ContextDefault[],
): unknown => {
  if (Array.isArray(value)) {
    const element = elementOf(schema);
    return value.map((item, index) => withoutDefaults(element, item, [...path, index], context));
  }
  if (value === null || typeof value !== 'object') return value;
  const shape = shapeFor(schema, value);
  const kept = Object.entries(value).flatMap(([key, item]): [string, unknown][] => {
    const at = [...path, key];
    const field = shape[key];
    if (item === undefined || proseKeys.has(printedPath(at))) return [];
    if (field === undefined) return [[key, item]];
    const usual = contextDefaultAt(context, at) ?? defaultOf(field);
    if (usual !== undefined && same(item, usual.value)) return [];
    const inner = withoutDefaults(field, item, at, context);
    return isPrefilled(field) && same(inner, {}) ? [] : [[key, inner]];
  });
  return Object.fromEntries(kept);
};

const same = (a: unknown, b: unknown): boolean => canonicalize(a) === canonicalize(b);
