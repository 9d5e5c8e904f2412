import { z } from 'zod';
import { d, fileName, name, positive, potential_kV } from './common.js';

export const modeSchema = z.enum(['radiography', 'fluoroscopy', 'subtraction']);

export const fixedSchema = z.union([
  z.literal('shortest'),
  z.strictObject({ exposureTime_ms: positive.describe('Exposure time of one frame, ms.') }),
  z.strictObject({ tubeCurrent_mA: positive.describe('Tube current, mA.') }),
]);

const acquisition = d.technique.acquisition;
export const acquisitionSchema = z.strictObject({
  mode: modeSchema.default(acquisition.mode).describe('Mode in which the room runs.'),
  frames: z.int().min(1).max(100000).default(acquisition.frames).describe('Images of one run.'),
  frameRate_per_s: z
    .number()
    .positive()
    .max(1000)
    .default(acquisition.frameRate_per_s)
    .describe('Frames per second.'),
  maskFrames: z
    .int()
    .min(0)
    .max(10000)
    .default(acquisition.maskFrames)
    .describe('Frames averaged into the mask; at least 1 in subtraction, where 1 is the default.'),
  fixed: fixedSchema
    .default(acquisition.fixed)
    .describe(
      'How the tube load of a frame is split: at a fixed exposure time, at a fixed tube current, or in the shortest time the tube allows.',
    ),
});

export const curveRowSchema = z.strictObject({
  thickness_mm: positive.describe('Patient thickness, mm.'),
  potential_kV: potential_kV.describe('Tube potential at that thickness, kV.'),
  tubeCurrent_mA: positive.describe('Tube current, mA.'),
  exposureTime_ms: positive.describe('Exposure time of one frame, ms.'),
  filter: name.describe('Filter, one of room.filters.'),
});

export const controlSchema = z.union([
  z.strictObject({
    detectorAirKerma_uGy: positive.describe(
      'Holds detector air kerma per frame, µGy: primary and scatter, behind the grid, before the detector cover, field centre.',
    ),
  }),
  z.strictObject({
    detectorSignal: z
      .number()
      .positive()
      .max(1e30)
      .describe(
        'Holds detector signal per frame at the field centre: keV absorbed per mm², or counts per mm² where the detector counts.',
      ),
  }),
  z.strictObject({
    incidentAirKerma_mGy: positive.describe('Holds incident air kerma per frame, mGy.'),
  }),
  z.strictObject({ tubeLoad_mAs: positive.describe('Holds tube load per frame, mAs.') }),
  z.strictObject({
    curve: fileName.describe(
      "CSV file beside the case with the control's measured curve: thickness_mm, potential_kV, tubeCurrent_mA, exposureTime_ms, filter.",
    ),
    rows: z
      .array(curveRowSchema)
      .max(10000)
      .optional()
      .describe('Rows of the curve, ascending in thickness; read from the file where left out.'),
  }),
]);

export const techniqueSchema = z.strictObject({
  name: name.describe('Name of the technique, unlike every other.'),
  potential_kV: potential_kV.describe('Tube potential, kV.'),
  filter: name.default(d.technique.filter).describe('Added filter, one of room.filters.'),
  grid: z
    .enum(['in', 'out'])
    .default(d.technique.grid)
    .describe('Whether the grid is in the beam; out by default in a room without one.'),
  acquisition: acquisitionSchema.prefault({}).describe('How frames are taken.'),
  control: controlSchema.describe(
    'What the exposure control holds as patients differ, or its curve.',
  ),
});
