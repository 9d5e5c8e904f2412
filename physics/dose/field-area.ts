import type { Stack } from '../stack/stack.js';

/** Area of the true field rectangle at a distance from the focal spot, cm². */
export const fieldArea_cm2 = (stack: Stack, distance_mm: number): number => {
  const scale = stack.beam === 'parallel' ? 1 : distance_mm / stack.sourceToDetector_mm;
  return (stack.field_mm[0] * stack.field_mm[1] * scale * scale) / 100;
};
