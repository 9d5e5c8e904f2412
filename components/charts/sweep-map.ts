import { html, nothing, type SVGTemplateResult, svg, type TemplateResult } from 'lit';
import { guard } from 'lit/directives/guard.js';
import { formatEntry, formatNumber } from './format.js';
import { techniqueInk } from './inks.js';
import { placeLabels, wordsWidth } from './label-places.js';
import { levelFill, levelRegions, levels } from './sweep-map-contours.js';
import {
  type ForbiddenRun,
  forbiddenRuns,
  type MapLayout,
  type MapRow,
  mapLayout,
  type SweepMapData,
} from './sweep-map-layout.js';
import { techniqueMark } from './technique-mark.js';

/** A setting being read: index of potential and row. */
export interface MapCursor {
  readonly column: number;
  readonly row: number;
}

export const filterName = (filter: string): string => (filter === 'none' ? 'no filter' : filter);

/** Words on a plate of paper, so that shading and hatches leave them readable. */
const plated = (
  words: string,
  place: { readonly x: number; readonly y: number },
  color: string,
): SVGTemplateResult => svg`<rect class="plate" x=${place.x - 3} y=${place.y - 8} width=${wordsWidth(words) - 2} height="16" />
  <text x=${place.x} y=${place.y + 4} fill=${color}>${words}</text>`;

/** Hatch of what a limit forbids, and the clips that keep every band to itself. */
const definitions = (data: SweepMapData, layout: MapLayout): SVGTemplateResult => svg`<defs>
    <pattern id="map-forbidden" patternUnits="userSpaceOnUse" width="6" height="6" patternTransform="rotate(45)"><path class="hatch-line" d="M0,0 V6" /></pattern>
    ${data.rows.map(
      (_, row) =>
        svg`<clipPath id="map-band-${row}"><rect x=${layout.left} y=${layout.rowTop(row)} width=${layout.right - layout.left} height=${layout.rowHeight} /></clipPath>`,
    )}
  </defs>`;

function bandOf(
  { cells }: MapRow,
  row: number,
  data: SweepMapData,
  layout: MapLayout,
  best: number,
): SVGTemplateResult {
  const top = layout.rowTop(row);
  const { left, right, rowHeight: height, edges } = layout;
  if (cells.length === 0) {
    return svg`<rect class="uncomputed" x=${left} y=${top} width=${right - left} height=${height} />`;
  }
  const { potentials_kV } = data;
  const last = potentials_kV.length - 1;
  // Beyond the ends the last step goes on.
  const place = (index: number): number => {
    const low = Math.max(0, Math.min(last - 1, Math.floor(index)));
    const step = last > 0 ? potentials_kV[low + 1] - potentials_kV[low] : 1;
    return layout.x(potentials_kV[low] + (index - low) * step);
  };
  const shares = cells.map(({ merit }) => (merit === null || !(best > 0) ? null : merit / best));
  const missing = cells.flatMap(({ merit }, i) => (merit === null ? [i] : []));
  return svg`<rect x=${left} y=${top} width=${right - left} height=${height} style="fill:${levelFill(0)}" />
    ${levelRegions(shares, place, { top, bottom: top + height }).map(
      ({ level, path }) => svg`<path d=${path} style="fill:${levelFill(level)}" />`,
    )}
    ${missing.map(
      (i) =>
        svg`<rect class="missing" x=${edges[i]} y=${top} width=${edges[i + 1] - edges[i]} height=${height} />`,
    )}
    ${forbiddenRuns(cells).map(
      ({ from, to }) =>
        svg`<rect class="forbidden" x=${edges[from]} y=${top} width=${edges[to + 1] - edges[from]} height=${height} fill="url(#map-forbidden)" />`,
    )}`;
}

