import { type Material, partialCoefficientsOn } from '../../materials/index.js';
import { kept } from '../../materials/kept.js';
import { angleQuantiles, quantileCount, rowCount } from './angle-quantiles.js';
import { nodeEnergies_keV, tableStride } from './energy-nodes.js';
import { type FluorescenceTables, fluorescenceTables } from './fluorescence.js';
import {
  comptonShape,
  rayleighShape,
  type ScatteringShape,
  scatteringShape,
} from './scattering-shape.js';

/** Entries of one material's inverse angle distribution. */
export const angleStride = rowCount * quantileCount;

/** Everything transport knows about matter, one material after another, as plain arrays. */
export interface MatterTables {
  readonly names: readonly string[];
  /** Linear attenuation coefficient at every energy node, 1/cm. */
  readonly attenuation_per_cm: Float32Array;
  /** Share of Compton scattering among interactions, and of Compton with Rayleigh. */
  readonly comptonShare: Float32Array;
  readonly scatterShare: Float32Array;
  /** cosθ quantiles, 61 rows of 257. */
  readonly comptonCosines: Float32Array;
  readonly rayleighCosines: Float32Array;
  readonly fluorescence: FluorescenceTables;
}

/** Coefficients in 1/cm by process at the energy nodes, and the inverse angle distributions. */
interface OneMaterial {
  readonly attenuation_per_cm: Float64Array;
  readonly comptonShare: Float64Array;
  readonly scatterShare: Float64Array;
  readonly comptonCosines: Float32Array;
  readonly rayleighCosines: Float32Array;
}

/**
 * Tables of the given materials in order, then vacuum, in which photons never interact.
 * `fluorescence` false leaves K photons unmade.
 */
export function matterTables(materials: readonly Material[], fluorescence: boolean): MatterTables {
  const each = materials.map((material) => kept(known, material, () => tabulate(material)));
  const vacuum = new Float64Array(tableStride);
  return {
    names: [...materials.map(({ name }) => name), 'vacuum'],
    attenuation_per_cm: joined([...each.map((one) => one.attenuation_per_cm), vacuum]),
    comptonShare: joined(each.map((one) => one.comptonShare)),
    scatterShare: joined(each.map((one) => one.scatterShare)),
    comptonCosines: joined(each.map((one) => one.comptonCosines)),
    rayleighCosines: joined(each.map((one) => one.rayleighCosines)),
    fluorescence: fluorescenceTables(materials, fluorescence),
  };
}

const known = new WeakMap<Material, OneMaterial>();

function tabulate(material: Material): OneMaterial {
  const { coherent, incoherent, photoelectric } = partialCoefficientsOn(material, nodeEnergies_keV);
  const shape: ScatteringShape = scatteringShape(material);
  const total = coherent.map((value, n) => value + incoherent[n] + photoelectric[n]);
  return {
    attenuation_per_cm: total.map((value) => value * material.density_g_per_cm3),
    comptonShare: incoherent.map((value, n) => value / total[n]),
    scatterShare: incoherent.map((value, n) => (value + coherent[n]) / total[n]),
    comptonCosines: angleQuantiles((energy, cosTheta) => comptonShape(shape, energy, cosTheta)),
    rayleighCosines: angleQuantiles((energy, cosTheta) => rayleighShape(shape, energy, cosTheta)),
  };
}

function joined(parts: readonly (Float32Array | Float64Array)[]): Float32Array {
  const all = new Float32Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    all.set(part, at);
    at += part.length;
  }
  return all;
}
