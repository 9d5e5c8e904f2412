import { z } from 'zod';
import { d, fraction, materialName, name, range, slab } from './common.js';
import { ruleSchema } from './rules.js';
import { readingSchema, sourceSchema, tubeSchema } from './tube.js';

const gridParts = d.room.gridParts;
export const gridSchema = z.strictObject({
  ratio: z.number().min(1).max(30),
  strips_per_cm: z.number().min(5).max(200),
  strip: z
    .strictObject({ material: materialName, thickness_um: z.number().positive().max(1000) })
    .default(gridParts.strip),
  interspace: z.strictObject({ material: materialName }).default(gridParts.interspace),
  cover: z.array(slab).max(10).default(gridParts.cover),
  /** The user's own transmissions, which replace the model's; null where not measured. */
  measured: z
    .strictObject({ primaryTransmission: fraction, scatterTransmission: fraction })
    .nullable()
    .default(gridParts.measured),
});

const detector = d.room.detector;
export const detectorSchema = z.strictObject({
  material: materialName.default(detector.material),
  arealDensity_mg_per_cm2: z.number().positive().max(1e5).default(detector.arealDensity_mg_per_cm2),
  response: z.enum(['energy-integrating', 'counting']).default(detector.response),
  countingThreshold_keV: z.number().min(0).max(150).default(detector.countingThreshold_keV),
  opticalSwank: z.number().positive().max(1).default(detector.opticalSwank),
  electronicNoiseKerma_uGy: z.number().min(0).max(100).default(detector.electronicNoiseKerma_uGy),
  electronicNoiseBeam: z
    .enum(['RQA2', 'RQA3', 'RQA4', 'RQA5', 'RQA6', 'RQA7', 'RQA8', 'RQA9', 'RQA10'])
    .default(detector.electronicNoiseBeam),
  structureNoise_fraction: fraction.default(detector.structureNoise_fraction),
  glare_fraction: z.number().min(0).max(0.9).default(detector.glare_fraction),
  pixel_mm: z.number().positive().max(10).default(detector.pixel_mm),
  airKerma_uGy: range.default(detector.airKerma_uGy),
});

const geometry = d.room.geometry;
export const geometrySchema = z.strictObject({
  beam: z.enum(['point', 'parallel']).default(geometry.beam),
  sourceToDetector_mm: z.number().min(100).max(10000).default(geometry.sourceToDetector_mm),
  anchor: z.enum(['detector', 'table', 'isocentre']).default(geometry.anchor),
  exitToDetector_mm: z.number().min(0).max(5000).default(geometry.exitToDetector_mm),
  /** Width and height at the detector. */
  field_mm: z
    .tuple([z.number().positive().max(2000), z.number().positive().max(2000)])
    .default([geometry.field_mm[0], geometry.field_mm[1]]),
  minSourceToSkin_mm: z.number().min(0).max(5000).default(geometry.minSourceToSkin_mm),
  referencePoint_mm: z.number().min(50).max(10000).default(geometry.referencePoint_mm),
  /** Air between tube, patient and detector; false is vacuum. */
  air: z.boolean().default(geometry.air),
});

export const filterSchema = z.strictObject({ name, layers: z.array(slab).max(10) });

export const roomSchema = z.strictObject({
  name: name.default(d.room.name),
  tube: tubeSchema.prefault({}),
  /** Replaces the tube's spectrum when given. */
  source: sourceSchema.nullable().default(d.room.source),
  readings: z.array(readingSchema).max(500).default(d.room.readings),
  filters: z
    .array(filterSchema)
    .min(1)
    .max(100)
    .default([{ name: 'none', layers: [] }]),
  support: z
    .array(
      z.strictObject({
        material: materialName,
        thickness_mm: z.number().min(0).max(500),
        side: z.enum(['entrance', 'exit']).default(d.room.supportSlab.side),
      }),
    )
    .max(10)
    .default(d.room.support),
  geometry: geometrySchema.prefault({}),
  grid: gridSchema.nullable().default(d.room.grid),
  detector: detectorSchema.prefault({}),
  rules: z.array(ruleSchema).max(50).default(d.room.rules),
});
