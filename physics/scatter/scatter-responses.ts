import { absorptionEdges } from '../../materials/index.js';
import type { Stack } from '../stack/stack.js';
import { type EnergyNodes, energyNodes, scatterRange_keV } from './energy-nodes.js';
import { estimate } from './estimate.js';
import { firstOrder } from './first-order.js';
import { scatterGeometry } from './geometry.js';
import { infiniteField } from './infinite-field.js';
import type { DetectorScatter, FirstOrderScatter, ScatterResponses } from './responses.js';
import { type ScatterDetector, type ScatterGrid, scoreCount, scoreTable } from './scores.js';
import { skinScatter } from './skin-scatter.js';
import { type Slab, slabsOf } from './slabs.js';

/** L edges of lead strips lie at 13–16 keV, where they are opaque on either side: left out. */
const leastGridEdge_keV = 20;

/** Nodes for a stack: 10–150 keV with every edge of slabs, detector and grid. */
export function nodesFor(
  slabs: readonly Slab[],
  detector: ScatterDetector,
  grid: ScatterGrid | null,
): EnergyNodes {
  const ofSlabs = slabs.flatMap(({ material }) =>
    absorptionEdges(material, ...scatterRange_keV).map(({ energy_keV }) => energy_keV),
  );
  const ofGrid = (grid?.edges_keV ?? []).filter((edge) => edge >= leastGridEdge_keV);
  return energyNodes([...ofSlabs, ...detector.edges_keV, ...ofGrid]);
}

/**
 * Scatter from one collision only, exact. No answer to a user; what the estimate starts from, held
 * against published single-scatter values and laws.
 */
export function firstOrderResponses(
  stack: Stack,
  detector: ScatterDetector,
  grid: ScatterGrid | null,
): FirstOrderScatter {
  const slabs = slabsOf(stack);
  const nodes = nodesFor(slabs, detector, grid);
  const table = scoreTable(detector, grid, nodes);
  const { compton, rayleigh } = firstOrder(slabs, scatterGeometry(stack), nodes, table);
  const both = compton.map((values, score) => values.map((value, i) => value + rayleigh[score][i]));
  return {
    energies_keV: nodes.energies_keV,
    withoutGrid: detectorScatter(both, 0),
    behindGrid: grid && detectorScatter(both, scoreCount),
  };
}

const detectorScatter = (scores: readonly Float64Array[], from: number): DetectorScatter => ({
  signal: scores[from],
  noise: scores[from + 1],
  counts: scores[from + 2],
  airKerma: scores[from + 3],
});

/**
 * Scatter, backscatter and deposition of a stack in its geometry, for every incident energy: exact first
 * order, multiple scatter by adjoint discrete ordinates in the infinite field, brought to the field and
 * gap by a table from photon transport. Against transport: see test/reference/scatter-accuracy.csv.
 */
export function scatterResponses(
  stack: Stack,
  detector: ScatterDetector,
  grid: ScatterGrid | null,
): ScatterResponses {
  const slabs = slabsOf(stack);
  const nodes = nodesFor(slabs, detector, grid);
  const table = scoreTable(detector, grid, nodes);
  const infinite = infiniteField(slabs, stack.layers.length, nodes, detector, grid);
  const geometry = scatterGeometry(stack);
  const scores = estimate({ slabs, geometry, nodes, table, grid }, infinite);
  return {
    energies_keV: nodes.energies_keV,
    withoutGrid: detectorScatter(scores, 0),
    behindGrid: grid && detectorScatter(scores, scoreCount),
    backscatter: skinScatter(stack, slabs, nodes, infinite.backscatter),
    layerAbsorbedFraction: infinite.layerAbsorbedFraction,
  };
}