/** Each limit is named once, in the widest of its hatched runs that holds its name. */
function limitLabels(data: SweepMapData, layout: MapLayout): SVGTemplateResult[] {
  const widest = new Map<string, { run: ForbiddenRun; row: number; width: number }>();
  data.rows.forEach(({ cells }, row) => {
    for (const run of forbiddenRuns(cells)) {
      const width = layout.edges[run.to + 1] - layout.edges[run.from];
      if (width > (widest.get(run.limit)?.width ?? 0)) widest.set(run.limit, { run, row, width });
    }
  });
  return [...widest].flatMap(([limit, { run, row, width }]) => {
    const middle = (layout.edges[run.from] + layout.edges[run.to + 1]) / 2;
    const x = middle - wordsWidth(limit) / 2 + 4;
    const y = layout.rowTop(row) + layout.rowHeight / 2;
    return width > wordsWidth(limit) + 8 ? plated(limit, { x, y }, 'var(--ink)') : [];
  });
}

/** The best allowed setting as an upright cross, its 90 % window as a bracket under it. */
function bestSign({ best, rows }: SweepMapData, layout: MapLayout): SVGTemplateResult | null {
  if (!best) return null;
  const row = rows.findIndex(({ filter }) => filter === best.filter);
  const x = layout.x(best.potential_kV);
  const y = layout.rowTop(row) + layout.rowHeight / 2;
  const base = layout.rowTop(row) + layout.rowHeight - 2.5;
  const [from, to] = best.window90_kV.map((kV) => layout.x(kV));
  return svg`<path class="window" d="M${from},${base - 5} V${base} H${to} V${base - 5}" />
    <path class="best" d="M${x - 6},${y} H${x + 6} M${x},${y - 6} V${y + 6}" />`;
}

function names(data: SweepMapData, layout: MapLayout): SVGTemplateResult[] {
  const placeOf = (potential_kV: number, filter: string) => {
    const row = data.rows.findIndex((entry) => entry.filter === filter);
    return row < 0
      ? null
      : { x: layout.x(potential_kV), y: layout.rowTop(row) + layout.rowHeight / 2 };
  };
  const wanted = [
    ...data.marks.map(({ ink, name, potential_kV, filter }) => ({
      at: placeOf(potential_kV, filter),
      words: `${name} ${formatEntry(potential_kV)} kV`,
      color: techniqueInk(ink).color,
    })),
    ...(data.best
      ? [
          {
            at: placeOf(data.best.potential_kV, data.best.filter),
            words: `best ${formatEntry(data.best.potential_kV)} kV`,
            color: 'var(--ink)',
          },
        ]
      : []),
  ].flatMap(({ at, words, color }) =>
    at ? [{ ...at, words, color, width: wordsWidth(words), height: 14 }] : [],
  );
  const places = placeLabels(wanted, wanted, {
    left: layout.left,
    right: layout.right,
    top: layout.top,
    bottom: layout.bottom,
  });
  return wanted.map(({ words, color }, i) => plated(words, places[i], color));
}

function axes(data: SweepMapData, layout: MapLayout): SVGTemplateResult {
  const { bottom, left, right } = layout;
  return svg`${data.rows.map(
    ({ filter }, row) =>
      svg`<text class="tick" text-anchor="end" x=${left - 8} y=${layout.rowTop(row) + layout.rowHeight / 2 + 4}>${filterName(filter)}</text>`,
  )}
    ${layout.ticks_kV.map(
      (
        kV,
      ) => svg`<line class="gridline" x1=${layout.x(kV)} x2=${layout.x(kV)} y1=${bottom} y2=${bottom + 4} />
      <text class="tick" text-anchor="middle" x=${layout.x(kV)} y=${bottom + 17}>${kV}</text>`,
    )}
    <text class="axis-name" text-anchor="end" x=${right} y=${bottom + 35}>tube potential, kV</text>
    <text class="axis-name" text-anchor="end" x=${left - 8} y=${layout.top - 9}>filter</text>`;
}

