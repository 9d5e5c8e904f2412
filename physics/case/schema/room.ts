import { z } from 'zod';
import { d, fraction, materialName, name, range, slab } from './common.js';
import { ruleSchema } from './rules.js';
import { readingSchema, sourceSchema, tubeSchema } from './tube.js';

const { strip, ...gridParts } = d.room.gridParts;
export const gridSchema = z.strictObject({
  ratio: z.number().min(1).max(30).describe('Strip height over gap between strips, 10 for 10:1.'),
  strips_per_cm: z.number().min(5).max(200).describe('Strips per cm.'),
  strip: z
    .strictObject({
      material: materialName.default(strip.material).describe('Material of the strips.'),
      thickness_um: z
        .number()
        .positive()
        .max(1000)
        .default(strip.thickness_um)
        .describe('Thickness of a strip, µm.'),
    })
    .prefault({})
    .describe('The absorbing strips.'),
  interspace: z
    .strictObject({ material: materialName.describe('Material between the strips.') })
    .default(gridParts.interspace)
    .describe('What fills the gaps between strips.'),
  cover: z
    .array(slab)
    .max(10)
    .default(gridParts.cover)
    .describe('Cover sheets, front and back together.'),
  measured: z
    .strictObject({
      primaryTransmission: fraction.describe('Measured transmission of primary, a fraction.'),
      scatterTransmission: fraction.describe('Measured transmission of scatter, a fraction.'),
    })
    .nullable()
    .default(gridParts.measured)
    .describe("Measured transmissions, which replace the model's; null: not measured."),
});

const detector = d.room.detector;
export const detectorSchema = z.strictObject({
  material: materialName
    .default(detector.material)
    .describe('Absorber; "ideal" absorbs every photon whole and adds no noise.'),
  arealDensity_mg_per_cm2: z
    .number()
    .positive()
    .max(1e5)
    .default(detector.arealDensity_mg_per_cm2)
    .describe('Mass of absorber per area, mg/cm²: thickness × density × packing.'),
  response: z
    .enum(['energy-integrating', 'counting'])
    .default(detector.response)
    .describe('Whether the signal is absorbed energy or a count of photons.'),
  countingThreshold_keV: z
    .number()
    .min(0)
    .max(150)
    .default(detector.countingThreshold_keV)
    .describe('Least energy that is counted, keV; only where response is counting.'),
  opticalSwank: z
    .number()
    .positive()
    .max(1)
    .default(detector.opticalSwank)
    .describe('Swank factor of light spread and gain, 1 for none; divides the quantum variance.'),
  electronicNoiseKerma_uGy: z
    .number()
    .min(0)
    .max(100)
    .default(detector.electronicNoiseKerma_uGy)
    .describe(
      'Detector air kerma at which electronic noise equals quantum noise, in the beam electronicNoiseBeam, µGy per frame.',
    ),
  electronicNoiseBeam: z
    .enum(['RQA2', 'RQA3', 'RQA4', 'RQA5', 'RQA6', 'RQA7', 'RQA8', 'RQA9', 'RQA10'])
    .default(detector.electronicNoiseBeam)
    .describe('Reference beam in which electronicNoiseKerma_uGy holds.'),
  structureNoise_fraction: fraction
    .default(detector.structureNoise_fraction)
    .describe('Fixed-pattern noise relative to the signal, for 1 mm² at the detector.'),
  glare_fraction: z
    .number()
    .min(0)
    .max(0.9)
    .default(detector.glare_fraction)
    .describe('Share of the signal spread over the whole field as veiling glare.'),
  pixel_mm: z.number().positive().max(10).default(detector.pixel_mm).describe('Pixel pitch, mm.'),
  airKerma_uGy: range
    .default(detector.airKerma_uGy)
    .describe('Least and greatest detector air kerma per frame that the detector takes, µGy.'),
});

const geometry = d.room.geometry;
export const geometrySchema = z.strictObject({
  beam: z
    .enum(['point', 'parallel'])
    .default(geometry.beam)
    .describe('A point source with inverse square, or a parallel beam without.'),
  sourceToDetector_mm: z
    .number()
    .min(100)
    .max(10000)
    .default(geometry.sourceToDetector_mm)
    .describe('Focal spot to detector, mm; the same for every size.'),
  anchor: z
    .enum(['detector', 'table', 'isocentre'])
    .default(geometry.anchor)
    .describe(
      'What stays as patients differ in thickness: the gap to the detector, the distance from source to skin (table), or the middle of the patient (isocentre).',
    ),
  exitToDetector_mm: z
    .number()
    .min(0)
    .max(5000)
    .default(geometry.exitToDetector_mm)
    .describe('Patient exit to detector for the patient as drawn, mm.'),
  field_mm: z
    .tuple([z.number().positive().max(2000), z.number().positive().max(2000)])
    .default([geometry.field_mm[0], geometry.field_mm[1]])
    .describe('Width and height of the field at the detector, mm.'),
  minSourceToSkin_mm: z
    .number()
    .min(0)
    .max(5000)
    .default(geometry.minSourceToSkin_mm)
    .describe('Least distance from focal spot to skin allowed, mm.'),
  referencePoint_mm: z
    .number()
    .min(50)
    .max(10000)
    .default(geometry.referencePoint_mm)
    .describe(
      'Focal spot to the point at which reference air kerma and kerma–area product are stated, in free air before any support, mm.',
    ),
  air: z
    .boolean()
    .default(geometry.air)
    .describe('Air between tube, patient and detector, and at the readings; false: vacuum.'),
});

export const filterSchema = z.strictObject({
  name: name.describe('Name by which techniques, readings and curves call the filter.'),
  layers: z.array(slab).max(10).describe('Its sheets; empty for no filter.'),
});

export const supportSlabSchema = z.strictObject({
  material: materialName.describe('Material of the table, pad or cover.'),
  thickness_mm: z.number().min(0).max(500).describe('Thickness along the beam, mm.'),
  side: z
    .enum(['entrance', 'exit'])
    .default(d.room.supportSlab.side)
    .describe('On which side of the patient it stands in the beam.'),
});

export const roomSchema = z.strictObject({
  name: name.default(d.room.name).describe('Name of the room; no patient identifiers.'),
  tube: tubeSchema.prefault({}).describe('Tube and generator.'),
  source: sourceSchema
    .nullable()
    .default(d.room.source)
    .describe("Spectrum in place of the tube's; null: the tube."),
  readings: z
    .array(readingSchema)
    .max(500)
    .default(d.room.readings)
    .describe(
      "The room's own half-value layers and outputs, which calibrate inherent filter and output.",
    ),
  filters: z
    .array(filterSchema)
    .min(1)
    .max(100)
    .default([{ name: 'none', layers: [] }])
    .describe('Added filters that the room can place in the beam.'),
  support: z
    .array(supportSlabSchema)
    .max(10)
    .default(d.room.support)
    .describe('Table, pad and covers between tube, patient and detector.'),
  geometry: geometrySchema.prefault({}).describe('Distances and field.'),
  grid: gridSchema.nullable().default(d.room.grid).describe('Anti-scatter grid; null: none.'),
  detector: detectorSchema.prefault({}).describe('Image receptor.'),
  rules: z
    .array(ruleSchema)
    .max(50)
    .default(d.room.rules)
    .describe('Legal limits as data, each with source, date and provenance.'),
});
