import { z } from 'zod';
import { d, fraction, materialName, name, positive } from './common.js';
import { agentSchema } from './materials.js';

export const layerSchema = z.strictObject({
  name: name.describe('Name of the layer, unlike every other.'),
  material: materialName.describe("Built-in material, element or one of the case's materials."),
  thickness_mm: z.number().positive().max(2000).describe('Thickness along the beam as drawn, mm.'),
  growthShare: fraction
    .nullable()
    .default(d.patient.layer.growthShare)
    .describe(
      'Share of a change in patient thickness that this layer takes; given in every layer they sum to 1. Null in every layer: each in proportion to its thickness.',
    ),
  agent: agentSchema
    .nullable()
    .default(d.patient.layer.agent)
    .describe('Agent mixed into the layer, with the material as its carrier; null: none.'),
});

export const sizeSchema = z.strictObject({
  name: name.describe('Name of the size, P50 or another.'),
  thickness_mm: z.number().positive().max(2000).describe('Thickness of the whole patient, mm.'),
  weight: z
    .number()
    .min(0)
    .max(1e9)
    .default(d.patient.size.weight)
    .describe('Share of patients of this size, on any scale.'),
});

export const patientSchema = z.strictObject({
  layers: z
    .array(layerSchema)
    .min(1)
    .max(100)
    .describe('Slabs from entrance to exit; their thicknesses sum to the patient as drawn.'),
  lateral_mm: z
    .tuple([positive, positive])
    .nullable()
    .default(d.patient.lateral_mm)
    .describe('Width and height of a finite body, mm; null: layers without lateral end.'),
  sizes: z
    .array(sizeSchema)
    .max(500)
    .default(d.patient.sizes)
    .describe('The size mix, or a CSV file of it; empty: one size, the layers as drawn.'),
});
