import { html, type TemplateResult } from 'lit';
import { densityRows, densitySteps } from '../../../scenes/density-rows.js';
import { shownShading } from '../../../scenes/drawing/stack-drawing.js';
import type { StackAnchors } from '../../../scenes/stack-anchors.js';
import type { StackLayout } from '../../../scenes/stack-layout.js';
import type { StackScene } from '../../../scenes/stack-scene-data.js';
import { type BeamHalf, sectionDrawing } from '../../charts/section-drawing.js';
import { spineOfScene } from './spine-of-scene.js';

/** Gradient stops that are enough for an eye. */
const stops = 48;

/** The beam of one technique from the ink the 3D drawing would have. */
function half(scene: StackScene, row: readonly number[], index: 0 | 1, at: StackAnchors): BeamHalf {
  const { filter, isGridIn } = scene.techniques[index] ?? scene.techniques[0];
  const shade = Array.from({ length: stops + 1 }, (_, i) => {
    const share = i / stops;
    return {
      y: at.source + share * (at.detector.top - at.source),
      density: row[Math.min(densitySteps - 1, Math.floor(share * densitySteps))],
    };
  });
  return { index, filtered: filter !== null, gridIn: isGridIn, shade };
}

/** The same stack as a flat section, at the same places: shown where there is no WebGL2. */
export function sectionFallback(
  scene: StackScene,
  layout: StackLayout,
  at: StackAnchors,
): TemplateResult {
  const rows = densityRows(scene, layout, shownShading(scene));
  const { detail } = scene;
  const second = scene.techniques.length > 1 ? half(scene, rows[1], 1, at) : null;
  return html`<svg class="section drawing" viewBox="0 0 ${at.width} ${at.height}" aria-hidden="true">
    ${sectionDrawing({
      layout: spineOfScene(at),
      layers: scene.layers,
      support: scene.supportEntrance.length > 0,
      grid: scene.grid !== null,
      detail: detail && {
        breadth_mm: detail.form === 'cylinder' ? detail.height_mm : detail.breadth_mm,
        height_mm: detail.height_mm,
        round: detail.form === 'cylinder',
      },
      halves: [half(scene, rows[0], 0, at), second],
      idPrefix: 'stack-view',
    })}
  </svg>`;
}
