import { z } from 'zod';
import { d, fileName, name, positive, potential_kV } from './common.js';

export const modeSchema = z.enum(['radiography', 'fluoroscopy', 'subtraction']);

export const fixedSchema = z.union([
  z.literal('shortest'),
  z.strictObject({ exposureTime_ms: positive }),
  z.strictObject({ tubeCurrent_mA: positive }),
]);

const acquisition = d.technique.acquisition;
export const acquisitionSchema = z.strictObject({
  mode: modeSchema.default(acquisition.mode),
  frames: z.int().min(1).max(100000).default(acquisition.frames),
  frameRate_per_s: z.number().positive().max(1000).default(acquisition.frameRate_per_s),
  maskFrames: z.int().min(0).max(10000).default(acquisition.maskFrames),
  fixed: fixedSchema.default(acquisition.fixed),
});

export const curveRowSchema = z.strictObject({
  thickness_mm: positive,
  potential_kV,
  tubeCurrent_mA: positive,
  exposureTime_ms: positive,
  filter: name,
});

export const controlSchema = z.union([
  z.strictObject({ detectorAirKerma_uGy: positive }),
  z.strictObject({ detectorSignal: z.number().positive().max(1e30) }),
  z.strictObject({ incidentAirKerma_mGy: positive }),
  z.strictObject({ tubeLoad_mAs: positive }),
  z.strictObject({
    curve: fileName,
    /** Filled from the file by the parser, ascending in thickness. */
    rows: z.array(curveRowSchema).max(10000).optional(),
  }),
]);

export const techniqueSchema = z.strictObject({
  name,
  potential_kV,
  filter: name.default(d.technique.filter),
  grid: z.enum(['in', 'out']).default(d.technique.grid),
  acquisition: acquisitionSchema.prefault({}),
  control: controlSchema,
});
