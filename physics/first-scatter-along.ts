import type { Spectrum } from './beam/spectrum.js';
import { KeptBy, nothing } from './numeric/kept-by.js';
import type { OperatingPoint } from './operating-point.js';
import type { EnergyNodes } from './scatter/energy-nodes.js';
import { addSlab } from './scatter/first-order.js';
import { type FirstOrderPart, firstOrderParts } from './scatter/first-order-parts.js';
import { sublayerPoints } from './scatter/first-order-points.js';
import { scatterGeometry } from './scatter/geometry.js';
import { toChannels } from './scatter/on-channels.js';
import { nodesFor } from './scatter/scatter-responses.js';
import { type ScoreTable, scoreAngles, scoreCount, scoreTable } from './scatter/scores.js';
import { slabsOf } from './scatter/slabs.js';

/** Where the scatter at the field centre comes from: what scattered once, by the depth where it did. */
export interface FirstScatterAlong {
  /** Faces of the pieces, from 0 at the skin; one more than the values. */
  readonly faces_mm: readonly number[];
  /** Detector signal over that of the primary, per cm of depth; behind the grid where it is in. */
  readonly scatterToPrimary_per_cm: readonly number[];
}

/** Pieces the patient is cut into, one a layer at least. */
const pieces = 24;

/**
 * First-order scatter of detector signal at the field centre, piece by piece of the patient: exact as
 * the sum over the whole stack is, multiple scatter left out. Support scatters too and is not listed.
 */
export const firstScatterAlong = ({ made }: OperatingPoint): FirstScatterAlong => {
  const { faces_mm, nodes_keV, ratios } = originOf(made);
  const { energies_keV } = made.output;
  const signal = primarySignal(made.primary, made.chain);
  const whole = signal.reduce((sum, value) => sum + value, 0);
  const on = toChannels(nodes_keV, energies_keV);
  return {
    faces_mm,
    scatterToPrimary_per_cm: ratios.map((values, k) => {
      const ratio = on(values);
      const scatter = signal.reduce((sum, value, i) => sum + value * ratio[i], 0);
      const thickness_cm = (faces_mm[k + 1] - faces_mm[k]) / 10;
      return whole > 0 ? scatter / whole / thickness_cm : 0;
    }),
  };
};

const primarySignal = (
  { energies_keV, fluence_per_mm2 }: Spectrum,
  { detector, grid }: OperatingPoint['made']['chain'],
): Float64Array => {
  const { epsilon } = detector.on(energies_keV);
  const passed = grid?.table.primaryOn(energies_keV);
  return fluence_per_mm2.map(
    (photons, i) => photons * energies_keV[i] * epsilon[i] * (passed ? passed[i] : 1),
  );
};

interface Origin {
  readonly faces_mm: readonly number[];
  readonly nodes_keV: Float64Array;
  /** Scatter over primary of every piece, over the nodes. */
  readonly ratios: readonly Float64Array[];
}

const origins = new KeptBy<Origin>();

/** Kept with stack, detector and grid, so that techniques alike share it. */
const originOf = ({ placement, chain }: OperatingPoint['made']): Origin => {
  const { stack } = placement;
  const grid = chain.grid?.table ?? null;
  return origins.get([stack, chain.detector, grid ?? nothing], () => {
    const geometry = scatterGeometry(stack);
    const slabs = slabsOf(stack);
    const nodes = nodesFor(slabs, chain.detector, grid);
    const table = scoreTable(chain.detector, grid, nodes);
    const faces_mm = [0];
    const ratios: Float64Array[] = [];
    let below_cm = geometry.gap_cm + slabs.reduce((sum, slab) => sum + slab.thickness_cm, 0);
    for (const part of firstOrderParts(slabs, geometry, nodes.fine_keV)) {
      const { thickness_cm, layerIndex } = part.slab;
      below_cm -= thickness_cm;
      if (layerIndex === null) continue;
      const count = Math.max(1, Math.round((thickness_cm * 10 * pieces) / stack.thickness_mm));
      const points = sublayerPoints(geometry, thickness_cm, below_cm, count);
      const each = points.length / count;
      // The points begin at the lower face.
      for (let piece = count - 1; piece >= 0; piece--) {
        const own = points.subarray(piece * each, (piece + 1) * each);
        ratios.push(ratioOf({ ...part, pointsFor: () => own }, nodes, table, grid !== null));
        faces_mm.push(faces_mm[faces_mm.length - 1] + (thickness_cm * 10) / count);
      }
    }
    return { faces_mm, nodes_keV: nodes.energies_keV, ratios };
  });
};

/** Compton and Rayleigh scatter of a piece over the primary, of signal behind the grid if there is one. */
const ratioOf = (
  part: FirstOrderPart,
  nodes: EnergyNodes,
  table: ScoreTable,
  isBehindGrid: boolean,
): Float64Array => {
  const signal = isBehindGrid ? scoreCount : 0;
  const sums = new Float64Array(2 * table.width);
  return nodes.energies_keV.map((_, node) => {
    sums.fill(0);
    addSlab(part, nodes, node, table, sums);
    const primary = table.values[nodes.fineIndex[node] * scoreAngles * table.width + signal];
    return primary > 0 ? (sums[signal] + sums[table.width + signal]) / primary : 0;
  });
};
