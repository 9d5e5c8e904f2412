import { z } from 'zod';
import { defaults } from './defaults.js';

/**
 * The case file, version 1, as a zod schema: the one description from which the parser, the `Case`
 * type and the shipped JSON Schema are made. Lengths are mm in files. Bounds here are those of the
 * models (tube 20–150 kV, anode 6–22°), not of any law.
 */

const name = z.string().min(1).max(200);
const materialName = z.string().min(1).max(200);
const positive = z.number().positive().max(1e6);
const nonNegative = z.number().min(0).max(1e6);
const fraction = z.number().min(0).max(1);

const d = defaults;

export const userMaterialSchema = z.strictObject({
  name,
  density_g_per_cm3: z.number().positive().max(30),
  massFractions: z.record(z.string().regex(/^[A-Z][a-z]?$/), fraction),
});

const slab = z.strictObject({
  material: materialName,
  thickness_mm: z.number().min(0).max(1000),
});

export const amountSchema = z.strictObject({
  value: z.number().min(0).max(1e5),
  unit: z.enum(['mg element/mL', 'mg compound/mL', 'mmol/mL', '% w/v']),
});

export const agentSchema = z.strictObject({
  name: z.string().min(1).max(200),
  amount: amountSchema,
  carrier: materialName.nullable().default(null),
});

const potentialRange = z.strictObject({
  min: z.number().min(20).max(150),
  max: z.number().min(20).max(150),
  step: z.number().positive().max(130),
});

const range = z.strictObject({ min: nonNegative, max: positive });

export const tubeSchema = z.strictObject({
  anodeAngle_deg: z.number().min(6).max(22).default(d.room.tube.anodeAngle_deg),
  ripple_percent: z.number().min(0).max(100).default(d.room.tube.ripple_percent),
  outputFactor: z.number().positive().max(10).default(d.room.tube.outputFactor),
  inherentFilter: z.array(slab).max(20).default([...d.room.tube.inherentFilter]),
  potential_kV: potentialRange.default(d.room.tube.potential_kV),
  power_kW: positive.default(d.room.tube.power_kW),
  current_mA: range.default(d.room.tube.current_mA),
  exposureTime_ms: range.default(d.room.tube.exposureTime_ms),
  focalSpot_mm: z.number().positive().max(10).default(d.room.tube.focalSpot_mm),
  /** Greatest power against exposure time, rows of the tube's rating chart, ascending in time. */
  rating: z
    .array(z.strictObject({ exposureTime_ms: positive, power_kW: positive }))
    .max(200)
    .default([]),
  /** Anode heat the tube may take in one run; null when not entered. */
  heatPerRun_kJ: positive.nullable().default(null),
});

export const readingSchema = z.strictObject({
  potential_kV: z.number().min(20).max(150),
  filter: name.default('none'),
  halfValueLayer_mmAl: z.number().positive().max(50).nullable().default(null),
  airKerma_uGy_per_mAs: z.number().positive().max(1e5).nullable().default(null),
  distance_mm: z.number().min(100).max(10000).default(1000),
  relativeUncertainty_percent: z.number().positive().max(100).default(3),
});

export const sourceSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('monoenergetic'), energy_keV: z.number().min(5).max(20000) }),
  z.strictObject({
    kind: z.literal('lines'),
    lines: z.array(z.tuple([z.number().min(5).max(20000), positive])).min(1).max(1000),
  }),
  z.strictObject({
    kind: z.literal('spectrum'),
    file: z.string().min(1).max(500),
    /** Filled from the file by the parser: energy in keV, photons per mm² per keV and mAs. */
    rows: z.array(z.tuple([z.number(), z.number()])).optional(),
  }),
]);

const segment = z.strictObject({
  from_kV: z.number().min(0).max(1000),
  to_kV: z.number().min(0).max(1000),
  points: z.array(z.tuple([z.number(), z.number()])).min(1).max(100),
});

const ruleOrigin = {
  source: z.string().min(1).max(1000),
  date: z.string().max(100),
  provenance: z.enum(['measured', 'entered', 'assumed', 'published', 'recalled', 'computed']),
};

export const modeSchema = z.enum(['radiography', 'fluoroscopy', 'subtraction']);

export const ruleSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('minimum-hvl'), segments: z.array(segment).min(1).max(50), ...ruleOrigin }),
  z.strictObject({
    kind: z.literal('kerma-rate'),
    limit_mGy_per_min: positive,
    appliesTo: z.array(modeSchema).min(1).default(['fluoroscopy']),
    ...ruleOrigin,
  }),
]);

export const gridSchema = z.strictObject({
  ratio: z.number().min(1).max(30),
  strips_per_cm: z.number().min(5).max(200),
  strip: z
    .strictObject({ material: materialName, thickness_um: z.number().positive().max(1000) })
    .default(d.room.grid.strip),
  interspace: z.strictObject({ material: materialName }).default(d.room.grid.interspace),
  cover: z.array(slab).max(10).default([]),
  /** The user's own transmissions, which replace the model's; null where not measured. */
  measured: z
    .strictObject({ primaryTransmission: fraction, scatterTransmission: fraction })
    .nullable()
    .default(null),
});

