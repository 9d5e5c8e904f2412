import type { Material } from '../../materials/material.js';

/** One slab of the patient, resolved to matter. */
export interface StackLayer {
  readonly name: string;
  readonly material: Material;
  readonly thickness_mm: number;
}

/**
 * The patient at one size, placed in the room: what stands between tube and detector along the
 * axis. Distances run from the focal spot. Support is outside the patient.
 */
export interface Stack {
  readonly sizeName: string;
  readonly thickness_mm: number;
  /** Entrance to exit. */
  readonly layers: readonly StackLayer[];
  readonly supportEntrance: readonly StackLayer[];
  readonly supportExit: readonly StackLayer[];
  readonly beam: 'point' | 'parallel';
  readonly sourceToDetector_mm: number;
  readonly sourceToSkin_mm: number;
  readonly exitToDetector_mm: number;
  /** Width and height of the field at the detector. */
  readonly field_mm: readonly [number, number];
  readonly air: boolean;
}
