import { type Fault, faultAt } from './fault.js';
import type { Path } from './printed.js';

/** Deeper than any case is; keeps every later walk of the value short. */
export const deepestNesting = 32;

const prototypeKeys = new Set(['__proto__', 'constructor', 'prototype']);

/**
 * What keeps a value from being plain JSON data: numbers that are not finite, keys that reach into
 * an object's prototype, half characters, functions and class instances, nesting deeper than 32. No faults means the
 * value can be walked, copied and hashed safely.
 */
export const plainJsonFaults = (value: unknown, path: Path = []): Fault[] => {
  if (value === null || typeof value === 'boolean') return [];
  if (typeof value === 'string') {
    return isWellFormed(value) ? [] : [faultAt(path, value, ...wellFormed)];
  }
  if (typeof value === 'number') {
    return Number.isFinite(value) ? [] : [faultAt(path, value, ...finite)];
  }
  if (typeof value !== 'object' || !(Array.isArray(value) || isPlain(value))) {
    return [faultAt(path, kindOf(value), ...data)];
  }
  if (path.length >= deepestNesting) return [faultAt(path, value, ...shallow)];
  if (Array.isArray(value)) {
    return Array.from(value, (item) => item ?? null).flatMap((item, index) =>
      plainJsonFaults(item, [...path, index]),
    );
  }
  return Object.entries(value).flatMap(([key, item]) => {
    if (prototypeKeys.has(key) || !isWellFormed(key)) {
      return [faultAt([...path, key], item, ...ordinary)];
    }
    return item === undefined ? [] : plainJsonFaults(item, [...path, key]);
  });
};

// Half a surrogate pair has no UTF-8, so it could neither be saved nor hashed.
const isWellFormed = (text: string): boolean => !/\p{Cs}/u.test(text);

const wellFormed = ['must be whole characters', 'enter the text again'] as const;
const finite = ['must be a finite number', 'enter a number a measurement could give'] as const;
const data = [
  'must be JSON data: text, number, true, false, null, list or object',
  'hand in the parsed case file',
] as const;
const shallow = [
  `must not nest deeper than ${deepestNesting} levels`,
  'take out the needless brackets',
] as const;
const ordinary = ['is not a key of a case', 'remove it'] as const;

const isPlain = (value: object): boolean => {
  const prototype: unknown = Object.getPrototypeOf(value);
  // An object from another realm (a worker, a frame) has that realm's Object.prototype.
  return prototype === null || Object.getPrototypeOf(prototype) === null;
};

const kindOf = (value: unknown): string =>
  typeof value === 'object' ? 'an instance of a class' : `a ${typeof value}`;
