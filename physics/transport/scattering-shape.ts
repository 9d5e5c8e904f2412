import {
  formFactorSquaredPerGram,
  kleinNishinaShape,
  type Material,
  photonEnergyWavelength_keV_angstrom,
  scatteringFunctionPerGram,
} from '../../materials/index.js';
import { kept } from '../../materials/kept.js';
import { greatestEnergy_keV } from './energy-nodes.js';

/** Step of the momentum-transfer tables, 1/Å: F² changes by less than 1 % over one. */
const step_per_angstrom = 0.004;
const hc = photonEnergyWavelength_keV_angstrom.value;

/** Σ w/A·S(q) and Σ w/A·F²(q) of one material at equal steps of q = sin(θ/2)/λ. */
export interface ScatteringShape {
  readonly incoherent: Float64Array;
  readonly coherent: Float64Array;
}

/** Nodes per keV of q at backscatter; q in table steps is `sin(θ/2) · E · stepsPerKeV`. */
export const stepsPerKeV = 1 / (hc * step_per_angstrom);

const shapes = new WeakMap<Material, ScatteringShape>();

/** Scattering functions of a material up to backscatter at 150 keV. Hubbell 1975 / EPDL97. */
export const scatteringShape = (material: Material): ScatteringShape =>
  kept(shapes, material, () => tabulateShape(material));

function tabulateShape(material: Material): ScatteringShape {
  const length = Math.ceil(greatestEnergy_keV * stepsPerKeV) + 2;
  const tabulate = (perGram: (material: Material, q: number) => number): Float64Array =>
    Float64Array.from({ length }, (_, i) => perGram(material, i * step_per_angstrom));
  return {
    incoherent: tabulate(scatteringFunctionPerGram),
    coherent: tabulate(formFactorSquaredPerGram),
  };
}

/** Bound Compton scattering per solid angle, unnormalised: Klein–Nishina × S(q). */
export function comptonShape(shape: ScatteringShape, energy_keV: number, cosTheta: number): number {
  return kleinNishinaShape(energy_keV, cosTheta) * lookUp(shape.incoherent, energy_keV, cosTheta);
}

/** Rayleigh scattering per solid angle, unnormalised: (1 + cos²θ)/2 × F²(q). */
export function rayleighShape(
  shape: ScatteringShape,
  energy_keV: number,
  cosTheta: number,
): number {
  return 0.5 * (1 + cosTheta * cosTheta) * lookUp(shape.coherent, energy_keV, cosTheta);
}

function lookUp(table: Float64Array, energy_keV: number, cosTheta: number): number {
  const at = Math.sqrt(Math.max(0, 0.5 * (1 - cosTheta))) * energy_keV * stepsPerKeV;
  const node = Math.floor(at);
  return table[node] + (at - node) * (table[node + 1] - table[node]);
}
