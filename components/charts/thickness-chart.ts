import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import { html, nothing, type SVGTemplateResult, svg, type TemplateResult } from 'lit';
import { formatEntry, formatNumber } from './format.js';
import { techniqueInk } from './inks.js';
import { wordsWidth } from './label-places.js';
import { filterName } from './sweep-map.js';

/** One technique in a patient of one thickness. */
export interface ThicknessPoint {
  readonly thickness_mm: number;
  /** What the two panels show; null where it cannot be had. */
  readonly values: readonly (number | null)[];
  readonly filter: string;
  readonly potential_kV: number;
  /** Name of the limit that forbids it here. */
  readonly forbidden: string | null;
}

export interface ThicknessLine {
  readonly ink: number;
  readonly name: string;
  readonly points: readonly ThicknessPoint[];
}

export interface ThicknessData {
  /** A name with its unit for each panel: `incident air kerma per frame, mGy`. */
  readonly panels: readonly string[];
  readonly lines: readonly ThicknessLine[];
  /** Sizes of the mix with their share of patients. */
  readonly sizes: readonly { readonly thickness_mm: number; readonly share: number }[];
  readonly percentiles: readonly { readonly percentile: number; readonly thickness_mm: number }[];
  readonly investigational: string | null;
}

const margin = { top: 20, right: 84, bottom: 40, left: 46 };
const panelHeight = 118;
const panelGap = 30;
const mixHeight = 40;
const rowHeight = 18;

type Scale = (value: number) => number;

/** Both sides of a jump stand this close; no line is drawn between them. */
const jump_mm = 0.05;

/** A line's points in runs that a jump of filter separates. */
const unbroken = (points: readonly ThicknessPoint[]): ThicknessPoint[][] => {
  const runs: ThicknessPoint[][] = [];
  for (const point of points) {
    const last = runs.at(-1)?.at(-1);
    const isJump =
      last && last.filter !== point.filter && point.thickness_mm - last.thickness_mm < jump_mm;
    if (!last || isJump) runs.push([point]);
    else runs.at(-1)?.push(point);
  }
  return runs;
};

function panel(
  data: ThicknessData,
  index: number,
  top: number,
  x: Scale,
  width: number,
): SVGTemplateResult {
  const all = data.lines.flatMap(({ points }) => points.map(({ values }) => values[index] ?? 0));
  const y = scaleLinear([0, Math.max(...all, 0) || 1], [top + panelHeight, top]).nice(4);
  const draw = line<ThicknessPoint>()
    .defined(({ values }) => values[index] !== null)
    .x(({ thickness_mm }) => x(thickness_mm))
    .y(({ values }) => y(values[index] ?? 0));
  const ends = data.lines
    .flatMap(({ ink, name, points }) => {
      const end = points.findLast(({ values }) => values[index] !== null);
      return end ? [{ ink, name, y: y(end.values[index] ?? 0) }] : [];
    })
    .sort((a, b) => a.y - b.y);
  ends.forEach((end, i) => {
    if (i > 0) end.y = Math.max(end.y, ends[i - 1].y + 13);
  });
  return svg`<text class="axis-name" x="0" y=${top - 9}>${data.panels[index]}</text>
    ${y.ticks(3).map(
      (
        tick,
      ) => svg`<line class="gridline" x1=${margin.left} x2=${width - margin.right} y1=${y(tick)} y2=${y(tick)} />
        <text class="tick" text-anchor="end" x=${margin.left - 7} y=${y(tick) + 4}>${formatEntry(tick)}</text>`,
    )}
    ${data.lines.map(({ ink, points }) => {
      const { color, dash } = techniqueInk(ink);
      const runs = unbroken(points);
      return svg`${runs.map((run) => svg`<path class="line" d=${draw(run) ?? ''} stroke=${color} stroke-dasharray=${dash} />`)}
        ${runs.slice(1).map((run, i) => {
          const before = runs[i].at(-1)?.values[index];
          const after = run[0].values[index];
          return before === null || before === undefined || after === null
            ? nothing
            : svg`<line class="jump" x1=${x(run[0].thickness_mm)} x2=${x(run[0].thickness_mm)} y1=${y(before)} y2=${y(after)} stroke=${color} />`;
        })}
        ${points
          .filter(({ forbidden, values }) => forbidden && values[index] !== null)
          .map(
            (point) =>
              svg`<path class="forbidden-sign" d="M${x(point.thickness_mm) - 4},${y(point.values[index] ?? 0) - 4} l8,8 m0,-8 l-8,8" />`,
          )}`;
    })}
    ${ends.map((end) => svg`<text class="name" x=${width - margin.right + 7} y=${end.y + 4} fill=${techniqueInk(end.ink).color}>${end.name}</text>`)}`;
}

