import { type Material, massAttenuation } from '../../materials/index.js';
import type { TransportGeometry } from './geometry.js';

/**
 * How often a collision at a depth is worth scoring, on the axis: 1 from one mean free path before
 * the exit on, falling with e^−τ/height² before. At equal steps of z from `from_cm`.
 */
export interface WorthTable {
  readonly from_cm: number;
  readonly stepsPerCm: number;
  readonly values: Float64Array;
}

const steps = 256;
/** Never score less often than this, so that no rare score counts for too much. */
const leastWorth = 1 / 64;

/** The table of a geometry for the mean energy of its beam; a guide to effort, never to the result. */
export function worthTable(
  geometry: TransportGeometry,
  materials: readonly Material[],
  energy_keV: number,
): WorthTable {
  const { planes_cm, slabMatter, detector_cm } = geometry;
  const from_cm = planes_cm[0];
  const exit_cm = planes_cm[planes_cm.length - 1];
  const step_cm = (exit_cm - from_cm) / steps;
  const worth = new Float64Array(steps + 1);
  let depth = 0;
  let slab = slabMatter.length - 1;
  let reference = 0;
  for (let i = steps; i >= 0; i--) {
    const z = from_cm + i * step_cm;
    const height = Math.max(detector_cm - z, step_cm);
    worth[i] = Math.exp(-depth) / (height * height);
    if (depth <= 1) reference = worth[i];
    while (slab > 0 && z <= planes_cm[slab]) slab--;
    const material = materials[slabMatter[slab]];
    depth += material.density_g_per_cm3 * massAttenuation(material, energy_keV) * step_cm;
  }
  return {
    from_cm,
    stepsPerCm: 1 / step_cm,
    values: worth.map((value) => Math.max(leastWorth, value / reference)),
  };
}

/** The worth at a depth inside the geometry, on the axis. */
export function worthAt(table: WorthTable, z_cm: number): number {
  return table.values[((z_cm - table.from_cm) * table.stepsPerCm) | 0];
}
