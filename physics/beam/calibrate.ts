import { type Material, namedMaterial } from '../../materials/index.js';
import { type Fault, faultLine } from '../case/fault.js';
import type { Reading, Tube } from '../case/schema.js';
import type { Calibration, Finding, Residual } from '../results.js';
import { aluminiumEquivalent_mm } from './aluminium-equivalent.js';
import type { MaterialLayer } from './attenuate.js';
import { calibrationFindings } from './calibration-findings.js';
import { anchorPotential_kV, fitTube, outputFactorAt_kV, type TubeFit } from './calibration-fit.js';
import { halfValueLayerFault, outputFault } from './reading-faults.js';
import {
  inherentFor,
  type ModelledReading,
  modelledValues,
  modelReading,
} from './reading-model.js';
import { referenceMaterial } from './reference-materials.js';
import { tungstenSpectrum } from './tube-spectrum.js';

type CalibratedTube = Pick<
  Tube,
  'anodeAngle_deg' | 'ripple_percent' | 'outputFactor' | 'inherentFilter'
>;

export interface CalibrationOptions {
  /** Whether air lies between focal spot and meter (`room.geometry.air`); true unless said. */
  readonly air?: boolean;
  /** Looks up the inherent filter's materials; named materials unless said. */
  readonly material?: (name: string) => Material;
}

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
export function calibrate(
  tube: CalibratedTube,
  readings: readonly Reading[],
  filters: ReadonlyMap<string, readonly MaterialLayer[]>,
  options: CalibrationOptions = {},
): Calibration {
  const { start, accepted, faults } = examine(tube, readings, filters, options);
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
}

/** What is wrong with a room's readings: values no tube can give, filters the room does not have. */
export const readingFaults = (
  tube: CalibratedTube,
  readings: readonly Reading[],
  filters: ReadonlyMap<string, readonly MaterialLayer[]>,
  options: CalibrationOptions = {},
): Fault[] => examine(tube, readings, filters, options).faults;

interface Examined {
  /** The tube as entered. */
  readonly start: TubeFit;
  /** The readings that are believed; a value refused is null. */
  readonly accepted: readonly ModelledReading[];
  readonly faults: Fault[];
}

function examine(
  tube: CalibratedTube,
  readings: readonly Reading[],
  filters: ReadonlyMap<string, readonly MaterialLayer[]>,
  { air = true, material = requiredMaterial }: CalibrationOptions,
): Examined {
  const start: TubeFit = {
    inherentFilter_mmAl: inherentEquivalent_mm(tube, material),
    outputFactor: tube.outputFactor,
    outputExponent: 0,
  };
  const faults: Fault[] = [];
  const modelled = readings.flatMap((reading, index): ModelledReading[] => {
    const layers = filters.get(reading.filter);
    if (layers) return [modelReading(tube, reading, index, layers, air)];
    faults.push(unknownFilter(reading, index, filters));
    return [];
  });
  const accepted = modelled.map((m) => {
    const layerFault = halfValueLayerFault(m);
    const believed = layerFault ? without(m, 'halfValueLayer_mmAl') : m;
    const kermaFault = outputFault(m, inherentFor(believed) ?? start.inherentFilter_mmAl);
    for (const fault of [layerFault, kermaFault]) if (fault) faults.push(fault);
    return kermaFault ? without(believed, 'airKerma_uGy_per_mAs') : believed;
  });
  return { start, accepted, faults };
}

const without = (
  modelled: ModelledReading,
  quantity: 'halfValueLayer_mmAl' | 'airKerma_uGy_per_mAs',
): ModelledReading => ({ ...modelled, reading: { ...modelled.reading, [quantity]: null } });

function residualsOf(modelled: ModelledReading, fit: TubeFit): Residual[] {
  const { index, reading } = modelled;
  const values = modelledValues(modelled, fit.inherentFilter_mmAl);
  const scale = outputFactorAt_kV(fit, reading.potential_kV);
  const models = {
    halfValueLayer_mmAl: values.halfValueLayer_mmAl,
    airKerma_uGy_per_mAs: values.airKerma_uGy_per_mAs * scale,
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

/** Inherent filter as entered, in aluminium of equal half-value layer at 80 kV. */
function inherentEquivalent_mm(tube: CalibratedTube, material: (name: string) => Material): number {
  const layers = tube.inherentFilter.map((slab) => ({
    material: material(slab.material),
    thickness_mm: slab.thickness_mm,
  }));
  if (layers.every((layer) => layer.material === referenceMaterial('aluminium'))) {
    return layers.reduce((sum, { thickness_mm }) => sum + thickness_mm, 0);
  }
  const { anodeAngle_deg, ripple_percent } = tube;
  const bare = tungstenSpectrum({
    potential_kV: anchorPotential_kV,
    anodeAngle_deg,
    ripple_percent,
  });
  return aluminiumEquivalent_mm(bare, layers) ?? 0;
}

function requiredMaterial(name: string): Material {
  const material = namedMaterial(name);
  if (!material) throw new Error(`material "${name}": is not known`);
  return material;
}

const unknownFilter = (
  reading: Reading,
  index: number,
  filters: ReadonlyMap<string, unknown>,
): Fault => ({
  path: `room.readings[${index}].filter`,
  value: reading.filter,
  rule: `must be a filter of the room: ${[...filters.keys()].join(', ')}`,
  remedy: 'name one of them, or enter the filter under room.filters',
});

const refusal = (fault: Fault): Finding => ({
  code: 'readingRefused',
  severity: 'limit',
  message: faultLine(fault),
  path: fault.path,
  value: fault.value,
});
