import { html, svg, type TemplateResult } from 'lit';
import type { StackLayout } from '../../../scenes/stack-layout.js';
import type { StackScene } from '../../../scenes/stack-scene-data.js';
import type { View } from '../../../scenes/view.js';
import { labelHeight_px, type PlacedLabel, stackLabels } from './stack-labels.js';

const isMain = ({ id }: PlacedLabel): boolean => id.startsWith('layer') || id === 'detail';

/** Names over the drawing, and thin lines from what they name. */
export function stackOverlay(scene: StackScene, layout: StackLayout, view: View): TemplateResult {
  const labels = stackLabels(scene, layout, view);
  const leaders = labels
    .filter(({ leads }) => leads)
    .map(({ anchor: [x, y], left, top }) => {
      const middle = top + labelHeight_px / 2;
      return svg`<path d="M${x},${y} L${left - 1},${middle}" />`;
    });
  return html`<svg class="leaders" aria-hidden="true">${leaders}</svg>
    ${labels.map(
      (label) => html`<span class="label ${isMain(label) ? '' : 'soft'}" part="label"
        style="left:${label.left.toFixed(1)}px;top:${label.top.toFixed(1)}px">${label.words}</span>`,
    )}`;
}
