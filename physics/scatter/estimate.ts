import { comptonEnergyRatio } from '../../materials/index.js';
import { type EnergyNodes, isEdge } from './energy-nodes.js';
import { equivalentWater } from './equivalent-water.js';
import { multipleFieldFactor } from './field-table.js';
import { type FirstOrder, firstOrder } from './first-order.js';
import type { ScatterGeometry } from './geometry.js';
import { type GridShare, gridShare } from './grid-share.js';
import type { InfiniteField } from './infinite-field.js';
import { airKermaScore, type ScatterGrid, type ScoreTable, scoreCount } from './scores.js';
import type { Slab } from './slabs.js';

/** A stack in its geometry, on the energies it is solved for. */
export interface ScatterScene {
  readonly slabs: readonly Slab[];
  readonly geometry: ScatterGeometry;
  readonly nodes: EnergyNodes;
  readonly table: ScoreTable;
  readonly grid: ScatterGrid | null;
}

/**
 * Scatter over primary of every score of a table, over the nodes: exact first order, and multiple
 * scatter of the infinite field brought to this field, gap and beam.
 *
 * SPR = C + R + M∞ · f [· G/G∞ behind a grid], f = h · C/C∞. C∞ is the first-order Compton scatter of
 * the same stack in an infinite parallel beam, so C/C∞ holds field, gap and divergence; h, from
 * transport in water that scatters alike, is how multiple scatter differs from it (see
 * `multipleFieldFactor`); G as in `gridShare`.
 *
 * Air kerma has an h of its own. The others take that of energy; there C/C∞ is the geometric mean of
 * that by energy and that by the detector's own score: multiple scatter has half forgotten which way
 * its energy came (detector weighting alone is 9 % low, energy alone 7 % high for CsI at 80 keV).
 */
export function estimate(scene: ScatterScene, { multiple }: InfiniteField): Float64Array[] {
  const { slabs, geometry, nodes, table, grid } = scene;
  const broad: ScatterGeometry = {
    ...geometry,
    beam: 'parallel',
    halfSide_cm: Number.POSITIVE_INFINITY,
  };
  const here = firstOrder(slabs, geometry, nodes, table);
  const spreads = comptonSpreads(here, firstOrder(slabs, broad, nodes, table), nodes.energies_keV);
  const byEnergy = spreads[table.width - 1];
  const factor = {
    energy: fieldFactors('energy', slabs, geometry, nodes.energies_keV),
    airKerma: fieldFactors('airKerma', slabs, geometry, nodes.energies_keV),
  };
  const obliquity = grid && {
    here: gridShare(slabs, geometry, nodes, grid),
    broad: gridShare(slabs, broad, nodes, grid),
  };
  return multiple.map((values, score) => {
    const isBehindGrid = score >= scoreCount;
    const isAirKerma = score % scoreCount === airKermaScore;
    const own = spreads[score % scoreCount];
    return values.map((value, i) => {
      const field = isAirKerma
        ? factor.airKerma[i] * own[i]
        : factor.energy[i] * Math.sqrt(own[i] * byEnergy[i]);
      const passing =
        isBehindGrid && obliquity ? gridGain(obliquity, isAirKerma ? 'fluence' : 'plane', i) : 1;
      return here.compton[score][i] + here.rayleigh[score][i] + value * field * passing;
    });
  });
}

/** Compton scatter here over that in an infinite field, by score; 1 where there is none at all. */
const comptonSpreads = (
  here: FirstOrder,
  infinite: FirstOrder,
  energies_keV: Float64Array,
): Float64Array[] =>
  here.compton.map((values, score) =>
    bridgeEdges(
      values.map((value, i) =>
        infinite.compton[score][i] > 0 ? value / infinite.compton[score][i] : 1,
      ),
      energies_keV,
    ),
  );

/**
 * Just above an edge first-order scatter is mostly what Compton scattering carries below the edge, at
 * large angles; multiple scatter, with the K lines, gets below it otherwise. Where scattering by 90°
 * crosses an edge the ratio below the edge stands.
 */
function bridgeEdges(ratios: Float64Array, energies_keV: Float64Array): Float64Array {
  const bridged = ratios.slice();
  for (let edge = 0; edge < ratios.length - 1; edge++) {
    if (!isEdge(energies_keV, edge)) continue;
    for (let i = edge + 1; i < ratios.length; i++) {
      if (energies_keV[i] * comptonEnergyRatio(energies_keV[i], 0) >= energies_keV[edge]) break;
      bridged[i] = bridged[edge];
    }
  }
  return bridged;
}

const gridGain = (
  { here, broad }: { readonly here: GridShare; readonly broad: GridShare },
  weighting: keyof GridShare,
  i: number,
): number => (broad[weighting][i] > 0 ? here[weighting][i] / broad[weighting][i] : 1);

/** Field factors of the equivalent water slab, lengths scaled as its thickness is. */
function fieldFactors(
  quantity: 'energy' | 'airKerma',
  slabs: readonly Slab[],
  { gap_cm, halfSide_cm }: ScatterGeometry,
  energies_keV: Float64Array,
): Float64Array {
  const all_cm = slabs.reduce((sum, slab) => sum + slab.thickness_cm, 0);
  const water = equivalentWater(slabs, energies_keV);
  return water.thickness_cm.map((thickness_cm, i) => {
    const scale = all_cm > 0 ? thickness_cm / all_cm : 1;
    return multipleFieldFactor(quantity, water.energy_keV[i], {
      thickness_cm,
      gap_cm: gap_cm * scale,
      halfSide_cm: halfSide_cm * scale,
    });
  });
}
