import { html, svg, type TemplateResult } from 'lit';
import type { StackLayout } from '../../../scenes/stack-layout.js';
import type { StackScene } from '../../../scenes/stack-scene-data.js';
import type { View } from '../../../scenes/view.js';
import { labelHeight_px, type PlacedLabel, stackLabels } from './stack-labels.js';

/** What stands on paper is named more quietly than what stands on ink. */
const isQuiet = ({ id }: PlacedLabel): boolean => id === 'air' || id === 'detector';

/** Names over the drawing, and thin lines from what they name. */
export function stackOverlay(scene: StackScene, layout: StackLayout, view: View): TemplateResult {
  const labels = stackLabels(scene, layout, view);
  const leaders = labels
    .filter(({ leads }) => leads)
    .map(({ anchor: [x, y], left, width, top }) => {
      const middle = top + labelHeight_px / 2;
      const end = left > x ? left - 1 : left + width + 1;
      return svg`<path d="M${x},${y} L${end},${middle}" />`;
    });
  return html`<svg class="leaders" aria-hidden="true">${leaders}</svg>
    ${labels.map(
      (label) => html`<span class="label ${isQuiet(label) ? 'soft' : ''}" part="label"
        style="left:${label.left.toFixed(1)}px;top:${label.top.toFixed(1)}px">${label.words}</span>`,
    )}`;
}
