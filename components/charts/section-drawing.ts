import { nothing, type SVGTemplateResult, svg } from 'lit';
import type { MaterialFamily } from '../../materials/material.js';
import { hatchDefinitions, hatchFill } from './hatches.js';
import { techniqueInk } from './inks.js';
import type { Band, SpineLayout } from './spine-layout.js';

/** What the drawing shows of one technique: its half of the beam. */
export interface BeamHalf {
  /** Number of the technique in the case; decides the ink. */
  readonly index: number;
  readonly filtered: boolean;
  readonly gridIn: boolean;
  /**
   * Ink density 0 to 1 of primary photons per mm² at heights along the page, ascending; empty
   * while nothing is known, then the beam is drawn as an outline.
   */
  readonly shade: readonly { readonly y: number; readonly density: number }[];
}

export interface SectionInput {
  readonly layout: SpineLayout;
  readonly layers: readonly { readonly name: string; readonly family: MaterialFamily }[];
  readonly support: boolean;
  readonly grid: boolean;
  /** Breadth and height of the detail along the beam, in mm. */
  readonly detail: {
    readonly breadth_mm: number;
    readonly height_mm: number;
    readonly round: boolean;
  } | null;
  readonly halves: readonly [BeamHalf, BeamHalf | null];
  /** Keeps the ids of two drawings on one page apart. */
  readonly idPrefix: string;
}

const path = (...points: readonly (readonly [number, number])[]): string =>
  `M${points.map(([x, y]) => `${x.toFixed(1)},${y.toFixed(1)}`).join('L')}Z`;

const rectangle = (layout: SpineLayout, { top, bottom }: Band, className: string, fill = 'none') =>
  svg`<rect class=${className} x=${layout.left} y=${top} width=${layout.right - layout.left} height=${bottom - top} fill=${fill} />`;

/** Top and right side of the body, drawn obliquely, so that it reads as a slab and not a list. */
function obliqueFaces(layout: SpineLayout): SVGTemplateResult {
  const { left, right, patient, recede } = layout;
  const top = patient.top;
  return svg`
    <path class="face" d=${path([left, top], [left + recede.x, top - recede.y], [right + recede.x, top - recede.y], [right, top])} />
    <path class="face side" d=${path([right, top], [right + recede.x, top - recede.y], [right + recede.x, patient.bottom - recede.y], [right, patient.bottom])} />
    ${layout.layers
      .slice(1)
      .map(
        (band) => svg`<path class="edge" d="M${right},${band.top} l${recede.x},${-recede.y}" />`,
      )}`;
}