/** What the map says to someone who cannot see it. */
export const mapWords = (data: SweepMapData): string => {
  const best = data.best
    ? `Best allowed: ${formatEntry(data.best.potential_kV)} kV, ${filterName(data.best.filter)}, ${formatNumber(data.best.merit)} ${data.meritUnit}; within 90 % from ${data.best.window90_kV.join(' to ')} kV.`
    : 'The room allows no setting.';
  const marks = data.marks.map(
    ({ name, potential_kV, filter }) =>
      `${name}: ${formatEntry(potential_kV)} kV, ${filterName(filter)}.`,
  );
  return `${data.meritName} of every setting, at ${data.holdConstant}, size ${data.size}. ${best} ${marks.join(' ')}`;
};

/**
 * Every setting of the room at one size: potential across, filters in the room's own order down, the
 * figure of merit by ink density. What a limit forbids is hatched and named; techniques and the best
 * setting are marked; `cursor` frames the setting being read.
 */
export function sweepMap(
  data: SweepMapData,
  width: number,
  cursor: MapCursor | null = null,
): TemplateResult {
  const layout = mapLayout(data, width);
  const { height } = layout;
  return html`<svg class="chart map" viewBox="0 0 ${width} ${height}" width=${width} height=${height} role="img" aria-label=${mapWords(data)}>
    ${guard([data, width], () => ground(data, layout))}
    ${cursor ? svg`<rect class="reading" x=${layout.edges[cursor.column] - 1} y=${layout.rowTop(cursor.row) - 1} width=${Math.max(4, layout.edges[cursor.column + 1] - layout.edges[cursor.column] + 2)} height=${layout.rowHeight + 2} />` : nothing}
    ${guard([data, width], () => signs(data, layout))}
  </svg>`;
}

/** What lies under the reading: axes, shading, hatches, and the names of limits. */
function ground(data: SweepMapData, layout: MapLayout): SVGTemplateResult {
  const merits = data.rows.flatMap(({ cells }) => cells.map(({ merit }) => merit ?? 0));
  const best = data.best?.merit ?? Math.max(0, ...merits);
  return svg`${definitions(data, layout)}
    ${axes(data, layout)}
    ${data.rows.map((row, i) => svg`<g clip-path="url(#map-band-${i})">${bandOf(row, i, data, layout, best)}</g>`)}
    ${limitLabels(data, layout)}
    ${bestSign(data, layout)}`;
}

/** What lies over it: names and signs of the techniques, the warning. */
function signs(data: SweepMapData, layout: MapLayout): SVGTemplateResult {
  return svg`${names(data, layout)}
    ${data.marks.map(({ ink, potential_kV, filter }) => {
      const row = data.rows.findIndex((entry) => entry.filter === filter);
      return row < 0
        ? nothing
        : techniqueMark(ink, layout.x(potential_kV), layout.rowTop(row) + layout.rowHeight / 2);
    })}
    ${data.investigational ? svg`<text class="warning" x=${layout.left} y=${layout.top - 9}>${data.investigational}</text>` : nothing}`;
}

/** What the ink says, as shares of the best allowed setting. */
export function mapLegend(data: SweepMapData): TemplateResult {
  const box = { width: 34, height: 9 };
  const right = (levels.length + 1) * box.width;
  return html`<span class="legend"><svg width=${right} height="24" aria-hidden="true">
      ${[0, ...levels].map((_, i) => svg`<rect x=${i * box.width} y="0" width=${box.width - 1} height=${box.height} style="fill:${levelFill(i)}" />`)}
      ${levels.map((level, i) => svg`<text class="tick" text-anchor="middle" x=${(i + 1) * box.width - 0.5} y="22">${100 * level} %</text>`)}
    </svg><span>${data.best ? 'of the best allowed setting' : 'of the best setting, though none is allowed'}</span><span>+ best, bracket: within 90 % of it</span><span>hatched: forbidden</span></span>`;
}