const det = d.room.detector;
export const detectorSchema = z.strictObject({
  material: materialName.default(det.material),
  arealDensity_mg_per_cm2: z.number().positive().max(1e5).default(det.arealDensity_mg_per_cm2),
  response: z.enum(['energy-integrating', 'counting']).default(det.response),
  countingThreshold_keV: z.number().min(0).max(150).default(det.countingThreshold_keV),
  opticalSwank: z.number().positive().max(1).default(det.opticalSwank),
  electronicNoiseKerma_uGy: z.number().min(0).max(100).default(det.electronicNoiseKerma_uGy),
  electronicNoiseBeam: z
    .enum(['RQA2', 'RQA3', 'RQA4', 'RQA5', 'RQA6', 'RQA7', 'RQA8', 'RQA9', 'RQA10'])
    .default(det.electronicNoiseBeam),
  structureNoise_fraction: z.number().min(0).max(1).default(det.structureNoise_fraction),
  glare_fraction: z.number().min(0).max(0.9).default(det.glare_fraction),
  pixel_mm: z.number().positive().max(10).default(det.pixel_mm),
  airKerma_uGy: range.default(det.airKerma_uGy),
});

const geo = d.room.geometry;
export const geometrySchema = z.strictObject({
  beam: z.enum(['point', 'parallel']).default(geo.beam),
  sourceToDetector_mm: z.number().min(100).max(10000).default(geo.sourceToDetector_mm),
  anchor: z.enum(['detector', 'table', 'isocentre']).default(geo.anchor),
  exitToDetector_mm: z.number().min(0).max(5000).default(geo.exitToDetector_mm),
  field_mm: z
    .tuple([z.number().positive().max(2000), z.number().positive().max(2000)])
    .default([geo.field_mm[0], geo.field_mm[1]]),
  minSourceToSkin_mm: z.number().min(0).max(5000).default(geo.minSourceToSkin_mm),
  referencePoint_mm: z.number().min(50).max(10000).default(geo.referencePoint_mm),
  air: z.boolean().default(geo.air),
});

export const filterSchema = z.strictObject({ name, layers: z.array(slab).max(10) });

export const roomSchema = z.strictObject({
  name: name.default(d.room.name),
  tube: tubeSchema.prefault({}),
  /** Replaces the tube when given. */
  source: sourceSchema.nullable().default(null),
  readings: z.array(readingSchema).max(500).default([]),
  filters: z.array(filterSchema).min(1).max(100).default([{ name: 'none', layers: [] }]),
  support: z
    .array(
      z.strictObject({
        material: materialName,
        thickness_mm: z.number().min(0).max(500),
        side: z.enum(['entrance', 'exit']).default('entrance'),
      }),
    )
    .max(10)
    .default([]),
  geometry: geometrySchema.prefault({}),
  grid: gridSchema.nullable().default(null),
  detector: detectorSchema.prefault({}),
  rules: z.array(ruleSchema).max(50).default([]),
});

export const layerSchema = z.strictObject({
  name,
  material: materialName,
  thickness_mm: z.number().positive().max(2000),
  /** Share of a size change that this layer takes; null in all layers: in proportion to thickness. */
  growthShare: fraction.nullable().default(null),
  agent: agentSchema.nullable().default(null),
});

export const sizeSchema = z.strictObject({
  name,
  thickness_mm: z.number().positive().max(2000),
  weight: z.number().min(0).max(1e9).default(1),
});

export const patientSchema = z.strictObject({
  layers: z.array(layerSchema).min(1).max(100),
  /** Width and height of a finite body; null: laterally infinite layers. */
  lateral_mm: z.tuple([positive, positive]).nullable().default(null),
  /** Empty: one size, the layers as drawn. `{ file }` reads rows of thickness_mm,weight. */
  sizes: z.union([z.array(sizeSchema).max(500), z.strictObject({ file: z.string().min(1).max(500) })]).default([]),
});

export const detailSchema = z.strictObject({
  shape: z.enum(['vessel', 'slab', 'coat', 'defect', 'insert']),
  inLayer: name,
  /** Depth of the detail's centre below the layer's entrance face; null: the middle. */
  depthInLayer_mm: nonNegative.nullable().default(null),
  size_mm: z.number().positive().max(1000),
  length_mm: z.number().positive().max(1000).default(d.task.detail.length_mm),
  width_mm: z.number().positive().max(1000).nullable().default(null),
  walls: z.union([z.literal(1), z.literal(2)]).default(1),
  /** What stands in the detail's place in the comparison image: 'layer' or a material. */
  reference: materialName.default(d.task.detail.reference),
  fillingFraction: z.number().positive().max(1).default(1),
  /** The material of an insert. */
  material: materialName.nullable().default(null),
  agent: agentSchema.nullable().default(null),
});

