import { z } from 'zod';
import { d, fraction, materialName, name, positive } from './common.js';

/** A material of the case's own, by mass. */
export const userMaterialSchema = z.strictObject({
  name,
  density_g_per_cm3: z.number().positive().max(30),
  /** Chemical formula, `BaSO4`, in place of mass fractions; the parser fills these in from it. */
  formula: z.string().min(1).max(200).nullable().default(d.material.formula),
  massFractions: z
    .record(z.string().regex(/^[A-Z][a-z]?$/), fraction)
    .default(d.material.massFractions),
});

export const amountSchema = z.strictObject({
  value: z.number().min(0).max(1e5),
  unit: z.enum(['mg element/mL', 'mg compound/mL', 'mmol/mL', '% w/v']),
});

export const agentSchema = z.strictObject({
  name,
  amount: amountSchema,
  carrier: materialName.nullable().default(d.task.agent.carrier),
});

export const agentComparedSchema = agentSchema.extend({
  /** Toxic load per gram of element relative to iodine, where the user has a source for it. */
  toxicityFactor: positive.nullable().default(d.agentCompared.toxicityFactor),
  deliverable_mg_per_mL: positive.nullable().default(d.agentCompared.deliverable_mg_per_mL),
  source: z.string().max(1000).default(d.agentCompared.source),
});
