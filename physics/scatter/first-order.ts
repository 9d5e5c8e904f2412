import { electronRestEnergy_keV } from '../../materials/index.js';
import { locate, locatorOf } from '../numeric/locate.js';
import {
  angularNorms,
  comptonShape,
  gridPlacePerRootHalfSine,
  rayleighShape,
  shapeAt,
} from './angular.js';
import type { EnergyNodes } from './energy-nodes.js';
import { type FirstOrderPart, firstOrderParts } from './first-order-parts.js';
import { valuesPerPoint } from './first-order-points.js';
import type { ScatterGeometry } from './geometry.js';
import { airKermaScore, type ScoreTable, scoreAngles, scoreCount } from './scores.js';
import type { Slab } from './slabs.js';

/** Scatter over primary of every score of a table (see `ScoreTable`), one array over the nodes each. */
export interface FirstOrder {
  readonly compton: readonly Float64Array[];
  readonly rayleigh: readonly Float64Array[];
}

/** Keeps e^x finite where an edge lets scatter pass that the primary cannot. */
const greatestExponent = 500;

/**
 * Exact first-order scatter at the field centre for a cone or a parallel beam.
 *
 * SPR₁(E₀) = Σ ∫dz ∫2π sinβ dβ W (SDD/D₁)² cos²α e^{−τin(secα − 1)} [ σC pC (score(E′,β)/score(E₀,0))
 * e^{τout(E₀) − τout(E′)secβ} + σR pR (score(E₀,β)/score(E₀,0)) e^{τout(E₀)(1 − secβ)} ], derived from
 * single scattering in a slab; quadrature error 0.24 % rms. Air between and around is left out.
 *
 * @returns Compton and Rayleigh scatter over primary, both behind the grid for the grid's scores;
 * 0 where the primary scores nothing.
 */
export function firstOrder(
  slabs: readonly Slab[],
  geometry: ScatterGeometry,
  nodes: EnergyNodes,
  table: ScoreTable,
): FirstOrder {
  const parts = firstOrderParts(slabs, geometry, nodes.fine_keV);
  const count = nodes.energies_keV.length;
  const compton = Array.from({ length: table.width }, () => new Float64Array(count));
  const rayleigh = Array.from({ length: table.width }, () => new Float64Array(count));
  const sums = new Float64Array(2 * table.width);
  for (let i = 0; i < count; i++) {
    sums.fill(0);
    for (const part of parts) addSlab(part, nodes, i, table, sums);
    const primary = nodes.fineIndex[i] * scoreAngles * table.width;
    for (let score = 0; score < table.width; score++) {
      const reference = table.values[primary + score];
      compton[score][i] = reference > 0 ? sums[score] / reference : 0;
      rayleigh[score][i] = reference > 0 ? sums[table.width + score] / reference : 0;
    }
  }
  return { compton, rayleigh };
}

/** Adds the scatter of one slab at one node to `sums`: Compton by score, then Rayleigh by score. */
export function addSlab(
  part: FirstOrderPart,
  nodes: EnergyNodes,
  node: number,
  table: ScoreTable,
  sums: Float64Array,
): void {
  const { slab, shapes, linear, above, below } = part;
  const fine = nodes.fine_keV;
  const here = nodes.fineIndex[node];
  const energy = fine[here];
  const mu = linear.attenuation[here];
  const points = part.pointsFor(mu);
  const norms = angularNorms(slab.material, energy);
  const comptonFactor = norms.compton > 0 ? linear.incoherent[here] / norms.compton : 0;
  const rayleighFactor = norms.rayleigh > 0 ? linear.coherent[here] / norms.rayleigh : 0;
  const placeScale = gridPlacePerRootHalfSine(energy);
  const energyInElectrons = energy / electronRestEnergy_keV.value;
  const locator = locatorOf(fine);
  const { values, width } = table;
  const row = scoreAngles * width;
  for (let at = 0; at < points.length; at += valuesPerPoint) {
    const remaining = points[at];
    const weight = points[at + 1];
    const secantBeta = points[at + 3];
    const cosTheta = points[at + 4];
    const place = placeScale * points[at + 5];
    const angle = points[at + 6] | 0;
    const angleShare = points[at + 6] - angle;

    const tauIn = above[here] + mu * (slab.thickness_cm - remaining);
    const tauOut = below[here] + mu * remaining;
    const entering = tauOut - tauIn * points[at + 2];

    const scattered = energy / (1 + energyInElectrons * (1 - cosTheta));
    const low = locate(locator, scattered);
    const share = Math.min(1, Math.max(0, (scattered - fine[low]) / (fine[low + 1] - fine[low])));
    const tauLow = below[low] + linear.attenuation[low] * remaining;
    const tauHigh = below[low + 1] + linear.attenuation[low + 1] * remaining;
    const tauScattered = tauLow + share * (tauHigh - tauLow);

    const compton =
      weight *
      comptonFactor *
      comptonShape(energy, cosTheta, shapeAt(shapes.incoherent, place)) *
      Math.exp(Math.min(greatestExponent, entering - tauScattered * secantBeta));
    const rayleigh =
      weight *
      rayleighFactor *
      rayleighShape(cosTheta, shapeAt(shapes.coherent, place)) *
      Math.exp(entering - tauOut * secantBeta);

    const lowNear = compton * (1 - share) * (1 - angleShare);
    const lowFar = compton * (1 - share) * angleShare;
    const highNear = compton * share * (1 - angleShare);
    const highFar = compton * share * angleShare;
    const atLow = low * row + angle * width;
    const atHere = here * row + angle * width;
    for (let score = 0; score < width; score++) {
      const fluence = score % scoreCount === airKermaScore ? secantBeta : 1;
      sums[score] +=
        fluence *
        (lowNear * values[atLow + score] +
          lowFar * values[atLow + width + score] +
          highNear * values[atLow + row + score] +
          highFar * values[atLow + row + width + score]);
      sums[width + score] +=
        fluence *
        rayleigh *
        (values[atHere + score] +
          angleShare * (values[atHere + width + score] - values[atHere + score]));
    }
  }
}
