import { z } from 'zod';
import { caseSchema } from './schema.js';

/**
 * JSON Schema (draft 2020-12) of the case file as people write it, for editors that check while one
 * types. It knows types and bounds; what one key asks of another only `parseCase` knows.
 */
export const caseJsonSchema = (): object => {
  const schema = z.toJSONSchema(caseSchema, {
    io: 'input',
    target: 'draft-2020-12',
    override: ({ zodSchema, jsonSchema }) => {
      if (zodSchema === caseSchema.shape.patient.shape.sizes) allowFile(jsonSchema);
    },
  });
  return { title: 'Stratabeam case, version 1', ...schema };
};

/** The parser puts the rows of a size file in the file's place, so the schema knows only rows. */
const allowFile = (sizes: z.core.JSONSchema.BaseSchema): void => {
  const { default: fallback, description, ...list } = { ...sizes };
  for (const key of Object.keys(sizes)) delete sizes[key];
  const file = {
    type: 'string',
    minLength: 1,
    maxLength: 200,
    description: 'CSV file beside the case: thickness_mm, weight.',
  } as const;
  sizes.default = fallback;
  sizes.description = description;
  sizes.anyOf = [
    list,
    { type: 'object', properties: { file }, required: ['file'], additionalProperties: false },
  ];
};
