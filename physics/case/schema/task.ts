import { z } from 'zod';
import { d, fraction, materialName, name, nonNegative } from './common.js';
import { agentSchema } from './materials.js';

const detail = d.task.detail;
export const detailSchema = z.strictObject({
  shape: z
    .enum(['vessel', 'slab', 'coat', 'defect', 'insert'])
    .describe(
      "vessel: cylinder across the beam; slab: flat volume of agent; coat: agent on one or two walls; defect: absence of its layer's agent; insert: any material.",
    ),
  inLayer: name.describe('Name of the layer in which the detail lies.'),
  depthInLayer_mm: nonNegative
    .nullable()
    .default(detail.depthInLayer_mm)
    .describe("Detail's centre below the layer's entrance face as drawn, mm; null: the middle."),
  size_mm: z
    .number()
    .positive()
    .max(1000)
    .describe(
      'Diameter of a vessel, thickness per wall of a coat, otherwise thickness along the beam, mm.',
    ),
  length_mm: z
    .number()
    .positive()
    .max(1000)
    .default(detail.length_mm)
    .describe('Length over which the detail is seen, mm.'),
  width_mm: z
    .number()
    .positive()
    .max(1000)
    .nullable()
    .default(detail.width_mm)
    .describe('Second side of the area of anything but a vessel, mm; null: as length_mm.'),
  walls: z
    .union([z.literal(1), z.literal(2)])
    .default(detail.walls)
    .describe('Walls that a coat covers along the beam.'),
  reference: materialName
    .default(detail.reference)
    .describe(
      'What stands in the detail\'s place in the comparison image: "layer", the material around it, or a material such as blood.',
    ),
  fillingFraction: z
    .number()
    .positive()
    .max(1)
    .default(detail.fillingFraction)
    .describe('Share of the vessel’s path that is filled, 1 for full.'),
  material: materialName
    .nullable()
    .default(detail.material)
    .describe(
      'What an insert is made of, a defect is made of, or what carries the agent; null: none named.',
    ),
  agent: agentSchema
    .nullable()
    .default(detail.agent)
    .describe('Agent in the detail, with its amount; null for none.'),
});

const task = d.task;
export const taskSchema = z.strictObject({
  detail: detailSchema.describe('What must be seen.'),
  roseThreshold: z
    .number()
    .positive()
    .max(100)
    .default(task.roseThreshold)
    .describe('SdNR asked of the detail, usually 3 to 5.'),
  backgroundNoise_fraction: fraction
    .default(task.backgroundNoise_fraction)
    .describe('Anatomical background relative to the primary signal, for 1 mm² at the detector.'),
  subtractionResidual_fraction: fraction
    .default(task.subtractionResidual_fraction)
    .describe('Share of structure and background that subtraction leaves.'),
  motion_mm_per_s: z
    .number()
    .min(0)
    .max(10000)
    .default(task.motion_mm_per_s)
    .describe('Speed of the detail across the beam, mm/s; 0 for none.'),
});
