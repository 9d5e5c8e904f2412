import { z } from 'zod';
import { d, remark, type slab } from './schema/common.js';
import { agentComparedSchema, type agentSchema, userMaterialSchema } from './schema/materials.js';
import { patientSchema, type sizeSchema } from './schema/patient.js';
import { roomSchema } from './schema/room.js';
import { taskSchema } from './schema/task.js';
import { type modeSchema, techniqueSchema } from './schema/technique.js';
import {
  compareSchema,
  measuredCheckSchema,
  monitoringSchema,
  priorSchema,
} from './schema/weighing.js';

export * from './schema/materials.js';
export * from './schema/patient.js';
export * from './schema/room.js';
export * from './schema/rules.js';
export * from './schema/task.js';
export * from './schema/technique.js';
export * from './schema/tube.js';
export * from './schema/weighing.js';

/**
 * The case file, version 1, as a zod schema: the one description from which the parser, the `Case`
 * type and the shipped JSON Schema are made. Bounds are those of the models (tube 20–150 kV, anode
 * 6–22°) or keep nonsense out; none is a law. What one key asks of another is in `rules/`.
 */
export const caseSchema = z.strictObject({
  format: z.literal('stratabeam.case').describe('Tells a case file from others.'),
  version: z.literal(1).describe('Version of the case format.'),
  title: z
    .string()
    .max(500)
    .default(d.title)
    .describe('Heading of results and dossier; no patient identifiers.'),
  question: remark.default(d.question).describe('The question the case is to answer.'),
  materials: z
    .array(userMaterialSchema)
    .max(100)
    .default(d.materials)
    .describe("Materials of the case's own."),
  room: roomSchema.prefault({}).describe('What the equipment is and can do.'),
  patient: patientSchema.describe('The patient as slabs, and the size mix.'),
  task: taskSchema.describe('What must be seen, and against what.'),
  techniques: z
    .array(techniqueSchema)
    .min(1)
    .max(20)
    .describe('The first is Current, the others Proposed.'),
  compare: compareSchema.prefault({}).describe('What leads the comparison.'),
  agentsCompared: z
    .array(agentComparedSchema)
    .max(50)
    .default(d.agentsCompared)
    .describe('Agents to set side by side.'),
  priors: z.array(priorSchema).max(100).default(d.priors).describe('Spread of uncertain inputs.'),
  measuredChecks: z
    .array(measuredCheckSchema)
    .max(1000)
    .default(d.measuredChecks)
    .describe('Measurements set against predictions.'),
  monitoring: monitoringSchema
    .nullable()
    .default(d.monitoring)
    .describe('How the change is watched; null: none.'),
  dossier: z
    .strictObject({
      text: z
        .record(z.string().max(100), z.string().max(20000))
        .default({})
        .describe('Prose of the dossier by section name.'),
    })
    .prefault({})
    .describe('What the dossier says in words.'),
});

/** A whole case after parsing: every key present, defaults filled in. */
export type Case = z.output<typeof caseSchema>;
export type UserMaterial = Case['materials'][number];
export type Room = Case['room'];
export type Tube = Room['tube'];
export type Reading = Room['readings'][number];
export type Source = NonNullable<Room['source']>;
export type Rule = Room['rules'][number];
export type Grid = NonNullable<Room['grid']>;
export type Detector = Room['detector'];
export type Geometry = Room['geometry'];
export type Slab = z.output<typeof slab>;
export type Filter = Room['filters'][number];
export type Layer = Case['patient']['layers'][number];
export type Size = z.output<typeof sizeSchema>;
export type Agent = z.output<typeof agentSchema>;
export type Task = Case['task'];
export type Detail = Task['detail'];
export type Technique = Case['techniques'][number];
export type Control = Technique['control'];
export type Acquisition = Technique['acquisition'];
export type Mode = z.output<typeof modeSchema>;