export const taskSchema = z.strictObject({
  detail: detailSchema,
  roseThreshold: z.number().positive().max(100).default(d.task.roseThreshold),
  backgroundNoise_fraction: z.number().min(0).max(1).default(0),
  subtractionResidual_fraction: fraction.default(d.task.subtractionResidual_fraction),
  motion_mm_per_s: z.number().min(0).max(10000).default(0),
});

export const fixedSchema = z.union([
  z.literal('shortest'),
  z.strictObject({ exposureTime_ms: positive }),
  z.strictObject({ tubeCurrent_mA: positive }),
]);

const acq = d.technique.acquisition;
export const acquisitionSchema = z.strictObject({
  mode: modeSchema.default(acq.mode),
  frames: z.int().min(1).max(100000).default(acq.frames),
  frameRate_per_s: z.number().positive().max(1000).default(acq.frameRate_per_s),
  maskFrames: z.int().min(0).max(10000).default(acq.maskFrames),
  fixed: fixedSchema.default(acq.fixed),
});

export const curveRowSchema = z.strictObject({
  thickness_mm: positive,
  potential_kV: z.number().min(20).max(150),
  tubeCurrent_mA: positive,
  exposureTime_ms: positive,
  filter: name,
});

export const controlSchema = z.union([
  z.strictObject({ detectorAirKerma_uGy: positive }),
  z.strictObject({ detectorSignal: positive.max(1e30) }),
  z.strictObject({ incidentAirKerma_mGy: positive }),
  z.strictObject({ tubeLoad_mAs: positive }),
  z.strictObject({ curve: z.string().min(1).max(500), rows: z.array(curveRowSchema).optional() }),
]);

export const techniqueSchema = z.strictObject({
  name,
  potential_kV: z.number().min(20).max(150),
  filter: name.default(d.technique.filter),
  grid: z.enum(['in', 'out']).default(d.technique.grid),
  acquisition: acquisitionSchema.prefault({}),
  control: controlSchema,
});

export const compareSchema = z.strictObject({
  leading: z.enum(['sdnr', 'subjectContrast', 'detectedContrast']).default(d.compare.leading),
  primaryDose: z
    .enum(['incidentAirKerma', 'entranceSurfaceAirKerma', 'kermaAreaProduct', 'energyImparted', 'meanAbsorbedDose'])
    .default(d.compare.primaryDose),
  sdnrMargin_percent: z.number().min(0).max(100).default(d.compare.sdnrMargin_percent),
});

const agentComparedSchema = agentSchema.extend({
  /** Toxic load per gram of element relative to iodine, where the user has a source for it. */
  toxicityFactor: positive.nullable().default(null),
  deliverable_mg_per_mL: positive.nullable().default(null),
  source: z.string().max(1000).default(''),
});

const priorSchema = z.strictObject({
  input: z.string().min(1).max(200),
  distribution: z.enum(['normal', 'lognormal', 'uniform']),
  spread_percent: z.number().positive().max(500),
  sharing: z.enum(['shared', 'per technique']).default('shared'),
  source: z.string().max(1000).default(''),
});

const measuredCheckSchema = z.strictObject({
  quantity: z.enum(['incidentAirKerma', 'detectorAirKerma', 'sdnr', 'subjectContrast', 'kermaAreaProduct']),
  technique: name,
  size: name.nullable().default(null),
  values: z.array(z.number()).min(1).max(1000),
  unit: z.string().max(100).default(''),
  date: z.string().max(100).default(''),
  method: z.string().max(2000).default(''),
});

const monitoringSchema = z.strictObject({
  quantity: z.string().min(1).max(200),
  interval: z.string().min(1).max(200),
  stopRule: z.string().max(2000).default(''),
});

export const caseSchema = z.strictObject({
  format: z.literal('stratabeam.case'),
  version: z.literal(1),
  title: z.string().max(500).default(''),
  question: z.string().max(2000).default(''),
  materials: z.array(userMaterialSchema).max(100).default([]),
  room: roomSchema.prefault({}),
  patient: patientSchema,
  task: taskSchema,
  techniques: z.array(techniqueSchema).min(1).max(20),
  compare: compareSchema.prefault({}),
  agentsCompared: z.array(agentComparedSchema).max(50).default([]),
  priors: z.array(priorSchema).max(100).default([]),
  measuredChecks: z.array(measuredCheckSchema).max(1000).default([]),
  monitoring: monitoringSchema.nullable().default(null),
  dossier: z.strictObject({ text: z.record(z.string().max(100), z.string().max(20000)).default({}) }).prefault({}),
});

/** A whole case after parsing: every key present, defaults filled in. */
export type Case = z.output<typeof caseSchema>;
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
