import { z } from 'zod';
import { d, fraction, materialName, name, positive } from './common.js';

/** A material of the case's own, by mass. */
export const userMaterialSchema = z.strictObject({
  name: name.describe("Name by which the case calls it; none of the built-in materials' names."),
  density_g_per_cm3: z.number().positive().max(30).describe('Density in g/cm³.'),
  formula: z
    .string()
    .min(1)
    .max(200)
    .nullable()
    .default(d.material.formula)
    .describe('Chemical formula such as BaSO4, in place of massFractions.'),
  massFractions: z
    .record(z.string().regex(/^[A-Z][a-z]?$/), fraction)
    .default(d.material.massFractions)
    .describe('Share of the mass by element symbol; sums to 1. Follows from formula where given.'),
});

export const amountSchema = z.strictObject({
  value: z.number().min(0).max(1e5).describe('Amount in its unit.'),
  unit: z
    .enum(['mg element/mL', 'mg compound/mL', 'mmol/mL', '% w/v'])
    .describe(
      'Unit of the amount: mass of the attenuating element, mass or moles of the compound, or grams of compound per 100 mL.',
    ),
});

export const agentSchema = z.strictObject({
  name: name.describe(
    'Agent: iodine, barium sulfate, gadolinium chelate, carbon dioxide and others.',
  ),
  amount: amountSchema.describe('How much agent one mL holds, as it is in the lumen.'),
  carrier: materialName
    .nullable()
    .default(d.task.agent.carrier)
    .describe("Material that carries the agent; null: the agent's own."),
});

export const agentComparedSchema = agentSchema.extend({
  toxicityFactor: positive
    .nullable()
    .default(d.agentCompared.toxicityFactor)
    .describe(
      'Toxic load per gram of element relative to iodine, where a source is at hand; null: none entered.',
    ),
  deliverable_mg_per_mL: positive
    .nullable()
    .default(d.agentCompared.deliverable_mg_per_mL)
    .describe(
      'Greatest concentration that can be delivered, mg of element per mL; null: none entered.',
    ),
  source: z
    .string()
    .max(1000)
    .default(d.agentCompared.source)
    .describe('Where toxicityFactor and deliverable_mg_per_mL come from.'),
});
