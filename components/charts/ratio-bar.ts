import { html, type SVGTemplateResult, svg, type TemplateResult } from 'lit';
import { formatRatio } from './format.js';

/** Greatest ratio a bar can show either way; beyond it the bar ends in an arrow. */
const reach = 4;
const width = 84;
const height = 10;

/** Where a ratio lies on the bar's logarithmic scale, in px; 1 is the middle. */
export const ratioPosition = (ratio: number): number => {
  const octaves = Math.log2(Math.min(reach, Math.max(1 / reach, ratio)));
  return width / 2 + (octaves / Math.log2(reach)) * (width / 2 - 2);
};

const arrow = (ratio: number): SVGTemplateResult => {
  const tip = ratio > 1 ? width : 0;
  const back = ratio > 1 ? width - 5 : 5;
  return svg`<path class="bar" d="M${tip},${height / 2} L${back},1 L${back},${height - 1} Z" />`;
};

/**
 * A ratio as a small bar about 1 (logarithmic, a quarter to four times) followed by its figure.
 * Left of the tick is less, right of it more. Empty when there is no ratio.
 */
export function ratioBar(ratio: number | null, color = 'var(--madder)'): TemplateResult {
  if (ratio === null || !(ratio > 0)) return html`<span class="ratio none">–</span>`;
  const x = ratioPosition(ratio);
  const beyond = ratio > reach || ratio < 1 / reach;
  return html`<span class="ratio"
    ><svg width=${width} height=${height} viewBox="0 0 ${width} ${height}" aria-hidden="true" style="color:${color}">
      <line class="scale" x1="2" x2=${width - 2} y1=${height / 2} y2=${height / 2} />
      <rect class="bar" x=${Math.min(x, width / 2)} y="3" width=${Math.abs(x - width / 2)} height="4" />
      ${beyond ? arrow(ratio) : null}
      <line class="one" x1=${width / 2} x2=${width / 2} y1="0" y2=${height} />
    </svg>
    <span class="figure">${formatRatio(ratio)}</span></span
  >`;
}
