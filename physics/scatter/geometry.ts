import type { Stack } from '../stack/stack.js';

/** Where the field and the detector lie, for scatter on the axis; lengths in cm. */
export interface ScatterGeometry {
  readonly beam: 'point' | 'parallel';
  readonly sourceToDetector_cm: number;
  readonly gap_cm: number;
  /** Half side of the equivalent square field at the detector; Infinity for a field without end. */
  readonly halfSide_cm: number;
}

/** The geometry of a stack; support behind the patient takes its thickness from the gap. */
export function scatterGeometry(stack: Stack): ScatterGeometry {
  const support_mm = stack.supportExit.reduce((sum, { thickness_mm }) => sum + thickness_mm, 0);
  return {
    beam: stack.beam,
    sourceToDetector_cm: stack.sourceToDetector_mm / 10,
    gap_cm: Math.max(0, stack.exitToDetector_mm - support_mm) / 10,
    halfSide_cm: equivalentSquare_mm(stack.field_mm) / 20,
  };
}

/** The field at the skin, as if the detector stood there. */
export function fieldAtSkin(stack: Stack): ScatterGeometry {
  const { beam, halfSide_cm } = scatterGeometry(stack);
  const narrowing = beam === 'point' ? stack.sourceToSkin_mm / stack.sourceToDetector_mm : 1;
  return {
    beam,
    sourceToDetector_cm: stack.sourceToSkin_mm / 10,
    gap_cm: 0,
    halfSide_cm: halfSide_cm * narrowing,
  };
}

/** The same stack in a parallel field without end. */
export const broadened = (geometry: ScatterGeometry): ScatterGeometry => ({
  ...geometry,
  beam: 'parallel',
  halfSide_cm: Number.POSITIVE_INFINITY,
});

/** Side of the square with the same area over perimeter, 4A/P (common practice, no source). */
export const equivalentSquare_mm = ([width, height]: readonly [number, number]): number =>
  width + height > 0 ? (2 * width * height) / (width + height) : 0;

/**
 * Share of a circle's circumference inside a concentric square, r = radius over half side:
 * 1 below 1, 1 − (4/π) arccos(1/r) up to the corner at √2, then 0.
 */
export function shareInsideSquare(r: number): number {
  if (r < 1) return 1;
  return r < Math.SQRT2 ? 1 - (4 / Math.PI) * Math.acos(1 / r) : 0;
}
