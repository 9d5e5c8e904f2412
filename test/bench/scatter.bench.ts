/** Scatter of seven layers with a grid: quick answer, whole estimate, one solve by number of responses. */
import { kernelOf } from '../../physics/scatter/adjoint/kernel.js';
import { meshOf } from '../../physics/scatter/adjoint/mesh.js';
import { solveAdjoint } from '../../physics/scatter/adjoint/solve.js';
import { stackSources } from '../../physics/scatter/adjoint/stack-sources.js';
import { firstOrderResponses, scatterResponses } from '../../physics/scatter/index.js';
import { nodesFor } from '../../physics/scatter/scatter-responses.js';
import { slabsOf } from '../../physics/scatter/slabs.js';
import {
  accuracyDetector,
  accuracyGeometries,
  accuracyGrid,
  accuracyStacks,
} from '../physics/scatter/accuracy-stacks.js';
import type { Contest } from './bench.js';

const index = accuracyStacks.findIndex(({ layers }) => layers.length === 7);
const [{ stack }] = accuracyGeometries(index);
const slabs = slabsOf(stack);
const nodes = nodesFor(slabs, accuracyDetector, accuracyGrid);
const kernels = slabs.map(({ material }) => kernelOf(material, nodes.energies_keV));
const mesh = meshOf(slabs);
const solver = (layers: number, withGrid: boolean) => {
  const grid = withGrid ? accuracyGrid : null;
  const { sources } = stackSources(slabs, layers, nodes.energies_keV, accuracyDetector, grid);
  return {
    name: `adjoint solve of ${sources.width} responses`,
    run: () => solveAdjoint(mesh, kernels, nodes.energies_keV, sources),
  };
};

export const contests: readonly Contest[] = [
  {
    title: 'Scatter responses of seven layers with a grid',
    contenders: [
      {
        name: 'first order only',
        run: () => firstOrderResponses(stack, accuracyDetector, accuracyGrid),
      },
      { name: 'estimate', run: () => scatterResponses(stack, accuracyDetector, accuracyGrid) },
      solver(0, false),
      solver(stack.layers.length, true),
    ],
  },
];
