import {
  elementByZ,
  formFactor,
  incoherentScatteringFunction,
  kleinNishinaShape,
  type Material,
  photonEnergyWavelength_keV_angstrom,
} from '../../materials/index.js';
import { kept } from '../../materials/kept.js';
import { gaussLegendre } from '../numeric/gauss-legendre.js';
import { scatterRange_keV } from './energy-nodes.js';

/**
 * Angular shapes of one material on a grid uniform in √q, q = sin(θ/2)/λ: fine where F² falls
 * steeply, and found without a search.
 */
export interface AngularShapes {
  /** Σ w/A · S(q) at the grid. */
  readonly incoherent: Float64Array;
  /** Σ w/A · F²(q) at the grid. */
  readonly coherent: Float64Array;
}

const intervals = 1024;
const greatestQ = (scatterRange_keV[1] / photonEnergyWavelength_keV_angstrom.value) * 1.001;
const intervalsPerRootQ = intervals / Math.sqrt(greatestQ);

const gridQ = Float64Array.from({ length: intervals + 1 }, (_, i) => (i / intervalsPerRootQ) ** 2);

const ofElements = new Map<number, AngularShapes>();
const ofMaterials = new WeakMap<Material, AngularShapes>();

/** S and F² of one atom on the grid. */
const elementShapes = (z: number): AngularShapes =>
  kept(ofElements, z, () => ({
    incoherent: gridQ.map((q) => incoherentScatteringFunction(z, q)),
    coherent: gridQ.map((q) => formFactor(z, q) ** 2),
  }));

/** Scattering functions of a material for both angular distributions, made once per material. */
export const angularShapes = (material: Material): AngularShapes =>
  kept(ofMaterials, material, () => ({
    incoherent: perGram(material, 'incoherent'),
    coherent: perGram(material, 'coherent'),
  }));

/** Σ w/A of the elements' values, mol/g. */
function perGram(material: Material, name: keyof AngularShapes): Float64Array {
  const sum = new Float64Array(gridQ.length);
  for (const { z, massFraction } of material.massFractions) {
    const values = elementShapes(z)[name];
    const share = massFraction / elementByZ(z).atomicWeight_g_per_mol;
    for (let i = 0; i < sum.length; i++) sum[i] += share * values[i];
  }
  return sum;
}

/** √(q/sin(θ/2)) in units of the grid's interval: times √sin(θ/2) it is the place in the grid. */
export const gridPlacePerRootHalfSine = (energy_keV: number): number =>
  Math.sqrt(energy_keV / photonEnergyWavelength_keV_angstrom.value) * intervalsPerRootQ;

/** A shape at a place in its grid, linear between grid points. */
export function shapeAt(shape: Float64Array, place: number): number {
  const i = place | 0;
  return i >= intervals ? shape[intervals] : shape[i] + (place - i) * (shape[i + 1] - shape[i]);
}

/** Klein–Nishina × S(q), not normalised (Hubbell et al. 1975, eq. for the incoherent cross section). */
export const comptonShape = (energy_keV: number, cosTheta: number, incoherent: number): number =>
  kleinNishinaShape(energy_keV, cosTheta) * incoherent;

/** Thomson × F²(q), not normalised. */
export const rayleighShape = (cosTheta: number, coherent: number): number =>
  (1 + cosTheta * cosTheta) * coherent;

/** ∫ shape dΩ of both distributions at one energy, so that shape / norm integrates to 1. */
export interface AngularNorms {
  readonly compton: number;
  readonly rayleigh: number;
}

const halfSines = gaussLegendre(96);

/** Norms by 96 Gauss–Legendre points in sin(θ/2), where dΩ = 8π x dx and the forward peak is wide. */
export function angularNorms(material: Material, energy_keV: number): AngularNorms {
  const shapes = angularShapes(material);
  const scale = gridPlacePerRootHalfSine(energy_keV);
  let compton = 0;
  let rayleigh = 0;
  for (let k = 0; k < halfSines.nodes.length; k++) {
    const x = halfSines.nodes[k];
    const cosTheta = 1 - 2 * x * x;
    const place = scale * Math.sqrt(x);
    const solidAngle = 8 * Math.PI * x * halfSines.weights[k];
    compton += solidAngle * comptonShape(energy_keV, cosTheta, shapeAt(shapes.incoherent, place));
    rayleigh += solidAngle * rayleighShape(cosTheta, shapeAt(shapes.coherent, place));
  }
  return { compton, rayleigh };
}
