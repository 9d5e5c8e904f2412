/** Any JSON value. */
export type Json =
  | null
  | boolean
  | number
  | string
  | readonly Json[]
  | { readonly [key: string]: Json };

type Step = string | number;

/** `patient.layers[2].thickness_mm` → `['patient', 'layers', 2, 'thickness_mm']`. */
export const pathSteps = (path: string): Step[] =>
  [...path.matchAll(/[^.[\]]+/g)].map(([step], i) =>
    i > 0 && /^\d+$/.test(step) && path.includes(`[${step}]`) ? Number(step) : step,
  );

const isObject = (json: unknown): json is { readonly [key: string]: Json } =>
  typeof json === 'object' && json !== null && !Array.isArray(json);

/** Own properties only: a file may hold keys such as `__proto__` or `constructor`. */
function child(json: unknown, step: Step): Json | undefined {
  if (Array.isArray(json)) return typeof step === 'number' ? json[step] : undefined;
  return isObject(json) && Object.hasOwn(json, step) ? json[step as string] : undefined;
}

/** What stands at a path; undefined where there is nothing. */
export const valueAtPath = (json: unknown, path: string): Json | undefined =>
  pathSteps(path).reduce<Json | undefined>(child, json as Json);

function replace(json: Json | undefined, steps: readonly Step[], value: Json | undefined): Json {
  const [step, ...rest] = steps;
  const next = rest.length > 0 ? replace(child(json, step), rest, value) : value;
  if (typeof step === 'number') {
    const items = Array.isArray(json) ? [...json] : [];
    if (next === undefined) items.splice(step, 1);
    else items[step] = next;
    return items;
  }
  const entries = isObject(json) ? Object.entries(json).filter(([key]) => key !== step) : [];
  if (next === undefined) return Object.fromEntries(entries);
  const position = isObject(json) ? Object.keys(json).indexOf(step) : -1;
  entries.splice(position < 0 ? entries.length : position, 0, [step, next]);
  return Object.fromEntries(entries);
}

/**
 * The same document with another value at a path; objects and lists on the way are made where they
 * are missing and copied where they are not. `undefined` takes the key or item away.
 */
export const withValueAt = (json: Json, path: string, value: Json | undefined): Json =>
  replace(json, pathSteps(path), value);
