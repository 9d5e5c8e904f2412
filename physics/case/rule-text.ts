import type { z } from 'zod';
import { printedValue } from './printed.js';
import { alternatives, bareSchema, shapeOf } from './schema-walk.js';

/** The rules of the schema in words: `must be 6 to 22`. */

/** Bounds at or beyond this keep nonsense out and are told only to who exceeds them. */
const farAway = 1e4;

interface Bounds {
  readonly low?: number;
  readonly lowIsExcluded: boolean;
  readonly high?: number;
}

const boundsOf = (schema: z.core.$ZodType): Bounds => {
  const checks = (schema._zod.def.checks ?? []).map((check) => check._zod.def);
  const low = checks.find((check) => check.check === 'greater_than') as
    | z.core.$ZodCheckGreaterThanDef
    | undefined;
  const high = checks.find((check) => check.check === 'less_than') as
    | z.core.$ZodCheckLessThanDef
    | undefined;
  return {
    low: low && Number(low.value),
    lowIsExcluded: low?.inclusive === false,
    high: high && Number(high.value),
  };
};

/** What a number must be, as told to who handed in `value`. */
export const numberRule = (schema: z.core.$ZodType, value: unknown): string => {
  const { low, lowIsExcluded, high } = boundsOf(schema);
  const whole = isWhole(schema) ? 'a whole number, ' : '';
  const isTooHigh = typeof value === 'number' && high !== undefined && value > high;
  if (low === undefined || high === undefined) return typeRule(schema);
  if (isTooHigh && high >= farAway) return `must be at most ${high}`;
  if (isTooHigh && lowIsExcluded) return `must be above ${low} and at most ${high}`;
  if (lowIsExcluded) return 'must be positive';
  if (high < farAway) return `must be ${whole}${low} to ${high}`;
  if (whole !== '') return `must be a whole number, at least ${low}`;
  return low === 0 ? 'must not be negative' : `must be at least ${low}`;
};

/** What a value of the wrong type should have been. */
export const typeRule = (schema: z.core.$ZodType): string => {
  const { def } = schema._zod;
  if (def.type !== 'number') return `must be ${kinds[def.type] ?? 'of another type'}`;
  const { low, lowIsExcluded, high } = boundsOf(schema);
  const kind = isWhole(schema) ? 'a whole number' : 'a number';
  const isTold = low !== undefined && high !== undefined && high < farAway && !lowIsExcluded;
  return isTold ? `must be ${kind}, ${low} to ${high}` : `must be ${kind}`;
};

const isWhole = (schema: z.core.$ZodType): boolean =>
  (schema._zod.def as { format?: string }).format === 'safeint';

const kinds: Readonly<Record<string, string>> = {
  string: 'text',
  boolean: 'true or false',
  object: 'an object',
  record: 'an object',
  array: 'a list',
  tuple: 'a list',
  enum: 'text',
};

/** `must be 1 or 2`, `must be one of "in", "out"`. */
export const choiceRule = (values: readonly unknown[]): string => {
  const printed = values.map(printedValue);
  if (printed.length === 1) return `must be ${printed[0]}`;
  if (printed.length === 2) return `must be ${printed.join(' or ')}`;
  return `must be one of ${printed.join(', ')}`;
};

/** What a value that fits no branch of a union should have been. */
export const unionRule = (schema: z.core.$ZodType): string => {
  const branches = alternatives(schema).map((branch) => bareSchema(branch));
  const literals = branches.flatMap((branch) =>
    branch._zod.def.type === 'literal'
      ? (branch._zod.def as z.core.$ZodLiteralDef<never>).values
      : [],
  );
  const keys = branches.map((branch) => Object.keys(shapeOf(branch) ?? {})[0]).filter(Boolean);
  if (keys.length === 0) return choiceRule(literals);
  const holding = `hold exactly one of ${keys.join(', ')}`;
  if (literals.length === 0) return `must ${holding}`;
  return `must be ${literals.map(printedValue).join(' or ')} or ${holding}`;
};
