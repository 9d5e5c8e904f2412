import type { EnergyNodes } from './energy-nodes.js';
import { equivalentWater } from './equivalent-water.js';
import { multipleFieldFactor } from './field-table.js';
import { type FirstOrder, firstOrder } from './first-order.js';
import type { ScatterGeometry } from './geometry.js';
import { type GridShare, gridShare } from './grid-share.js';
import type { InfiniteField } from './infinite-field.js';
import {
  airKermaScore,
  type ScatterDetector,
  type ScatterGrid,
  type ScoreTable,
  scoreCount,
  scoreTable,
} from './scores.js';
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
  const spreads = comptonSpreads(here, firstOrder(slabs, broad, nodes, table));
  const energyTable = scoreTable(energyMeter, null, nodes);
  const [byEnergy] = comptonSpreads(
    firstOrder(slabs, geometry, nodes, energyTable),
    firstOrder(slabs, broad, nodes, energyTable),
  );
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

/** An ideal detector of energy, for which the field table was made. */
const energyMeter: ScatterDetector = {
  efficiency: () => 1,
  energyFraction: () => 1,
  energySquareFraction: () => 1,
  edges_keV: [],
};

/** Compton scatter here over that in an infinite field, by score; 1 where there is none at all. */
const comptonSpreads = (here: FirstOrder, infinite: FirstOrder): Float64Array[] =>
  here.compton.map((values, score) =>
    values.map((value, i) =>
      infinite.compton[score][i] > 0 ? value / infinite.compton[score][i] : 1,
    ),
  );

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
