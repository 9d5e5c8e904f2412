/** Where a distance along the beam is drawn. */
export interface Knot {
  readonly distance_mm: number;
  readonly drawn_mm: number;
}

/** The value at `at` of the straight pieces through (from, to), continued beyond the ends. */
function onPieces(from: readonly number[], to: readonly number[], at: number): number {
  let i = 1;
  while (i < from.length - 1 && at > from[i]) i += 1;
  const run = from[i] - from[i - 1];
  if (run === 0) return to[i];
  return to[i - 1] + ((at - from[i - 1]) / run) * (to[i] - to[i - 1]);
}

/**
 * The scale along the beam: straight pieces between knots, so that free air may be drawn shortened
 * while the patient keeps its proportions. Distances run from the focal spot, drawn lengths too.
 */
export interface AlongBeam {
  readonly knots: readonly Knot[];
  readonly drawnAt: (distance_mm: number) => number;
  readonly distanceAt: (drawn_mm: number) => number;
}

/** @param knots ascending in both lengths, two at least. */
export function alongBeam(knots: readonly Knot[]): AlongBeam {
  const distances = knots.map((knot) => knot.distance_mm);
  const drawn = knots.map((knot) => knot.drawn_mm);
  return {
    knots,
    drawnAt: (distance_mm) => onPieces(distances, drawn, distance_mm),
    distanceAt: (drawn_mm) => onPieces(drawn, distances, drawn_mm),
  };
}
