import { type SVGTemplateResult, svg } from 'lit';
import { techniqueInk } from './inks.js';

/** The sign of a technique at a place on a plot: filled disc for Current, open diamond for others. */
export function techniqueMark(index: number, x: number, y: number): SVGTemplateResult {
  const { color, mark } = techniqueInk(index);
  return mark === 'disc'
    ? svg`<circle cx=${x} cy=${y} r="4.5" fill=${color} />`
    : svg`<path d="M${x},${y - 6.5} l6.5,6.5 l-6.5,6.5 l-6.5,-6.5 Z" fill="var(--paper)" stroke=${color} stroke-width="1.6" />`;
}
