import { z } from 'zod';
import { d, fraction, materialName, name, positive } from './common.js';
import { agentSchema } from './materials.js';

export const layerSchema = z.strictObject({
  name,
  material: materialName,
  thickness_mm: z.number().positive().max(2000),
  /** Share of a size change that this layer takes; null in all layers: in proportion to thickness. */
  growthShare: fraction.nullable().default(d.patient.layer.growthShare),
  agent: agentSchema.nullable().default(d.patient.layer.agent),
});

export const sizeSchema = z.strictObject({
  name,
  thickness_mm: z.number().positive().max(2000),
  weight: z.number().min(0).max(1e9).default(d.patient.size.weight),
});

export const patientSchema = z.strictObject({
  /** Entrance to exit. */
  layers: z.array(layerSchema).min(1).max(100),
  /** Width and height of a finite body; null: laterally infinite layers. */
  lateral_mm: z.tuple([positive, positive]).nullable().default(d.patient.lateral_mm),
  /** Empty: one size, the layers as drawn. */
  sizes: z.array(sizeSchema).max(500).default(d.patient.sizes),
});
