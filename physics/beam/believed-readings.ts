import { type Material, namedMaterial } from '../../materials/index.js';
import type { Fault } from '../case/fault.js';
import type { Reading, Tube } from '../case/schema.js';
import { aluminiumEquivalent_mm } from './aluminium-equivalent.js';
import type { MaterialLayer } from './attenuate.js';
import { anchorPotential_kV, type TubeFit } from './calibration-fit.js';
import { halfValueLayerFault, outputFault } from './reading-faults.js';
import { inherentFor, type ModelledReading, modelReading } from './reading-model.js';
import { referenceMaterial } from './reference-materials.js';
import { tungstenSpectrum } from './tube-spectrum.js';

/** What a calibration takes from the room's tube. */
export type CalibratedTube = Pick<
  Tube,
  'anodeAngle_deg' | 'ripple_percent' | 'outputFactor' | 'inherentFilter'
>;

export interface CalibrationOptions {
  /** Whether air lies between focal spot and meter (`room.geometry.air`); true unless said. */
  readonly air?: boolean;
  /** Looks up the inherent filter's materials; named materials unless said. */
  readonly material?: (name: string) => Material;
}

/** A room's readings sorted into what can be believed and what cannot. */
export interface ExaminedReadings {
  /** The tube as entered. */
  readonly start: TubeFit;
  /** The readings that are believed; a value refused is null. */
  readonly accepted: readonly ModelledReading[];
  readonly faults: Fault[];
}

/** Models every reading and takes out, with the reason, the values that no tube can give. */
export function examineReadings(
  tube: CalibratedTube,
  readings: readonly Reading[],
  filters: ReadonlyMap<string, readonly MaterialLayer[]>,
  { air = true, material = requiredMaterial }: CalibrationOptions,
): ExaminedReadings {
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

/** A named material, of which there must be one. */
export function requiredMaterial(name: string): Material {
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
