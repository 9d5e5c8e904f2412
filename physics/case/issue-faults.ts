import type { z } from 'zod';
import { type Fault, faultAt } from './fault.js';
import { nearestKey } from './nearest-key.js';
import { type Path, printedPath, printedValue, valueAt } from './printed.js';
import { remedyFor } from './remedies.js';
import { choiceRule, numberRule, typeRule, unionRule } from './rule-text.js';
import { schemaAt, shapeOf } from './schema-walk.js';

type Issue = z.core.$ZodIssue;
type Schema = z.core.$ZodType;

/** What was found wrong by the schema, one fault for each thing to put right. */
export const issueFaults = (
  schema: Schema,
  input: unknown,
  issues: readonly Issue[],
): readonly Fault[] => {
  const found = issues.flatMap((issue) => faultsOf(schema, input, issue));
  const renamed = new Set(found.flatMap(({ insteadOf }) => insteadOf ?? []));
  return found
    .filter(({ fault }) => !(fault.value === 'missing' && renamed.has(fault.path)))
    .map(({ fault }) => fault);
};

/** A fault, and the path it makes needless to report as missing. */
interface Found {
  readonly fault: Fault;
  readonly insteadOf?: string;
}

const pathOf = (issue: Issue): Path => issue.path as (string | number)[];

const faultsOf = (schema: Schema, input: unknown, issue: Issue): Found[] => {
  const path = pathOf(issue);
  const value = valueAt(input, path);
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => unknownKey(schema, input, path, key));
  }
  if (value === undefined)
    return [{ fault: faultAt(path, value, 'must be given', remedyFor(path)) }];
  if (issue.code === 'invalid_union' && issue.errors.length > 0) {
    return unionFaults(schema, input, issue);
  }
  return [{ fault: faultAt(path, value, ruleOf(schema, value, issue), adviceOf(issue, value)) }];
};

const ruleOf = (root: Schema, value: unknown, issue: Issue): string => {
  const schema = schemaAt(root, pathOf(issue));
  switch (issue.code) {
    case 'too_small':
    case 'too_big':
      if (issue.origin === 'string') return textRule(issue);
      if (issue.origin === 'array') return listRule(issue, schema);
      return schema ? numberRule(schema, value) : 'must be another number';
    case 'invalid_type':
      if (issue.expected === 'int' && schema) return numberRule(schema, value);
      return schema ? typeRule(schema) : `must be of type ${issue.expected}`;
    case 'invalid_value':
      return choiceRule(issue.values);
    case 'invalid_union':
      return choiceRule('options' in issue ? (issue.options as unknown[]) : []);
    case 'invalid_format':
      return 'must be printable text';
    case 'invalid_key':
      return 'must be named by an element symbol such as H or Ca';
    default:
      return 'must be as the case format says';
  }
};

const textRule = (issue: z.core.$ZodIssueTooSmall | z.core.$ZodIssueTooBig): string =>
  issue.code === 'too_small'
    ? 'must not be empty'
    : `must be at most ${issue.maximum} characters long`;

const listRule = (
  issue: z.core.$ZodIssueTooSmall | z.core.$ZodIssueTooBig,
  schema: Schema | undefined,
): string => {
  if (schema?._zod.def.type === 'tuple') {
    return `must hold exactly ${(schema._zod.def as z.core.$ZodTupleDef).items.length} values`;
  }
  return issue.code === 'too_small'
    ? `must hold at least ${issue.minimum}`
    : `must hold at most ${issue.maximum}`;
};

/** The remedy; for a mistyped choice the nearest one. */
const adviceOf = (issue: Issue, value: unknown): string => {
  const choices = issue.code === 'invalid_value' ? issue.values : [];
  const near =
    typeof value === 'string'
      ? nearestKey(
          value,
          choices.filter((choice) => typeof choice === 'string'),
        )
      : undefined;
  return near === undefined || choices.length === 1
    ? remedyFor(pathOf(issue))
    : `did you mean ${printedValue(near)}?`;
};

const unknownKey = (root: Schema, input: unknown, path: Path, key: string): Found => {
  const place = schemaAt(root, path);
  const known = Object.keys((place && shapeOf(place)) ?? {});
  const present = Object.keys((valueAt(input, path) as object | undefined) ?? {});
  const near = nearestKey(
    key,
    known.filter((candidate) => !present.includes(candidate)),
  );
  const where = path.length === 0 ? 'a case' : printedPath(path);
  const remedy = near === undefined ? `remove it; known keys: ${listed(known)}` : `write ${near}`;
  const fault = faultAt(
    [...path, key],
    valueAt(input, [...path, key]),
    `is not a key of ${where}`,
    remedy,
  );
  return near === undefined ? { fault } : { fault, insteadOf: printedPath([...path, near]) };
};

const listed = (keys: readonly string[]): string =>
  keys.length > 12 ? `${keys.slice(0, 12).join(', ')} …` : keys.join(', ');

/** Of a union's branches the one the value fits best; where none fits, the union itself. */
const unionFaults = (
  schema: Schema,
  input: unknown,
  issue: z.core.$ZodIssueInvalidUnion,
): Found[] => {
  const path = pathOf(issue);
  const value = valueAt(input, path);
  const [best] = issue.errors
    .map((issues) => ({ issues, misfit: misfit(value, issues) }))
    .sort((a, b) => a.misfit - b.misfit);
  if (best.misfit > 0) {
    const place = schemaAt(schema, path);
    const rule = place ? unionRule(place) : 'must be one of the forms of the case format';
    return [{ fault: faultAt(path, value, rule, remedyFor(path)) }];
  }
  return best.issues.flatMap((inner) =>
    faultsOf(schema, input, { ...inner, path: [...path, ...inner.path] } as Issue),
  );
};

/** How many of a branch's issues say that the value is of another branch. */
const misfit = (value: unknown, issues: readonly Issue[]): number =>
  issues.filter(
    (issue) =>
      issue.path.length === 0 ||
      (issue.path.length === 1 && valueAt(value, pathOf(issue)) === undefined),
  ).length;
