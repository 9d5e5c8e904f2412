import { html, type SVGTemplateResult, svg, type TemplateResult } from 'lit';
import { techniqueInk } from './inks.js';
import { techniqueMark } from './technique-mark.js';

/** A difference in percent, its standard error, and the tolerance it is held against. */
export interface Difference {
  readonly difference_percent: number;
  readonly standardError_percent: number;
  readonly tolerance_percent: number;
}

const width = 110;
const height = 14;
const middle = width / 2;
const edge = 5;
/** The tolerance takes this share of the half width, so that what exceeds it still shows. */
const share = 0.45;

/** Place of a difference on the bar, px from its left; the ends hold what lies beyond. */
export function differencePosition(difference_percent: number, tolerance_percent: number): number {
  const x = middle + (difference_percent / tolerance_percent) * share * middle;
  return Math.min(width - edge, Math.max(edge, x));
}

const whisker = (of: Difference, errors: number): SVGTemplateResult => {
  const half = errors * of.standardError_percent;
  const at = (difference: number) => differencePosition(difference, of.tolerance_percent);
  return svg`<line class="whisker" x1=${at(of.difference_percent - half)} x2=${at(of.difference_percent + half)}
    y1=${height / 2} y2=${height / 2} stroke-width=${errors === 1 ? 4 : 1.5} />`;
};

/**
 * Where an estimate lies against transport: no difference in the middle, the tolerance as a band
 * about it, the difference with one and two standard errors. The figures stand beside it.
 *
 * @param ink number of the technique, for its sign and ink.
 */
export function differenceBar(of: Difference, ink: number): TemplateResult {
  const { color } = techniqueInk(ink);
  const low = differencePosition(-of.tolerance_percent, of.tolerance_percent);
  const high = differencePosition(of.tolerance_percent, of.tolerance_percent);
  const x = differencePosition(of.difference_percent, of.tolerance_percent);
  return html`<svg class="difference" width=${width} height=${height} viewBox="0 0 ${width} ${height}" aria-hidden="true" style="color:${color}">
    <rect class="stated" x=${low} width=${high - low} y="0" height=${height} />
    <line class="none" x1=${middle} x2=${middle} y1="0" y2=${height} />
    ${whisker(of, 2)} ${whisker(of, 1)}
    <g transform="translate(${x},${height / 2}) scale(0.75)">${techniqueMark(ink, 0, 0)}</g>
  </svg>`;
}
