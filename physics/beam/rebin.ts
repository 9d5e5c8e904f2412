/** Photons spread over bins: `counts[i]` lie between `edges[i]` and `edges[i + 1]`. */
export interface Histogram {
  readonly edges: Float64Array;
  readonly counts: Float64Array;
}

/**
 * Moves counts into other bins, spreading each evenly over its own width, so that the number of
 * photons is kept.
 *
 * @returns the new counts, and the photons that lie below and above all new bins
 */
export function rebin(
  { edges, counts }: Histogram,
  newEdges: Float64Array,
): { readonly counts: Float64Array; readonly below: number; readonly above: number } {
  const bins = newEdges.length - 1;
  const lowest = newEdges[0];
  const highest = newEdges[bins];
  const moved = new Float64Array(bins);
  let below = 0;
  let above = 0;
  let first = 0;
  for (let i = 0; i < counts.length; i++) {
    const [from, to] = [edges[i], edges[i + 1]];
    const density = counts[i] / (to - from);
    below += density * Math.max(0, Math.min(to, lowest) - from);
    above += density * Math.max(0, to - Math.max(from, highest));
    while (first < bins && newEdges[first + 1] <= from) first++;
    for (let j = first; j < bins && newEdges[j] < to; j++) {
      moved[j] += density * (Math.min(to, newEdges[j + 1]) - Math.max(from, newEdges[j]));
    }
  }
  return { counts: moved, below, above };
}
