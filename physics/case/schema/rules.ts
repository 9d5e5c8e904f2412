import { z } from 'zod';
import { d, positive } from './common.js';
import { modeSchema } from './technique.js';

const segment = z.strictObject({
  from_kV: z.number().min(0).max(1000).describe('Least potential of the segment, kV.'),
  to_kV: z.number().min(0).max(1000).describe('Greatest potential of the segment, kV.'),
  points: z
    .array(z.tuple([z.number().min(0).max(1000), z.number().min(0).max(100)]))
    .min(1)
    .max(100)
    .describe(
      'Pairs of potential in kV and least first half-value layer in mm aluminium, ascending; between them along a straight line.',
    ),
});

const ruleOrigin = {
  source: z.string().min(1).max(1000).describe('Regulation or standard, with clause or table.'),
  date: z.string().max(100).describe('Date of the text relied on.'),
  provenance: z
    .enum(['measured', 'entered', 'assumed', 'published', 'recalled', 'computed'])
    .describe('How the limit came to be known; recalled or assumed text is never a pass.'),
};

export const ruleSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('minimum-hvl').describe('Least first half-value layer by potential.'),
    segments: z
      .array(segment)
      .min(1)
      .max(50)
      .describe('Ranges of potential; no value is carried across a gap between them.'),
    ...ruleOrigin,
  }),
  z.strictObject({
    kind: z.literal('kerma-rate').describe('Greatest incident air kerma rate.'),
    limit_mGy_per_min: positive.describe('Greatest incident air kerma rate, mGy/min.'),
    appliesTo: z
      .array(modeSchema)
      .min(1)
      .max(3)
      .default(d.room.kermaRate.appliesTo)
      .describe('Modes to which the limit applies.'),
    ...ruleOrigin,
  }),
]);
