import { z } from 'zod';
import { defaults } from './defaults.js';

/**
 * The case file, version 1, as a zod schema: the one description from which the parser, the `Case`
 * type and the shipped JSON Schema are made. Bounds here are those of the models (tube 20–150 kV,
 * anode 6–22°) or keep nonsense out; none is a law. What one key asks of another is in `rules/`.
 */

type Writable<T> = T extends object ? { -readonly [K in keyof T]: Writable<T[K]> } : T;
const d = defaults as Writable<typeof defaults>;

/** Text that prints as it reads: no control characters, no marks that reverse its direction. */
const printable = /^(?!\s*$)[^\p{Cc}\u2028-\u202e\u2066-\u2069]+$/u;
const name = z.string().min(1).max(200).regex(printable);
const materialName = name;
const fileName = z.string().min(1).max(200).regex(printable);
const remark = z.string().max(2000);
const positive = z.number().positive().max(1e6);
const nonNegative = z.number().min(0).max(1e6);
const fraction = z.number().min(0).max(1);
/** The tube model's range (see physics/beam). */
const potential_kV = z.number().min(20).max(150);
/** From the tube model's lowest energy to the end of the attenuation tables. */
const energy_keV = z.number().min(5).max(20000);

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
  name,
  amount: amountSchema,
  carrier: materialName.nullable().default(d.task.agent.carrier),
});

const potentialRange = z.strictObject({
  min: potential_kV,
  max: potential_kV,
  step: z.number().positive().max(130),
});

const range = z.strictObject({ min: nonNegative, max: positive });

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

const segment = z.strictObject({
  from_kV: z.number().min(0).max(1000),
  to_kV: z.number().min(0).max(1000),
  /** Potential in kV and least first half-value layer in mm aluminium, ascending in kV. */
  points: z
    .array(z.tuple([z.number().min(0).max(1000), z.number().min(0).max(100)]))
    .min(1)
    .max(100),
});

const ruleOrigin = {
  source: z.string().min(1).max(1000),
  date: z.string().max(100),
  provenance: z.enum(['measured', 'entered', 'assumed', 'published', 'recalled', 'computed']),
};

export const modeSchema = z.enum(['radiography', 'fluoroscopy', 'subtraction']);

export const ruleSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('minimum-hvl'),
    segments: z.array(segment).min(1).max(50),
    ...ruleOrigin,
  }),
  z.strictObject({
    kind: z.literal('kerma-rate'),
    limit_mGy_per_min: positive,
    appliesTo: z.array(modeSchema).min(1).max(3).default(d.room.kermaRate.appliesTo),
    ...ruleOrigin,
  }),
]);

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

const compare = d.compare;
export const compareSchema = z.strictObject({
  leading: z.enum(['sdnr', 'subjectContrast', 'detectedContrast']).default(compare.leading),
  primaryDose: z
    .enum([
      'incidentAirKerma',
      'entranceSurfaceAirKerma',
      'kermaAreaProduct',
      'energyImparted',
      'meanAbsorbedDose',
    ])
    .default(compare.primaryDose),
  sdnrMargin_percent: z.number().min(0).max(100).default(compare.sdnrMargin_percent),
});

const agentComparedSchema = agentSchema.extend({
  /** Toxic load per gram of element relative to iodine, where the user has a source for it. */
  toxicityFactor: positive.nullable().default(d.agentCompared.toxicityFactor),
  deliverable_mg_per_mL: positive.nullable().default(d.agentCompared.deliverable_mg_per_mL),
  source: z.string().max(1000).default(d.agentCompared.source),
});

const priorSchema = z.strictObject({
  input: name,
  distribution: z.enum(['normal', 'lognormal', 'uniform']),
  spread_percent: z.number().positive().max(500),
  sharing: z.enum(['shared', 'per technique']).default(d.prior.sharing),
  source: z.string().max(1000).default(d.prior.source),
});

const measuredCheckSchema = z.strictObject({
  quantity: z.enum([
    'incidentAirKerma',
    'detectorAirKerma',
    'sdnr',
    'subjectContrast',
    'kermaAreaProduct',
  ]),
  technique: name,
  size: name.nullable().default(d.measuredCheck.size),
  values: z.array(z.number().min(-1e9).max(1e9)).min(1).max(1000),
  unit: z.string().max(100).default(d.measuredCheck.unit),
  date: z.string().max(100).default(d.measuredCheck.date),
  method: remark.default(d.measuredCheck.method),
});

const monitoringSchema = z.strictObject({
  quantity: name,
  interval: name,
  stopRule: remark.default(d.monitoringPlan.stopRule),
});

export const caseSchema = z.strictObject({
  format: z.literal('stratabeam.case'),
  version: z.literal(1),
  title: z.string().max(500).default(d.title),
  question: remark.default(d.question),
  materials: z.array(userMaterialSchema).max(100).default(d.materials),
  room: roomSchema.prefault({}),
  patient: patientSchema,
  task: taskSchema,
  /** The first is Current, the others Proposed. */
  techniques: z.array(techniqueSchema).min(1).max(20),
  compare: compareSchema.prefault({}),
  agentsCompared: z.array(agentComparedSchema).max(50).default(d.agentsCompared),
  priors: z.array(priorSchema).max(100).default(d.priors),
  measuredChecks: z.array(measuredCheckSchema).max(1000).default(d.measuredChecks),
  monitoring: monitoringSchema.nullable().default(d.monitoring),
  dossier: z
    .strictObject({ text: z.record(z.string().max(100), z.string().max(20000)).default({}) })
    .prefault({}),
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
