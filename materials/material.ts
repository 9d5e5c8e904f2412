/** How sure we are of where a number comes from; shown beside it on the desk and in the dossier. */
export type Provenance = 'measured' | 'entered' | 'assumed' | 'published' | 'recalled' | 'computed';

/** Section-drawing family: decides the hatch a layer is drawn with, nothing physical. */
export type MaterialFamily =
  | 'adipose'
  | 'soft tissue'
  | 'bone'
  | 'lung'
  | 'liquid'
  | 'gas'
  | 'plastic'
  | 'metal'
  | 'agent'
  | 'detector';

/** One element's share of a material by mass. */
export interface MassFraction {
  readonly z: number;
  readonly massFraction: number;
}

/**
 * What matter is, as far as photons care: composition by mass and density.
 * `massFractions` is ascending in Z and sums to 1 (renormalised on construction).
 */
export interface Material {
  readonly name: string;
  readonly density_g_per_cm3: number;
  readonly massFractions: readonly MassFraction[];
  readonly family: MaterialFamily;
  readonly source: string;
  readonly provenance: Provenance;
}
