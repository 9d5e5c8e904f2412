import { type Material, namedMaterial } from '../../../materials/index.js';
import type { Spectrum } from '../../../physics/beam/spectrum.js';
import { runTransport } from '../../../physics/jobs/index.js';
import type { Stack } from '../../../physics/stack/stack.js';
import {
  buildTransportInput,
  type Estimated,
  idealDetector,
  type TransportInput,
  type TransportOptions,
  type TransportScores,
} from '../../../physics/transport/index.js';

export function named(name: string): Material {
  const material = namedMaterial(name);
  if (!material) throw new Error(`${name}: no such material`);
  return material;
}

/** A beam of one energy. */
export const monoenergetic = (energy_keV: number): Spectrum => ({
  edges_keV: new Float64Array(0),
  energies_keV: Float64Array.of(energy_keV),
  fluence_per_mm2: Float64Array.of(1),
});

/** Layers in a parallel beam 30 cm wide, in contact with the detector, in vacuum, unless said. */
export function slabStack(
  layers: readonly (readonly [Material, number])[],
  changes: Partial<Stack> = {},
): Stack {
  const thickness_mm = layers.reduce((sum, [, thickness_cm]) => sum + 10 * thickness_cm, 0);
  const sourceToDetector_mm = changes.sourceToDetector_mm ?? 1000;
  const exitToDetector_mm = changes.exitToDetector_mm ?? 0;
  return {
    sizeName: 'test',
    thickness_mm,
    layers: layers.map(([material, thickness_cm], i) => ({
      name: `layer ${i + 1}`,
      material,
      thickness_mm: 10 * thickness_cm,
    })),
    supportEntrance: [],
    supportExit: [],
    beam: 'parallel',
    sourceToSkin_mm: sourceToDetector_mm - exitToDetector_mm - thickness_mm,
    field_mm: [300, 300],
    air: false,
    ...changes,
    sourceToDetector_mm,
    exitToDetector_mm,
  };
}

export interface Run {
  readonly input: TransportInput;
  readonly scores: TransportScores;
}

/** A run with an ideal detector and no grid, without fluorescence unless asked for. */
export function flyThrough(
  stack: Stack,
  energy_keV: number,
  run: { readonly photons: number; readonly seed: number },
  options: Partial<TransportOptions> = {},
): Run {
  const beam = monoenergetic(energy_keV);
  const input = buildTransportInput(stack, beam, idealDetector, null, run, {
    fluorescence: false,
    ...options,
  });
  return { input, scores: runTransport(input) };
}

/** Deviation of a Monte Carlo value from a reference in combined standard errors. */
export const deviation = (found: Estimated, expected: number, expectedError = 0): number =>
  (found.value - expected) / Math.hypot(found.standardError ?? 0, expectedError);
