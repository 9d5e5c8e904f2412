import { z } from 'zod';
import { d, fraction, materialName, name, nonNegative } from './common.js';
import { agentSchema } from './materials.js';

const detail = d.task.detail;
export const detailSchema = z.strictObject({
  shape: z.enum(['vessel', 'slab', 'coat', 'defect', 'insert']),
  inLayer: name,
  /** Depth of the detail's centre below the layer's entrance face; null: the middle. */
  depthInLayer_mm: nonNegative.nullable().default(detail.depthInLayer_mm),
  /** Diameter of a vessel, thickness per wall of a coat, otherwise thickness along the beam. */
  size_mm: z.number().positive().max(1000),
  length_mm: z.number().positive().max(1000).default(detail.length_mm),
  /** Second side of the area of anything but a vessel; null: square, `length_mm` a side. */
  width_mm: z.number().positive().max(1000).nullable().default(detail.width_mm),
  walls: z.union([z.literal(1), z.literal(2)]).default(detail.walls),
  /** What stands in the detail's place in the comparison image: 'layer' or a material. */
  reference: materialName.default(detail.reference),
  fillingFraction: z.number().positive().max(1).default(detail.fillingFraction),
  /** The material of an insert. */
  material: materialName.nullable().default(detail.material),
  agent: agentSchema.nullable().default(detail.agent),
});

const task = d.task;
export const taskSchema = z.strictObject({
  detail: detailSchema,
  roseThreshold: z.number().positive().max(100).default(task.roseThreshold),
  backgroundNoise_fraction: fraction.default(task.backgroundNoise_fraction),
  subtractionResidual_fraction: fraction.default(task.subtractionResidual_fraction),
  motion_mm_per_s: z.number().min(0).max(10000).default(task.motion_mm_per_s),
});
