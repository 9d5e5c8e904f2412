import type { z } from 'zod';
import type { Path } from './printed.js';

type Schema = z.core.$ZodType;

/** What a schema describes once default, prefault, nullable and optional are taken off. */
export const bareSchema = (schema: Schema): Schema => {
  const { def } = schema._zod;
  return 'innerType' in def ? bareSchema(def.innerType as Schema) : schema;
};

/** The keys an object schema knows and their schemas; `undefined` for anything else. */
export const shapeOf = (schema: Schema): Readonly<Record<string, Schema>> | undefined => {
  const { def } = bareSchema(schema)._zod;
  return def.type === 'object' ? (def as z.core.$ZodObjectDef).shape : undefined;
};

const isUnion = (def: z.core.$ZodTypeDef): def is z.core.$ZodUnionDef => def.type === 'union';

/** The alternatives of a union, else the schema alone. */
export const alternatives = (schema: Schema): readonly Schema[] => {
  const { def } = bareSchema(schema)._zod;
  return isUnion(def) ? def.options.flatMap(alternatives) : [bareSchema(schema)];
};

const steppedInto = (schema: Schema, key: string | number): Schema | undefined => {
  const { def } = schema._zod;
  if (def.type === 'object') return (def as z.core.$ZodObjectDef).shape[key];
  if (def.type === 'array') return (def as z.core.$ZodArrayDef).element;
  if (def.type === 'tuple') return (def as z.core.$ZodTupleDef).items[Number(key)];
  if (def.type === 'record') return (def as z.core.$ZodRecordDef).valueType;
  return undefined;
};

/** The bare schema in charge of a path; of a union's branches the first that knows the key. */
export const schemaAt = (root: Schema, path: Path): Schema | undefined =>
  path.reduce<Schema | undefined>((schema, key) => {
    const found = alternatives(schema ?? root).map((option) =>
      schema === undefined ? undefined : steppedInto(option, key),
    );
    const next = found.find((candidate) => candidate !== undefined);
    return next === undefined ? undefined : bareSchema(next);
  }, bareSchema(root));

/** The value a key takes when the file is silent; `undefined` where the file must speak. */
export const defaultOf = (schema: Schema): { readonly value: unknown } | undefined => {
  const { def } = schema._zod;
  if (def.type === 'default') return { value: (def as z.core.$ZodDefaultDef).defaultValue };
  return undefined;
};

/** True where silence means "an object, all of whose keys take their own defaults". */
export const isPrefilled = (schema: Schema): boolean => schema._zod.def.type === 'prefault';

/** What the items of a list are; anything else is itself. */
export const elementOf = (schema: Schema): Schema => {
  const { def } = bareSchema(schema)._zod;
  return def.type === 'array' ? (def as z.core.$ZodArrayDef).element : schema;
};

/** The keys a value may have: of a union's branches, those of the one that knows all its keys. */
export const shapeFor = (schema: Schema, value: object): Readonly<Record<string, Schema>> => {
  const shapes = alternatives(schema).map((branch) => shapeOf(branch) ?? {});
  return shapes.find((shape) => Object.keys(value).every((key) => Object.hasOwn(shape, key))) ?? {};
};
