import { html, nothing, svg, type TemplateResult } from 'lit';
import { shownShading } from '../../../scenes/drawing/stack-drawing.js';
import { type InkScale, inkScale, inkTicks } from '../../../scenes/ink-scale.js';
import type { StackLayout } from '../../../scenes/stack-layout.js';
import type { Shading, StackScene } from '../../../scenes/stack-scene-data.js';
import { formatNumber } from '../../charts/format.js';
import { raisedPower } from './tick-text.js';

const width = 132;
const bar = 5;

/** Place of a value on the ramp, px; paper on the left, most ink on the right. */
export function rampPosition({ scale, least, most }: InkScale, value: number): number {
  const share =
    scale === 'linear' ? value / most : Math.log(value / least) / Math.log(most / least || 1);
  return width * Math.min(1, Math.max(0, share));
}

/** One technique's ramp from the least ink to the most; the ink grows evenly along it. */
const ramp = (id: string, color: string, y: number, ink: InkScale) => svg`
  <linearGradient id=${id}>
    <stop offset="0" stop-color=${color} stop-opacity=${ink.density(ink.least || ink.most * 1e-6)} />
    <stop offset="1" stop-color=${color} stop-opacity=${ink.density(ink.most)} />
  </linearGradient>
  <rect x="0" y=${y} width=${width} height=${bar} fill="url(#${id})" />`;

/** What is not to scale: `to scale; free air shortened 5.6 times above, 1.5 below`. */
export function scaleWords({ shortened, skin }: StackLayout): string {
  if (shortened.length === 0) return 'to scale';
  const parts = shortened.map(({ at, factor }, i) => {
    const times = `${formatNumber(factor, 2)}${i === 0 ? ' times' : ''}`;
    return `${times} ${at < skin ? 'above' : 'below'}`;
  });
  return `to scale; free air shortened ${parts.join(', ')}`;
}

const inkWords = ({ quantity, unit }: Shading): string =>
  [quantity, unit].filter(Boolean).join(', ');

/** The quantity shown, or a choice between several. */
function inkChoice(
  shown: Shading,
  choices: readonly Shading[],
  choose: (quantity: string) => void,
) {
  const name = `ink, ${shown.scale} scale:`;
  if (choices.length < 2) return html`<span>${name} ${inkWords(shown)}</span>`;
  return html`<label
    >${name}
    <select @change=${(event: Event) => choose((event.target as HTMLSelectElement).value)}>
      ${choices.map(
        (each) =>
          html`<option value=${each.quantity} ?selected=${each.quantity === shown.quantity}>${inkWords(each)}</option>`,
      )}
    </select></label
  >`;
}

/** The ramps of both techniques with marks at round values. */
function ramps(scene: StackScene, ink: InkScale) {
  const text = ink.scale === 'log' ? raisedPower : (value: number) => formatNumber(value, 2);
  return html`<svg width=${width + 16} height="26" viewBox="-8 0 ${width + 16} 26" aria-hidden="true">
    ${ramp('current-ramp', 'var(--graphite)', 0, ink)}
    ${scene.techniques.length > 1 ? ramp('proposed-ramp', 'var(--madder)', bar + 1, ink) : nothing}
    ${inkTicks(ink).map((tick) => {
      const x = rampPosition(ink, tick);
      return svg`<path d="M${x},0 v${2 * bar + 3}" /><text x=${x} y="24" text-anchor="middle">${text(tick)}</text>`;
    })}
  </svg>`;
}

/** What the ink means: the quantity, its unit, the scale of both techniques, and what is not to scale. */
export function stackLegend(
  scene: StackScene,
  layout: StackLayout | null,
  choices: readonly Shading[],
  choose: (quantity: string) => void,
): TemplateResult {
  const shown = shownShading(scene);
  const ink = inkScale(shown);
  return html`<div class="legend" part="legend">
      ${ink.most > 0 ? ramps(scene, ink) : nothing} ${inkChoice(shown, choices, choose)}
    </div>
    <div class="scale">${layout ? scaleWords(layout) : 'to scale'}</div>`;
}
