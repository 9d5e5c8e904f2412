import { z } from 'zod';
import { d, name, remark } from './common.js';

/** What leads the weighing, what is uncertain, what was measured, how it is watched. */
const compare = d.compare;
export const compareSchema = z.strictObject({
  leading: z
    .enum(['sdnr', 'subjectContrast', 'detectedContrast'])
    .default(compare.leading)
    .describe('Quantity that leads the comparison.'),
  primaryDose: z
    .enum([
      'incidentAirKerma',
      'entranceSurfaceAirKerma',
      'kermaAreaProduct',
      'energyImparted',
      'meanAbsorbedDose',
    ])
    .default(compare.primaryDose)
    .describe('Dose quantity set against it.'),
  sdnrMargin_percent: z
    .number()
    .min(0)
    .max(100)
    .default(compare.sdnrMargin_percent)
    .describe(
      'Loss of SdNR against Current, as set, beyond which a saving is called into question, percent.',
    ),
});

export const priorSchema = z.strictObject({
  input: name.describe('Path of the uncertain input.'),
  distribution: z.enum(['normal', 'lognormal', 'uniform']).describe('Form of the distribution.'),
  spread_percent: z
    .number()
    .positive()
    .max(500)
    .describe('Standard deviation, or half width of a uniform one, percent of the value.'),
  sharing: z
    .enum(['shared', 'per technique'])
    .default(d.prior.sharing)
    .describe('Whether all techniques share one draw.'),
  source: z.string().max(1000).default(d.prior.source).describe('Where the spread comes from.'),
});

export const measuredCheckSchema = z.strictObject({
  quantity: z
    .enum(['incidentAirKerma', 'detectorAirKerma', 'sdnr', 'subjectContrast', 'kermaAreaProduct'])
    .describe('Quantity measured.'),
  technique: name.describe('Technique measured, one of techniques.'),
  size: name
    .nullable()
    .default(d.measuredCheck.size)
    .describe('Size measured, one of patient.sizes; null: the patient as drawn.'),
  values: z
    .array(z.number().min(-1e9).max(1e9))
    .min(1)
    .max(1000)
    .describe('Repeated measurements.'),
  unit: z.string().max(100).default(d.measuredCheck.unit).describe('Unit of the values.'),
  date: z.string().max(100).default(d.measuredCheck.date).describe('Date of measurement.'),
  method: remark.default(d.measuredCheck.method).describe('How it was measured.'),
});

export const monitoringSchema = z.strictObject({
  quantity: name.describe('Quantity watched after the change.'),
  interval: name.describe('How often it is looked at.'),
  stopRule: remark
    .default(d.monitoringPlan.stopRule)
    .describe('What would end or reverse the change.'),
});
