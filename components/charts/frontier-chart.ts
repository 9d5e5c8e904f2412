import { scaleLog } from 'd3-scale';
import { line } from 'd3-shape';
import { html, nothing, svg, type TemplateResult } from 'lit';
import { formatEntry, formatNumber } from './format.js';
import { techniqueInk } from './inks.js';
import { placeLabels, wordsWidth } from './label-places.js';
import { plotAxes } from './plot-frame.js';
import { techniqueMark } from './technique-mark.js';

/** A setting by what it costs on the two axes. */
export interface FrontierPoint {
  readonly x: number;
  readonly y: number;
  readonly onFrontier: boolean;
}

export interface FrontierData {
  /** `incident air kerma, mGy`. */
  readonly xName: string;
  readonly yName: string;
  readonly holdConstant: string;
  readonly size: string;
  /** Allowed settings only. */
  readonly points: readonly FrontierPoint[];
  /** With two axes and nothing else chosen the members form a line. */
  readonly isLine: boolean;
  readonly marks: readonly { ink: number; name: string; x: number; y: number }[];
  readonly investigational: string | null;
}

const margin = { top: 22, right: 14, bottom: 40, left: 42 };

/** Figures that read well on a logarithmic axis, at most about `most` of them. */
export const logTicks = (low: number, high: number, most: number): number[] => {
  for (const steps of [[1, 1.5, 2, 3, 4, 5, 7], [1, 2, 5], [1]]) {
    const first = Math.floor(Math.log10(low));
    const decades = Math.ceil(Math.log10(high)) - first + 1;
    const ticks = Array.from({ length: decades }, (_, i) =>
      steps.map((step) => Number((step * 10 ** (first + i)).toPrecision(3))),
    )
      .flat()
      .filter((tick) => tick >= low && tick <= high);
    if (ticks.length <= most) return ticks;
  }
  return [low, high].map((value) => Number(value.toPrecision(2)));
};

/**
 * Settings by two of their coordinates, both logarithmic: those that no other beats in full ink, the
 * others that the room allows as dust. `cursor` rings a member being read.
 */
export function frontierChart(
  data: FrontierData,
  { width, height }: { readonly width: number; readonly height: number },
  cursor: { readonly x: number; readonly y: number } | null = null,
): TemplateResult {
  const all = [...data.points, ...data.marks].filter((point) => point.x > 0 && point.y > 0);
  const span = (values: number[]): [number, number] => {
    const [low, high] = values.length > 0 ? [Math.min(...values), Math.max(...values)] : [1, 10];
    const room = Math.max(1.04, (high / low) ** 0.04);
    return [low / room, high * room];
  };
  const x = scaleLog(span(all.map((point) => point.x)), [margin.left, width - margin.right]);
  const y = scaleLog(span(all.map((point) => point.y)), [height - margin.bottom, margin.top]);
  const [xLow, xHigh] = x.domain();
  const [yLow, yHigh] = y.domain();
  const members = data.points.filter(({ onFrontier }) => onFrontier);
  const others = data.points.filter(({ onFrontier }) => !onFrontier);
  const path = line<FrontierPoint>(
    (point) => x(point.x),
    (point) => y(point.y),
  );
  const named = data.marks.map((mark) => ({
    x: x(mark.x),
    y: y(mark.y),
    words: mark.name,
    color: techniqueInk(mark.ink).color,
    width: wordsWidth(mark.name),
    height: 13,
  }));
  const places = placeLabels(
    named,
    [...members.map((point) => ({ x: x(point.x), y: y(point.y) })), ...named],
    { left: margin.left, right: width, top: 12, bottom: height - margin.bottom },
  );
  const label = `Frontier of settings at ${data.holdConstant}, size ${data.size}: ${members.length} of ${data.points.length} allowed settings that no other beats. ${data.marks
    .map((mark) => `${mark.name}: ${formatNumber(mark.x)} by ${formatNumber(mark.y)}.`)
    .join(' ')} ${data.xName} across, ${data.yName} up. The members are in the table.`;
  return html`<svg class="chart" viewBox="0 0 ${width} ${height}" width=${width} height=${height} role="img" aria-label=${label}>
    ${plotAxes({
      width,
      height,
      margin,
      x,
      y,
      xTicks: logTicks(xLow, xHigh, 6),
      yTicks: logTicks(yLow, yHigh, 6),
      xName: data.xName,
      yName: data.yName,
      tickText: formatEntry,
    })}
    ${others.map((point) => svg`<circle class="dust" cx=${x(point.x)} cy=${y(point.y)} r="1.3" />`)}
    ${
      data.isLine
        ? svg`<path class="line front" d=${path([...members].sort((a, b) => a.x - b.x)) ?? ''} />`
        : nothing
    }
    ${members.map((point) => svg`<circle class="member" cx=${x(point.x)} cy=${y(point.y)} r="2" />`)}
    ${cursor ? svg`<circle class="ring" cx=${x(cursor.x)} cy=${y(cursor.y)} r="6" />` : nothing}
    ${data.marks.map((mark) => techniqueMark(mark.ink, x(mark.x), y(mark.y)))}
    ${named.map(
      ({ words, color }, i) =>
        svg`<text class="name" x=${places[i].x} y=${places[i].y + 4} fill=${color}>${words}</text>`,
    )}
    ${data.investigational ? svg`<text class="warning" text-anchor="end" x=${width - margin.right} y=${margin.top - 10}>${data.investigational}</text>` : nothing}
  </svg>`;
}
