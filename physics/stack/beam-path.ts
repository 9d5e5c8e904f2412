import { airPath, attenuate, outputDistance_mm } from '../beam/index.js';
import { type Spectrum, scaleSpectrum } from '../beam/spectrum.js';
import type { Stack } from './stack.js';

/**
 * Inverse square from the output distance; 1 in a parallel beam, whose fluence is the same all the
 * way and taken as that at the output distance.
 */
export const distanceFactor = (beam: Stack['beam'], distance_mm: number): number =>
  beam === 'parallel' ? 1 : (outputDistance_mm / distance_mm) ** 2;

/** Path in air from the focal spot to the skin, with the entrance support's thickness taken out. */
const airToSkin_mm = (stack: Stack): number => {
  const support_mm = stack.supportEntrance.reduce((sum, slab) => sum + slab.thickness_mm, 0);
  return stack.air ? Math.max(0, stack.sourceToSkin_mm - support_mm) : 0;
};

/**
 * The beam at the skin on the axis, behind air and support, without backscatter.
 *
 * @param output beam behind the added filter at 1 m in vacuum, per mAs.
 */
export const beamAtSkin = (output: Spectrum, stack: Stack): Spectrum =>
  scaleSpectrum(
    attenuate(output, [airPath(airToSkin_mm(stack)), ...stack.supportEntrance]),
    distanceFactor(stack.beam, stack.sourceToSkin_mm),
  );

/** The beam at a distance in free air, before any support: what a reference-point display states. */
export const beamInFreeAir = (output: Spectrum, stack: Stack, distance_mm: number): Spectrum =>
  scaleSpectrum(
    attenuate(output, [airPath(stack.air ? distance_mm : 0)]),
    distanceFactor(stack.beam, distance_mm),
  );

/**
 * Everything between the skin and the front of the grid on the axis, with inverse square from the
 * skin: the primary beam at the detector plane, before grid and detector cover.
 */
export const primaryAtDetector = (skin: Spectrum, stack: Stack): Spectrum => {
  const exitSupport_mm = stack.supportExit.reduce((sum, slab) => sum + slab.thickness_mm, 0);
  const gap_mm = stack.air ? Math.max(0, stack.exitToDetector_mm - exitSupport_mm) : 0;
  return scaleSpectrum(
    attenuate(skin, [...stack.layers, ...stack.supportExit, airPath(gap_mm)]),
    stack.beam === 'parallel' ? 1 : (stack.sourceToSkin_mm / stack.sourceToDetector_mm) ** 2,
  );
};
