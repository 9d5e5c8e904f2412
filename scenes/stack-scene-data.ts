import type { MaterialFamily } from '../materials/material.js';

/** A slab as it is drawn: what it is called and made of, and how thick it is along the beam. */
export interface SceneSlab {
  readonly name: string;
  readonly material: string;
  readonly family: MaterialFamily;
  readonly thickness_mm: number;
}

/** What must be seen, at its place in the patient. */
export interface SceneDetail {
  /** A cylinder lies across the beam, its round end in the cut face. */
  readonly form: 'cylinder' | 'box';
  /** Depth of the centre below the skin. */
  readonly centreDepth_mm: number;
  /** Extent along the beam, across the cut face, and into the drawing. */
  readonly height_mm: number;
  readonly breadth_mm: number;
  readonly length_mm: number;
  /** True for a defect: the detail is where something is missing. */
  readonly isAbsence: boolean;
  readonly label: string;
}

/**
 * Values along the axis of the beam. Depths are below the skin, ascending, negative above it; the
 * value between two depths is interpolated, and there is none outside them.
 */
export interface DepthProfile {
  readonly depths_mm: ArrayLike<number>;
  readonly values: ArrayLike<number>;
}

/** A quantity shown as ink density, each technique in its half. */
export interface Shading {
  /** `primary photons per mm²`, `energy absorbed per mm depth`. */
  readonly quantity: string;
  /** Empty for a relative quantity. */
  readonly unit: string;
  readonly scale: 'log' | 'linear';
  /** Whether the ink fills the beam alone or the whole cut face of the patient. */
  readonly extent: 'beam' | 'body';
  /** As many as `techniques`; null while a value is not known. */
  readonly perTechnique: readonly (DepthProfile | null)[];
}

/**
 * What happened to the photon at the start of a piece of its path: nothing yet, scatter, or that it
 * was born by fluorescence. `absorbed` marks a point.
 */
export const trackKinds = ['primary', 'compton', 'rayleigh', 'absorbed', 'fluorescence'] as const;
export type TrackKind = (typeof trackKinds)[number];

/** Photon paths of one technique as straight pieces. */
export interface Tracks {
  /** Number of the technique in `techniques`. */
  readonly technique: 0 | 1;
  /** Six numbers a piece: from x, y, depth to x, y, depth; 0 on the axis, depth below the skin. */
  readonly segments_mm: Float32Array;
  /** Place in `trackKinds` of every piece; only the end of an `absorbed` piece is drawn. */
  readonly kinds: Uint8Array;
}

export interface SceneTechnique {
  readonly name: string;
  /** Null without an added filter. */
  readonly filter: { readonly label: string } | null;
  readonly isGridIn: boolean;
}

/**
 * Everything the layer view draws: plain data, resolved and computed elsewhere. Current is
 * `techniques[0]` and takes the left half of the beam, `techniques[1]` the right; with one technique
 * alone both halves are its own.
 */
export interface StackScene {
  readonly beam: 'point' | 'parallel';
  readonly sourceToSkin_mm: number;
  readonly sourceToDetector_mm: number;
  /** Width and height of the field at the detector. */
  readonly field_mm: readonly [number, number];
  /** Width and height of a finite body; null: without bounds, drawn a little beyond the field. */
  readonly lateral_mm: readonly [number, number] | null;
  /** Entrance to exit. */
  readonly layers: readonly SceneSlab[];
  readonly supportEntrance: readonly SceneSlab[];
  readonly supportExit: readonly SceneSlab[];
  readonly detail: SceneDetail | null;
  readonly grid: { readonly label: string } | null;
  readonly detector: { readonly label: string };
  readonly techniques: readonly [SceneTechnique] | readonly [SceneTechnique, SceneTechnique];
  /** Primary photons from focal spot to detector. */
  readonly primary: Shading;
  /** Shown instead of `primary`. */
  readonly shading?: Shading | null;
  readonly tracks?: Tracks | null;
}

export const patientThickness_mm = ({ layers }: StackScene): number =>
  layers.reduce((sum, layer) => sum + layer.thickness_mm, 0);

/** Depth of every face below the skin: entrance of the first layer to exit of the last. */
export function faceDepths_mm({ layers }: StackScene): number[] {
  const depths = [0];
  for (const layer of layers) depths.push(depths[depths.length - 1] + layer.thickness_mm);
  return depths;
}
