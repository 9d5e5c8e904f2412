import type { DepthProfile } from './stack-scene-data.js';

/**
 * A profile that keeps one value through each layer and steps at their faces.
 *
 * @param faces_mm depths of the layers' faces, ascending, one more than `values`.
 */
export const stepProfile = (
  faces_mm: readonly number[],
  values: readonly number[],
): DepthProfile => ({
  depths_mm: values.flatMap((_, i) => [faces_mm[i], faces_mm[i + 1]]),
  values: values.flatMap((value) => [value, value]),
});
