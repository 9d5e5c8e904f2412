import { massAttenuation } from '../../../materials/index.js';
import { airKermaAxes, fieldAxes } from '../field-axes.js';
import { type ComptonScatter, firstCompton } from './first-compton.js';
import { type Effort, firePencil, named } from './water-pencil.js';

const { energies_keV, thicknesses_cm, gaps_cm, halfSides_cm } = fieldAxes;

/** Beyond this optical thickness analog transport brings too little through; the thinner slab stands in. */
const thickest_mfp = 10.5;
/** A field that caught fewer photons than this takes the factor of the next larger one. */
const leastCount = 600;
/** Backscatter of slabs thicker than this is that of a half space, to 0.2 %. */
const backscatterThickness_cm = 20;

/** What the table holds, and what it took. */
export interface FieldFactors {
  /** Energy-major, then thickness, gap, half side. */
  readonly energy: number[];
  /** The same for air kerma, at the energies and thicknesses of `airKermaAxes`. */
  readonly airKerma: number[];
  /** Energy-major, then half side: share of the backscatter of an infinite field. */
  readonly backscatter: number[];
  readonly photons: number;
}

/**
 * Per energy, thickness, gap and field of water: share of multiple scatter a field keeps of an infinite
 * one, divided by the same share of first-order Compton scatter.
 */
export function fieldFactors(seed: number, effort: Effort): FieldFactors {
  const energyFactors: number[] = [];
  const kermaFactors: number[] = [];
  const backscatter: number[] = [];
  const compton = comptonShares();
  let photons = 0;
  energies_keV.forEach((energy, e) => {
    const mu = massAttenuation(named('water'), energy);
    let thinner: { energy: number[]; airKerma: number[] } | null = null;
    let back: Float64Array = new Float64Array(halfSides_cm.length + 1).fill(1);
    thicknesses_cm.forEach((thickness, t) => {
      if (mu * thickness <= thickest_mfp || thinner === null) {
        const run = firePencil(
          energy,
          thickness,
          gaps_cm,
          halfSides_cm,
          seed + 100 * e + t,
          effort,
        );
        photons += run.photons;
        if (t === 0 || thickness <= backscatterThickness_cm) back = run.backscatter;
        const of = (name: keyof ComptonScatter) =>
          gaps_cm.flatMap((_, g) =>
            factors(
              run[name][g],
              run.count,
              compton[t][g].map((c) => c[name][e]),
            ),
          );
        thinner = { energy: of('energy'), airKerma: of('airKerma') };
      }
      energyFactors.push(...thinner.energy);
      const isKermaNode =
        airKermaAxes.energies_keV.includes(energy) &&
        airKermaAxes.thicknesses_cm.includes(thickness);
      if (isKermaNode) kermaFactors.push(...thinner.airKerma);
    });
    backscatter.push(...halfSides_cm.map((_, a) => back[a] / back[halfSides_cm.length]));
    process.stderr.write(`${energy} keV, ${(photons / 1e6).toFixed(0)} million photons\n`);
  });
  return { energy: energyFactors, airKerma: kermaFactors, backscatter, photons };
}

/** From the smallest field to the largest; the infinite field stands last in `scores`. */
function factors(scores: Float64Array, count: number, comptonShare: number[]): number[] {
  const all = scores[halfSides_cm.length];
  const result: number[] = [];
  for (let a = halfSides_cm.length - 1; a >= 0; a--) {
    const share = scores[a] / all;
    const larger = result[a + 1] ?? 1;
    result[a] = share * count < leastCount ? larger : share / comptonShare[a];
  }
  return result;
}

/** C(a)/C(∞) by thickness, gap and half side. */
function comptonShares(): ComptonScatter[][][] {
  return thicknesses_cm.map((thickness) => {
    const infinite = firstCompton(thickness, 0, Number.POSITIVE_INFINITY);
    return gaps_cm.map((gap) =>
      halfSides_cm.map((halfSide) => {
        const here = firstCompton(thickness, gap, halfSide);
        const share = (name: keyof ComptonScatter) =>
          here[name].map((value, e) => value / infinite[name][e]);
        return { energy: share('energy'), airKerma: share('airKerma') };
      }),
    );
  });
}
