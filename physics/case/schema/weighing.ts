import { z } from 'zod';
import { d, name, remark } from './common.js';

/** What leads the weighing, what is uncertain, what was measured, how it is watched. */
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

export const priorSchema = z.strictObject({
  input: name,
  distribution: z.enum(['normal', 'lognormal', 'uniform']),
  spread_percent: z.number().positive().max(500),
  sharing: z.enum(['shared', 'per technique']).default(d.prior.sharing),
  source: z.string().max(1000).default(d.prior.source),
});

export const measuredCheckSchema = z.strictObject({
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

export const monitoringSchema = z.strictObject({
  quantity: name,
  interval: name,
  stopRule: remark.default(d.monitoringPlan.stopRule),
});
