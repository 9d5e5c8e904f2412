import { z } from 'zod';
import { d, positive } from './common.js';
import { modeSchema } from './technique.js';

const segment = z.strictObject({
  from_kV: z.number().min(0).max(1000),
  to_kV: z.number().min(0).max(1000),
  /** Potential in kV and least first half-value layer in mm aluminium, ascending in kV. */
  points: z
    .array(z.tuple([z.number().min(0).max(1000), z.number().min(0).max(100)]))
    .min(1)
    .max(100),
});

const ruleOrigin = {
  source: z.string().min(1).max(1000),
  date: z.string().max(100),
  provenance: z.enum(['measured', 'entered', 'assumed', 'published', 'recalled', 'computed']),
};

export const ruleSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('minimum-hvl'),
    segments: z.array(segment).min(1).max(50),
    ...ruleOrigin,
  }),
  z.strictObject({
    kind: z.literal('kerma-rate'),
    limit_mGy_per_min: positive,
    appliesTo: z.array(modeSchema).min(1).max(3).default(d.room.kermaRate.appliesTo),
    ...ruleOrigin,
  }),
]);
