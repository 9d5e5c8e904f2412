import { z } from 'zod';
import { d, energy_keV, fileName, name, positive, potential_kV, range, slab } from './common.js';

const potentialRange = z.strictObject({
  min: potential_kV.describe('Least potential, kV.'),
  max: potential_kV.describe('Greatest potential, kV.'),
  step: z.number().positive().max(130).describe('Step between potentials, kV.'),
});

const tube = d.room.tube;
export const tubeSchema = z.strictObject({
  anodeAngle_deg: z
    .number()
    .min(6)
    .max(22)
    .default(tube.anodeAngle_deg)
    .describe('Angle between anode face and central ray, degrees.'),
  ripple_percent: z
    .number()
    .min(0)
    .max(100)
    .default(tube.ripple_percent)
    .describe('(Vmax − Vmin)/Vmax of the potential, percent; 0 for constant.'),
  outputFactor: z
    .number()
    .positive()
    .max(10)
    .default(tube.outputFactor)
    .describe('Output over that of the tube model at 80 kV; readings of output replace it.'),
  inherentFilter: z
    .array(slab)
    .max(20)
    .default(tube.inherentFilter)
    .describe(
      'All between anode and added filter; readings of half-value layer replace it by one thickness of aluminium.',
    ),
  potential_kV: potentialRange
    .default(tube.potential_kV)
    .describe('Potentials the generator can be set to.'),
  power_kW: positive.default(tube.power_kW).describe('Greatest power of the generator, kW.'),
  current_mA: range.default(tube.current_mA).describe('Least and greatest tube current, mA.'),
  exposureTime_ms: range
    .default(tube.exposureTime_ms)
    .describe('Least and greatest exposure time of one frame, ms.'),
  focalSpot_mm: z
    .number()
    .positive()
    .max(10)
    .default(tube.focalSpot_mm)
    .describe('Nominal focal spot, mm.'),
  rating: z
    .array(
      z.strictObject({
        exposureTime_ms: positive.describe('Exposure time, ms.'),
        power_kW: positive.describe('Greatest power for that time, kW.'),
      }),
    )
    .max(200)
    .default(tube.rating)
    .describe("Rows of the tube's rating chart, ascending in time; empty: power_kW at any time."),
  heatPerRun_kJ: positive
    .nullable()
    .default(tube.heatPerRun_kJ)
    .describe('Anode heat the tube may take in one run, kJ; null: not limited.'),
});

const reading = d.room.reading;
export const readingSchema = z.strictObject({
  potential_kV: potential_kV.describe('Tube potential of the reading, kV.'),
  filter: name.default(reading.filter).describe('Added filter in the beam, one of room.filters.'),
  halfValueLayer_mmAl: z
    .number()
    .positive()
    .max(50)
    .nullable()
    .default(reading.halfValueLayer_mmAl)
    .describe(
      "First half-value layer in mm aluminium at the meter, in the room's air; null: not measured.",
    ),
  airKerma_uGy_per_mAs: z
    .number()
    .positive()
    .max(1e5)
    .nullable()
    .default(reading.airKerma_uGy_per_mAs)
    .describe(
      "Output at the meter in the room's air, without backscatter, µGy/mAs; null: not measured.",
    ),
  distance_mm: z
    .number()
    .min(100)
    .max(10000)
    .default(reading.distance_mm)
    .describe('Focal spot to meter, mm.'),
  relativeUncertainty_percent: z
    .number()
    .positive()
    .max(100)
    .default(reading.relativeUncertainty_percent)
    .describe('Standard uncertainty of the reading, percent; weighs it in the fit.'),
});

export const sourceSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('monoenergetic').describe('Photons of one energy.'),
    energy_keV: energy_keV.describe('Photon energy, keV.'),
  }),
  z.strictObject({
    kind: z.literal('lines').describe('Photons of several energies.'),
    lines: z
      .array(z.tuple([energy_keV, positive]))
      .min(1)
      .max(1000)
      .describe('Pairs of energy in keV and photons per mm² and mAs at 1 m, or any weight.'),
  }),
  z.strictObject({
    kind: z.literal('spectrum').describe('A spectrum from a file.'),
    file: fileName.describe(
      'CSV file beside the case: energy_keV, fluence_per_mm2_per_keV_per_mAs at 1 m.',
    ),
    rows: z
      .array(z.tuple([z.number(), z.number()]))
      .max(100000)
      .optional()
      .describe(
        'Pairs of energy in keV and photons per mm², keV and mAs; read from the file where left out.',
      ),
  }),
]);
