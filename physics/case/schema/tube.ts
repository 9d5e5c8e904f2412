import { z } from 'zod';
import { d, energy_keV, fileName, name, positive, potential_kV, range, slab } from './common.js';

const potentialRange = z.strictObject({
  min: potential_kV,
  max: potential_kV,
  step: z.number().positive().max(130),
});

const tube = d.room.tube;
export const tubeSchema = z.strictObject({
  anodeAngle_deg: z.number().min(6).max(22).default(tube.anodeAngle_deg),
  ripple_percent: z.number().min(0).max(100).default(tube.ripple_percent),
  outputFactor: z.number().positive().max(10).default(tube.outputFactor),
  inherentFilter: z.array(slab).max(20).default(tube.inherentFilter),
  potential_kV: potentialRange.default(tube.potential_kV),
  power_kW: positive.default(tube.power_kW),
  current_mA: range.default(tube.current_mA),
  exposureTime_ms: range.default(tube.exposureTime_ms),
  focalSpot_mm: z.number().positive().max(10).default(tube.focalSpot_mm),
  /** Greatest power against exposure time, rows of the tube's rating chart, ascending in time. */
  rating: z
    .array(z.strictObject({ exposureTime_ms: positive, power_kW: positive }))
    .max(200)
    .default(tube.rating),
  /** Anode heat the tube may take in one run; null when not entered. */
  heatPerRun_kJ: positive.nullable().default(tube.heatPerRun_kJ),
});

const reading = d.room.reading;
export const readingSchema = z.strictObject({
  potential_kV,
  filter: name.default(reading.filter),
  halfValueLayer_mmAl: z
    .number()
    .positive()
    .max(50)
    .nullable()
    .default(reading.halfValueLayer_mmAl),
  airKerma_uGy_per_mAs: z
    .number()
    .positive()
    .max(1e5)
    .nullable()
    .default(reading.airKerma_uGy_per_mAs),
  distance_mm: z.number().min(100).max(10000).default(reading.distance_mm),
  relativeUncertainty_percent: z
    .number()
    .positive()
    .max(100)
    .default(reading.relativeUncertainty_percent),
});

export const sourceSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('monoenergetic'), energy_keV }),
  z.strictObject({
    kind: z.literal('lines'),
    /** Energy in keV and photons per mm² and mAs (or any relative weight). */
    lines: z
      .array(z.tuple([energy_keV, positive]))
      .min(1)
      .max(1000),
  }),
  z.strictObject({
    kind: z.literal('spectrum'),
    file: fileName,
    /** Filled from the file by the parser: energy in keV, photons per mm² per keV and mAs. */
    rows: z
      .array(z.tuple([z.number(), z.number()]))
      .max(100000)
      .optional(),
  }),
]);
