/**
 * Scatter and deposition of one stack in one geometry, as functions of the incident energy.
 *
 * For a fixed stack and geometry every output is linear in the incident spectrum, so these are
 * computed once and every technique and sweep setting is a dot product with them. Values at node i
 * belong to one incident energy; an absorption edge stands as two nodes, just below and just above,
 * and nothing is interpolated across it.
 */
export interface DetectorScatter {
  /** Scatter over primary at the field centre, of energy-weighted signal E·ε. */
  readonly signal: Float64Array;
  /** Of E²·ε₂, which carries the quantum noise. */
  readonly noise: Float64Array;
  /** Of detected counts η. */
  readonly counts: Float64Array;
  /** Of detector air kerma E·(μen/ρ)air, scatter weighted 1/cosβ. */
  readonly airKerma: Float64Array;
}

export interface ScatterResponses {
  /** Incident energies, ascending; equal neighbours never occur (edges stand a hair apart). */
  readonly energies_keV: Float64Array;
  readonly withoutGrid: DetectorScatter;
  /** Scatter behind the grid over primary behind the grid; null without a grid. */
  readonly behindGrid: DetectorScatter | null;
  /**
   * Air kerma of scatter at the skin over that of the primary, which has passed any support: B − 1. It
   * counts what the patient sends back and what a support before the patient sends forward.
   */
  readonly backscatter: Float64Array;
  /** Per layer, energy absorbed over incident energy, infinite width. */
  readonly layerAbsorbedFraction: readonly Float64Array[];
}

/** Scatter at the detector from one collision only. */
export type FirstOrderScatter = Pick<
  ScatterResponses,
  'energies_keV' | 'withoutGrid' | 'behindGrid'
>;
