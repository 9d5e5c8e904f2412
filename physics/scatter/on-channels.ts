import { kept } from '../../materials/kept.js';
import { isEdge } from './energy-nodes.js';
import type { DetectorScatter, ScatterResponses } from './responses.js';

const made = new WeakMap<ScatterResponses, WeakMap<Float64Array, ScatterResponses>>();

/**
 * The same responses on the channels of a spectrum: ln of the value linear in ln E between nodes, never
 * across an edge; beyond the first and last node their values are held. Kept by identity of both
 * arguments. Through strong absorbers a ratio to the primary falls by orders of magnitude from node to
 * node: interpolating its logarithm keeps its product with the primary smooth.
 */
export function responsesOn(
  responses: ScatterResponses,
  energies_keV: Float64Array,
): ScatterResponses {
  const byEnergies = kept(made, responses, () => new WeakMap<Float64Array, ScatterResponses>());
  return kept(byEnergies, energies_keV, () => interpolate(responses, energies_keV));
}

function interpolate(responses: ScatterResponses, energies_keV: Float64Array): ScatterResponses {
  const column = toChannels(responses.energies_keV, energies_keV);
  const scatter = (of: DetectorScatter): DetectorScatter => ({
    signal: column(of.signal),
    noise: column(of.noise),
    counts: column(of.counts),
    airKerma: column(of.airKerma),
  });
  return {
    energies_keV,
    withoutGrid: scatter(responses.withoutGrid),
    behindGrid: responses.behindGrid && scatter(responses.behindGrid),
    backscatter: column(responses.backscatter),
    layerAbsorbedFraction: responses.layerAbsorbedFraction.map(column),
  };
}

/** What brings a column of values over nodes to the channels of a spectrum, as `responsesOn` does. */
export function toChannels(
  nodes_keV: Float64Array,
  energies_keV: Float64Array,
): (values: Float64Array) => Float64Array {
  const places = Array.from(energies_keV, (energy) => placeOf(nodes_keV, energy));
  return (values) =>
    Float64Array.from(places, ({ low, share }) => between(values[low], values[low + 1], share));
}

function between(low: number, high: number, share: number): number {
  if (share === 0) return low;
  return low > 0 && high > 0 ? low * (high / low) ** share : low + share * (high - low);
}

function placeOf(nodes: Float64Array, energy: number): { low: number; share: number } {
  const last = nodes.length - 1;
  if (!(energy > nodes[0])) return { low: 0, share: 0 };
  if (energy >= nodes[last]) return { low: last, share: 0 };
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (nodes[middle] <= energy) low = middle;
    else high = middle;
  }
  // Inside the hair of a doubled node the lower side holds: no mixing of the two.
  if (isEdge(nodes, low)) return { low, share: 0 };
  return { low, share: Math.log(energy / nodes[low]) / Math.log(nodes[low + 1] / nodes[low]) };
}