/** One filter after the other as thickness grows; each holds up to where the next begins. */
const filterRuns = (points: readonly ThicknessPoint[]) => {
  const runs: { readonly filter: string; readonly from: number; to: number }[] = [];
  for (const { filter, thickness_mm } of points) {
    const last = runs.at(-1);
    if (last) last.to = thickness_mm;
    if (last?.filter !== filter) runs.push({ filter, from: thickness_mm, to: thickness_mm });
  }
  return runs;
};

/** The filter in force along thickness, one row per technique. */
function settings(data: ThicknessData, top: number, x: Scale, width: number): SVGTemplateResult {
  return svg`<text class="axis-name" x="0" y=${top - 9}>filter in force</text>
    ${data.lines.map(({ ink, points }, row) => {
      const y = top + row * rowHeight + 6;
      const color = techniqueInk(ink).color;
      return filterRuns(points).map(({ filter, from, to }) => {
        const words = filterName(filter);
        const left = Math.min(x(from), width - margin.right - wordsWidth(words));
        const start = left + wordsWidth(words);
        const end = x(to) - 4;
        return svg`<text x=${left} y=${y + 4} fill=${color}>${words}</text>
          ${end > start ? svg`<line x1=${start} x2=${end} y1=${y} y2=${y} stroke=${color} stroke-width="2" />` : nothing}`;
      });
    })}`;
}

/** Shares of patients as bars on the foot of the chart, percentiles as ticks above them. */
function mix(data: ThicknessData, top: number, x: Scale): SVGTemplateResult {
  const most = Math.max(...data.sizes.map(({ share }) => share), 0.01);
  const base = top + mixHeight;
  return svg`<text class="axis-name" x="0" y=${top - 4}>patients</text>
    ${data.sizes.map(({ thickness_mm, share }) => svg`<rect class="share" x=${x(thickness_mm) - 4} width="8" y=${base - (share / most) * (mixHeight - 4)} height=${(share / most) * (mixHeight - 4)} />`)}
    ${data.percentiles.map(({ percentile, thickness_mm }) => svg`<text class="tick" text-anchor="middle" x=${x(thickness_mm)} y=${base + 13}>P${percentile}</text>`)}`;
}

/** Height of the chart for a number of techniques. */
const heightOf = (data: ThicknessData): number =>
  margin.top +
  data.panels.length * (panelHeight + panelGap) +
  data.lines.length * rowHeight +
  panelGap +
  mixHeight +
  14 +
  margin.bottom;

/**
 * Both techniques as patients grow thicker, each as its own control has it: two quantities, the
 * filter in force, and where the patients are. A filter withdrawn shows as a jump, a size the room
 * forbids as a cross.
 */
export function thicknessChart(data: ThicknessData, width: number): TemplateResult {
  const height = heightOf(data);
  const all = data.lines.flatMap(({ points }) => points.map(({ thickness_mm }) => thickness_mm));
  const x = scaleLinear(
    [Math.min(...all), Math.max(...all)],
    [margin.left + 10, width - margin.right - 10],
  );
  const tops = data.panels.map((_, i) => margin.top + i * (panelHeight + panelGap));
  const settingsTop = margin.top + data.panels.length * (panelHeight + panelGap);
  const mixTop = settingsTop + data.lines.length * rowHeight + panelGap - 8;
  const foot = mixTop + mixHeight + 16;
  const label = `${data.panels.join(' and ')} by patient thickness. ${data.lines
    .map(({ name, points }) => {
      const changes = points.filter(({ filter }, i) => i > 0 && points[i - 1].filter !== filter);
      const words = changes.map(
        ({ filter, thickness_mm }) =>
          `${filterName(filter)} from ${formatNumber(thickness_mm)} mm on`,
      );
      return `${name}: ${filterName(points[0]?.filter ?? '')}${words.length > 0 ? `, ${words.join(', ')}` : ' throughout'}.`;
    })
    .join(' ')} The figures are in the table.`;
  return html`<svg class="chart" viewBox="0 0 ${width} ${height}" width=${width} height=${height} role="img" aria-label=${label}>
    ${tops.map((top, i) => panel(data, i, top, x, width))}
    ${settings(data, settingsTop, x, width)}
    ${mix(data, mixTop, x)}
    ${x.ticks(6).map((tick) => svg`<text class="tick" text-anchor="middle" x=${x(tick)} y=${foot + 14}>${tick}</text>`)}
    <text class="axis-name" text-anchor="end" x=${width - margin.right} y=${foot + 32}>patient thickness, mm</text>
    ${data.investigational ? svg`<text class="warning" text-anchor="end" x=${width} y="11">${data.investigational}</text>` : nothing}
  </svg>`;
}
