import { type Fault, faultLine } from '../case/fault.js';
import type { Reading } from '../case/schema.js';
import { boundedMemo } from '../numeric/bounded-memo.js';
import type { Calibration, Finding, Residual } from '../results.js';
import type { MaterialLayer } from './attenuate.js';
import {
  type CalibratedTube,
  type CalibrationOptions,
  examineReadings,
  requiredMaterial,
} from './believed-readings.js';
import { calibrationFindings } from './calibration-findings.js';
import { fitTube, outputFactorAt_kV, type TubeFit } from './calibration-fit.js';
import {
  type ModelledReading,
  modelledHalfValueLayer_mmAl,
  modelledOutput_uGy_per_mAs,
} from './reading-model.js';

/**
 * Fits the tube model to a room's own readings, anode angle and ripple as entered: the inherent
 * filter as millimetres of aluminium and the output scale ln g = ln outputFactor + b ln(kV/80)
 * (calibration-fit.ts says from which readings).
 *
 * Readings that cannot be true in their unit are left out and named in a finding of severity `limit`
 * (readingFaults gives them as faults). What readings do not tell stays as entered, the inherent
 * filter as its aluminium equivalent at 80 kV.
 *
 * @param filters the room's added filters by name; readings are taken through the one they name
 * @returns every accepted reading's residual, model over measured, in percent
 */
export const calibrate = (
  tube: CalibratedTube,
  readings: readonly Reading[],
  filters: ReadonlyMap<string, readonly MaterialLayer[]>,
  options: CalibrationOptions = {},
): Calibration => calibration({ tube, readings, filters, options });

interface CalibrationRequest {
  readonly tube: CalibratedTube;
  readonly readings: readonly Reading[];
  readonly filters: ReadonlyMap<string, readonly MaterialLayer[]>;
  readonly options: CalibrationOptions;
}

// Most edits of a case leave its readings alone; a fit takes longer than an edit may.
const calibrationsKept = 16;
const calibration = boundedMemo<CalibrationRequest, Calibration>(
  calibrationsKept,
  ({ tube, readings, filters, options: { air = true, material = requiredMaterial } }) => {
    const { anodeAngle_deg, ripple_percent, outputFactor } = tube;
    const inherent = tube.inherentFilter.map((slab) => [
      material(slab.material),
      slab.thickness_mm,
    ]);
    return JSON.stringify([
      anodeAngle_deg,
      ripple_percent,
      outputFactor,
      inherent,
      readings,
      [...filters],
      air,
    ]);
  },
  ({ tube, readings, filters, options }) => {
    const { start, accepted, faults } = examineReadings(tube, readings, filters, options);
    const fit = fitTube(accepted, start);
    const residuals = accepted.flatMap((modelled) => residualsOf(modelled, fit));
    const uncertaintyOf = ({ path }: Residual): number =>
      accepted.find(({ index }) => path.startsWith(`room.readings[${index}].`))?.reading
        .relativeUncertainty_percent ?? 0;
    return {
      outputFactor: fit.outputFactor,
      outputExponent: fit.outputExponent,
      inherentFilter_mmAl: fit.inherentFilter_mmAl,
      residuals,
      findings: [...faults.map(refusal), ...calibrationFindings(fit, residuals, uncertaintyOf)],
    };
  },
);

/** What is wrong with a room's readings: values no tube can give, filters the room does not have. */
export const readingFaults = (
  tube: CalibratedTube,
  readings: readonly Reading[],
  filters: ReadonlyMap<string, readonly MaterialLayer[]>,
  options: CalibrationOptions = {},
): Fault[] => examineReadings(tube, readings, filters, options).faults;

function residualsOf(modelled: ModelledReading, fit: TubeFit): Residual[] {
  const { index, reading } = modelled;
  const { inherentFilter_mmAl } = fit;
  const models = {
    halfValueLayer_mmAl: modelledHalfValueLayer_mmAl(modelled, inherentFilter_mmAl),
    airKerma_uGy_per_mAs:
      modelledOutput_uGy_per_mAs(modelled, inherentFilter_mmAl) *
      outputFactorAt_kV(fit, reading.potential_kV),
  };
  return (['halfValueLayer_mmAl', 'airKerma_uGy_per_mAs'] as const).flatMap((quantity) => {
    const measured = reading[quantity];
    if (measured === null) return [];
    const model = models[quantity];
    return [
      {
        path: `room.readings[${index}].${quantity}`,
        potential_kV: reading.potential_kV,
        quantity,
        measured,
        model,
        relative_percent: 100 * (model / measured - 1),
      },
    ];
  });
}

const refusal = (fault: Fault): Finding => ({
  code: 'readingRefused',
  severity: 'limit',
  message: faultLine(fault),
  path: fault.path,
  value: fault.value,
});
