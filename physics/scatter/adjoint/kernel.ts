import { electronRestEnergy_keV, type Material } from '../../../materials/index.js';
import { kept } from '../../../materials/kept.js';
import {
  angularShapes,
  comptonShape,
  gridPlacePerRootHalfSine,
  rayleighShape,
  shapeAt,
} from '../angular.js';
import { linearCoefficients } from '../slabs.js';
import { cosines, ordinates, ordinateWeights, ray, rows } from './directions.js';
import { type FluorescenceTerm, fluorescenceTerms } from './fluorescence.js';

/** Coefficients of one parity, from `rows` directions to `ordinates` pairs. */
export const blockLength = rows * ordinates;
/** Both parities, or both hemispheres, of one lower node. */
const levelLength = 2 * blockLength;

/**
 * Scattering of one material between the discrete directions and energies, 1/cm.
 *
 * With ψ± = ψ(μ′) ± ψ(−μ′) the source towards ±μ is ½(K₊ + K₋)ψ₊ ± ½(K₊ − K₋)ψ₋: the reflection of a
 * slab halves the work. `blocks[i]` holds for j = `lowest[i]` … i the even block, then the odd one.
 */
export interface Kernel {
  readonly attenuation: Float64Array;
  readonly lowest: Int32Array;
  readonly blocks: readonly Float64Array[];
  /** Energy that leaves by scattering per cm, keV/cm, `[i · rows + direction]`. */
  readonly scatteredEnergy: Float64Array;
  readonly fluorescence: readonly (readonly FluorescenceTerm[])[];
}

const made = new WeakMap<Float64Array, WeakMap<Material, Kernel>>();

/** The kernel of a material on a set of energy nodes, made once per pair. */
export function kernelOf(material: Material, energies_keV: Float64Array): Kernel {
  const byMaterial = kept(made, energies_keV, () => new WeakMap<Material, Kernel>());
  return kept(byMaterial, material, () => makeKernel(material, energies_keV));
}

/** Azimuths between two directions, midpoints on 0…π. */
const azimuths = 24;

/** A pair of directions: photons go from one towards the other, in the same or the other hemisphere. */
interface Pair {
  readonly from: number;
  readonly to: number;
  readonly side: 0 | 1;
  readonly cosTheta: Float64Array;
  /** √sin(θ/2), the energy-free part of the place among the scattering functions. */
  readonly rootHalfSine: Float64Array;
}

// Both shapes depend on the angle between two directions only, so one triangle gives the other.
const pairs: readonly Pair[] = Array.from({ length: rows }, (_, from) => from).flatMap((from) =>
  Array.from({ length: Math.min(from + 1, ordinates) }, (_, to) => to).flatMap((to) =>
    ([0, 1] as const).map((side) => makePair(from, to, side)),
  ),
);

function makePair(from: number, to: number, side: 0 | 1): Pair {
  const along = (side === 0 ? 1 : -1) * cosines[from] * cosines[to];
  const across = Math.sqrt((1 - cosines[from] ** 2) * (1 - cosines[to] ** 2));
  const cosTheta = Float64Array.from(
    { length: azimuths },
    (_, k) => along + across * Math.cos((Math.PI * (k + 0.5)) / azimuths),
  );
  const rootHalfSine = cosTheta.map((cosine) => Math.max(0, (1 - cosine) / 2) ** 0.25);
  return { from, to, side, cosTheta, rootHalfSine };
}

