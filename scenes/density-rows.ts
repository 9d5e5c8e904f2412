import { inkScale, valueAt } from './ink-scale.js';
import type { StackLayout } from './stack-layout.js';
import type { Shading, StackScene } from './stack-scene-data.js';

/** Rows of ink along the drawn beam; the profile is smooth, a pixel of the page is enough. */
export const densitySteps = 1024;

/** Ink density of each technique from focal spot to detector, 0 to 1, at equal drawn steps. */
export function densityRows(scene: StackScene, layout: StackLayout, shading: Shading): number[][] {
  const { density } = inkScale(shading);
  const length = layout.detector.top;
  return [0, 1].map((technique) => {
    const profile = shading.perTechnique[technique] ?? null;
    return Array.from({ length: densitySteps }, (_, i) => {
      const drawn = ((i + 0.5) / densitySteps) * length;
      const depth_mm = layout.along.distanceAt(drawn) - scene.sourceToSkin_mm;
      const value = profile && valueAt(profile, depth_mm);
      return value === null ? 0 : density(value);
    });
  });
}