/** One half of the fan, from the focal spot to the detector, shaded by primary photons. */
function beamHalf(
  layout: SpineLayout,
  half: BeamHalf,
  side: -1 | 1,
  prefix: string,
): SVGTemplateResult {
  const { axis, tube, detector } = layout;
  const bends = [layout.patient.top, layout.patient.bottom, detector.top];
  const edge = bends.map((y) => [axis + side * layout.halfWidth(y), y] as const);
  const outline = path([axis, detector.top], [axis, tube], ...edge);
  const id = `${prefix}-shade-${side}`;
  const { color } = techniqueInk(half.index);
  const stops = half.shade.map(
    ({ y, density }) =>
      svg`<stop offset=${((y - tube) / (detector.top - tube)).toFixed(4)} stop-color=${color} stop-opacity=${density.toFixed(3)} />`,
  );
  return svg`
    <linearGradient id=${id} gradientUnits="userSpaceOnUse" x1="0" x2="0" y1=${tube} y2=${detector.top}>${stops}</linearGradient>
    <path d=${outline} fill=${stops.length > 0 ? `url(#${id})` : 'none'} />
    <path class="ray" d=${`M${axis},${tube}${edge.map(([x, y]) => `L${x},${y}`).join('')}`} stroke=${color} stroke-dasharray=${techniqueInk(half.index).dash} />`;
}

/** The filter of each half: a thin line where there is none, a hatched slip where there is one. */
function filterHalf(layout: SpineLayout, half: BeamHalf, side: -1 | 1): SVGTemplateResult {
  const { color } = techniqueInk(half.index);
  const reach = 46 * side;
  const x = Math.min(layout.axis, layout.axis + reach);
  if (!half.filtered) {
    return svg`<line x1=${layout.axis} x2=${layout.axis + reach} y1=${layout.filter} y2=${layout.filter} stroke=${color} stroke-width="1" stroke-dasharray="2 3" />`;
  }
  return svg`<g style="--ink:${color}"><rect x=${x} y=${layout.filter - 3} width="46" height="6" fill="var(--paper)" />
    <rect class="slip" x=${x} y=${layout.filter - 3} width="46" height="6" stroke=${color} fill=${color} fill-opacity=".45" /></g>`;
}

/** Grid strips of one half, toward the focal spot; only the strips of a technique that uses it. */
function gridHalf(
  layout: SpineLayout,
  half: BeamHalf,
  side: -1 | 1,
): SVGTemplateResult | typeof nothing {
  const { axis, grid, tube } = layout;
  const reach = (layout.right - layout.left) / 2;
  const strips = Array.from({ length: Math.floor(reach / 5) }, (_, i) => 2.5 + 5 * i);
  const lean = 8 / (grid - tube);
  const d = strips
    .map((x) => `M${(axis + side * x).toFixed(1)},${grid} l${(side * x * lean).toFixed(2)},8`)
    .join('');
  return half.gridIn ? svg`<path class="strips" d=${d} />` : nothing;
}

/** The conventional break line across the shortened air. */
function airBreak({ axis, airBreak: y }: SpineLayout): SVGTemplateResult | typeof nothing {
  if (y === null) return nothing;
  const d = `M${axis - 62},${y} h44 l6,-7 l12,14 l6,-7 h44`;
  return svg`<path class="gap" d=${d} /><path class="break" d=${d} />`;
}

function detailMark(
  layout: SpineLayout,
  detail: NonNullable<SectionInput['detail']>,
): SVGTemplateResult {
  const height = Math.max(5, detail.height_mm * layout.px_per_mm);
  const breadth = Math.max(detail.round ? height : 12, detail.breadth_mm * layout.px_per_mm);
  const y = layout.detail ?? 0;
  return svg`<rect class="detail" x=${layout.axis - breadth / 2} y=${y - height / 2} width=${breadth} height=${height}
    rx=${detail.round ? height / 2 : 0} />`;
}

/**
 * The beam path as a section: focal spot, filters, support, layers hatched by family, detail, grid
 * and detector, the beam split down the middle between two techniques. Serves where there is no
 * WebGL, and in print. Without words: labels stand beside it.
 */
export function sectionDrawing(input: SectionInput): SVGTemplateResult {
  const { layout, layers, halves, idPrefix } = input;
  const sides = [-1, 1] as const;
  const each = (draw: (half: BeamHalf, side: -1 | 1) => unknown) =>
    halves.map((half, i) => (half ? draw(half, sides[i]) : nothing));
  return svg`
    <defs>${hatchDefinitions(idPrefix)}</defs>
    ${obliqueFaces(layout)}
    ${rectangle(layout, layout.patient, 'body')}
    ${layers.map((layer, i) => rectangle(layout, layout.layers[i], 'layer', hatchFill(idPrefix, layer.family)))}
    ${each((half, side) => beamHalf(layout, half, side, idPrefix))}
    ${layers.map((_, i) => rectangle(layout, layout.layers[i], 'outline'))}
    ${input.support ? rectangle(layout, layout.support, 'support', hatchFill(idPrefix, 'metal')) : nothing}
    <line class="axis" x1=${layout.axis} x2=${layout.axis} y1=${layout.tube} y2=${layout.detector.top} />
    ${airBreak(layout)}
    ${each((half, side) => filterHalf(layout, half, side))}
    ${input.detail && layout.detail !== null ? detailMark(layout, input.detail) : nothing}
    ${input.grid ? each((half, side) => gridHalf(layout, half, side)) : nothing}
    <rect class="detector" x=${layout.left - 4} y=${layout.detector.top} width=${layout.right - layout.left + 8} height=${layout.detector.bottom - layout.detector.top} />
    <circle class="focus" cx=${layout.axis} cy=${layout.tube} r="4.5" />`;
}