function makeKernel(material: Material, energies_keV: Float64Array): Kernel {
  const linear = linearCoefficients(material, energies_keV);
  const count = energies_keV.length;
  const lowest = new Int32Array(count);
  const blocks: Float64Array[] = [];
  const scatteredEnergy = new Float64Array(count * rows);
  for (let i = 0; i < count; i++) {
    lowest[i] = lowestNode(energies_keV, i);
    const raw = rawScattering(material, energies_keV, i, lowest[i]);
    const block = new Float64Array((i - lowest[i] + 1) * levelLength);
    for (let from = 0; from < rows; from++) {
      const comptonFactor = linear.incoherent[i] / raw.comptonTotal[from];
      const rayleighFactor = linear.coherent[i] / raw.rayleighTotal[from];
      for (let j = lowest[i]; j <= i; j++) {
        const even = (j - lowest[i]) * levelLength + from * ordinates;
        for (let to = 0; to < ordinates; to++) {
          const at = (from * ordinates + to) * 2;
          const level = (j - lowest[i]) * levelLength + at;
          let same = comptonFactor * raw.compton[level];
          let opposite = comptonFactor * raw.compton[level + 1];
          if (j === i) {
            same += rayleighFactor * raw.rayleigh[at];
            opposite += rayleighFactor * raw.rayleigh[at + 1];
          }
          const half = ordinateWeights[to] / 2;
          block[even + to] = half * (same + opposite);
          block[even + blockLength + to] = half * (same - opposite);
          scatteredEnergy[i * rows + from] += 2 * block[even + to] * energies_keV[j];
        }
      }
    }
    blocks.push(block);
  }
  return {
    attenuation: linear.attenuation,
    lowest,
    blocks,
    scatteredEnergy,
    fluorescence: fluorescenceTerms(material, energies_keV),
  };
}

/** The lowest node that Compton scattering from node i can reach. */
function lowestNode(energies_keV: Float64Array, i: number): number {
  const backscattered =
    energies_keV[i] / (1 + (2 * energies_keV[i]) / electronRestEnergy_keV.value);
  let j = i;
  while (j > 0 && energies_keV[j] > backscattered) j--;
  return j;
}

/** ∫ shape dφ towards the same and the opposite hemisphere, side by side, before rescaling. */
interface RawScattering {
  readonly compton: Float64Array;
  readonly rayleigh: Float64Array;
  /** Σ w′ of the above per from-direction, photons that fall below the first node included. */
  readonly comptonTotal: Float64Array;
  readonly rayleighTotal: Float64Array;
}

function rawScattering(
  material: Material,
  energies_keV: Float64Array,
  i: number,
  lowest: number,
): RawScattering {
  const shapes = angularShapes(material);
  const energy = energies_keV[i];
  const energyInElectrons = energy / electronRestEnergy_keV.value;
  const placeScale = gridPlacePerRootHalfSine(energy);
  const compton = new Float64Array((i - lowest + 1) * levelLength);
  const rayleigh = new Float64Array(levelLength);
  const comptonTotal = new Float64Array(rows);
  const rayleighTotal = new Float64Array(rows);
  for (const { from, to, side, cosTheta, rootHalfSine } of pairs) {
    const at = (from * ordinates + to) * 2 + side;
    let comptonSum = 0;
    let rayleighSum = 0;
    for (let k = 0; k < azimuths; k++) {
      const place = placeScale * rootHalfSine[k];
      rayleighSum += rayleighShape(cosTheta[k], shapeAt(shapes.coherent, place));
      const amount = comptonShape(energy, cosTheta[k], shapeAt(shapes.incoherent, place));
      comptonSum += amount;
      const scattered = energy / (1 + energyInElectrons * (1 - cosTheta[k]));
      if (scattered < energies_keV[0]) continue;
      let j = i;
      while (j > lowest && energies_keV[j] > scattered) j--;
      const share =
        j === i ? 0 : (scattered - energies_keV[j]) / (energies_keV[j + 1] - energies_keV[j]);
      const level = (j - lowest) * levelLength + at;
      compton[level] += amount * (1 - share);
      if (share > 0) compton[level + levelLength] += amount * share;
    }
    rayleigh[at] = rayleighSum;
    comptonTotal[from] += ordinateWeights[to] * comptonSum;
    rayleighTotal[from] += ordinateWeights[to] * rayleighSum;
    if (from === ray || to === from) continue;
    const mirrored = (to * ordinates + from) * 2 + side;
    rayleigh[mirrored] = rayleighSum;
    comptonTotal[to] += ordinateWeights[from] * comptonSum;
    rayleighTotal[to] += ordinateWeights[from] * rayleighSum;
    for (let level = 0; level < compton.length; level += levelLength) {
      compton[level + mirrored] = compton[level + at];
    }
  }
  return { compton, rayleigh, comptonTotal, rayleighTotal };
}
