import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import { html, nothing, type SVGTemplateResult, svg, type TemplateResult } from 'lit';
import { formatEntry, formatNumber } from './format.js';
import { techniqueInk } from './inks.js';
import { placeLabels, wordsWidth } from './label-places.js';
import { techniqueMark } from './technique-mark.js';

/** One potential of one filter's line. */
export interface CurvePoint {
  readonly potential_kV: number;
  readonly dose: number;
  readonly value: number;
  /** Name of the limit that forbids this setting; null where the room allows it. */
  readonly forbidden: string | null;
}

/** A filter's line; `ink` is the number of the technique that uses the filter, null when none does. */
export interface CurveLine {
  readonly filter: string;
  readonly ink: number | null;
  readonly points: readonly CurvePoint[];
}

export interface CurveMark {
  readonly ink: number;
  readonly name: string;
  readonly potential_kV: number;
  readonly dose: number;
  readonly value: number;
}

export interface DoseCurveData {
  /** What the vertical axis shows: `SdNR of the vessel`. */
  readonly valueName: string;
  readonly doseName: string;
  readonly doseUnit: string;
  /** `equal detector air kerma, 2.5 µGy per frame`. */
  readonly holdConstant: string;
  readonly size: string;
  readonly lines: readonly CurveLine[];
  readonly marks: readonly CurveMark[];
  /** Rose threshold, when the vertical axis is SdNR. */
  readonly rose: number | null;
  /** Set for agents that are not in clinical use; printed on the plot. */
  readonly investigational: string | null;
}

export interface CurveFrame {
  readonly width: number;
  readonly height: number;
}

const margin = { top: 14, right: 12, bottom: 40, left: 34 };

/** Scales of a curve: dose from 0 to twice what the techniques cost, value from 0 past the highest shown. */
export function curveScales(data: DoseCurveData, { width, height }: CurveFrame) {
  const costs = data.marks.map((mark) => mark.dose);
  const all = data.lines.flatMap((entry) => entry.points);
  const widest =
    costs.length > 0 ? 2 * Math.max(...costs) : Math.max(0, ...all.map((point) => point.dose));
  const x = scaleLinear([0, widest || 1], [margin.left, width - margin.right]).nice(5);
  const shown = all.filter((point) => point.dose <= x.domain()[1]).map((point) => point.value);
  const marked = data.marks.map((mark) => mark.value);
  const rose = data.rose ?? 0;
  const low = Math.min(0, ...shown, ...marked);
  const high = Math.max(rose * 1.1, ...shown, ...marked);
  const y = scaleLinear([low, high || 1], [height - margin.bottom, margin.top]).nice(5);
  return { x, y };
}

type Scales = ReturnType<typeof curveScales>;

/** Runs of points that are all allowed or all forbidden by the same limit; neighbours share an end. */
function runsOf(
  points: readonly CurvePoint[],
): { forbidden: string | null; points: CurvePoint[] }[] {
  const runs: { forbidden: string | null; points: CurvePoint[] }[] = [];
  for (const point of points) {
    const last = runs.at(-1);
    if (last && last.forbidden === point.forbidden) last.points.push(point);
    else {
      last?.points.push(point);
      runs.push({ forbidden: point.forbidden, points: [point] });
    }
  }
  return runs;
}

function lineOf(entry: CurveLine, { x, y }: Scales): SVGTemplateResult[] {
  const ink =
    entry.ink === null ? { color: 'var(--soft)', dash: '1.5 2.5' } : techniqueInk(entry.ink);
  const draw = line<CurvePoint>(
    (p) => x(p.dose),
    (p) => y(p.value),
  );
  return runsOf(entry.points).map(
    (run) =>
      svg`<path class=${run.forbidden ? 'line forbidden' : 'line'} d=${draw(run.points) ?? ''} stroke=${ink.color} stroke-dasharray=${ink.dash} />`,
  );
}

/** What is written on the plot: techniques first, so that they get the places they want. */
function plotNames(data: DoseCurveData, { x, y }: Scales, frame: CurveFrame): SVGTemplateResult[] {
  const right = x.domain()[1];
  const marks = data.marks.map((mark) => ({
    x: x(mark.dose),
    y: y(mark.value),
    words: `${mark.name} ${formatEntry(mark.potential_kV)} kV`,
    color: techniqueInk(mark.ink).color,
  }));
  const ends = data.lines.flatMap((entry) => {
    const inside = entry.points.filter((point) => point.dose <= right);
    const end = inside.reduce<CurvePoint | null>((a, b) => (a && a.dose > b.dose ? a : b), null);
    if (!end) return [];
    const color = entry.ink === null ? 'var(--soft)' : techniqueInk(entry.ink).color;
    return [{ x: x(end.dose), y: y(end.value), words: lineName(entry), color }];
  });
  // From the top down, so that the uppermost line is named above itself.
  ends.sort((a, b) => a.y - b.y);
  const named = [...marks, ...ends].map((entry) => ({
    ...entry,
    width: wordsWidth(entry.words),
    height: 13,
  }));
  const samples = data.lines.flatMap((entry) =>
    entry.points
      .filter((point) => point.dose <= right)
      .map((point) => ({ x: x(point.dose), y: y(point.value) })),
  );
  const rose = data.rose === null ? [] : [{ x: frame.width - 40, y: y(data.rose) - 5 }];
  const places = placeLabels(named, [...samples, ...marks, ...rose], {
    left: margin.left,
    right: frame.width,
    top: 0,
    bottom: frame.height - margin.bottom,
  });
  return named.map(
    ({ words, color }, i) =>
      svg`<text class="name" x=${places[i].x} y=${places[i].y + 4} fill=${color}>${words}</text>`,
  );
}

/** A filter's name, and the limit that forbids all of it. */
function lineName(entry: CurveLine): string {
  const name = entry.filter === 'none' ? 'no filter' : entry.filter;
  const limit = entry.points[0]?.forbidden;
  return limit && entry.points.every((point) => point.forbidden) ? `${name}, ${limit}` : name;
}

function axes(
  data: DoseCurveData,
  { x, y }: Scales,
  { width, height }: CurveFrame,
): SVGTemplateResult {
  const base = height - margin.bottom;
  return svg`
    ${y.ticks(4).map(
      (
        tick,
      ) => svg`<line class="gridline" x1=${margin.left} x2=${width - margin.right} y1=${y(tick)} y2=${y(tick)} />
        <text class="tick" text-anchor="end" x=${margin.left - 7} y=${y(tick) + 4}>${tick}</text>`,
    )}
    ${x.ticks(5).map((tick) => svg`<text class="tick" text-anchor="middle" x=${x(tick)} y=${base + 16}>${tick}</text>`)}
    <text class="axis-name" text-anchor="end" x=${width - margin.right} y=${base + 33}>${data.doseName}, ${data.doseUnit}</text>`;
}

/**
 * Contrast or SdNR against a named dose as potential varies, one line per filter. Portions a limit
 * forbids are thin; techniques are marked by their own sign; `cursor_kV` draws the reading points.
 */
export function doseCurve(
  data: DoseCurveData,
  frame: CurveFrame,
  cursor_kV: number | null = null,
): TemplateResult {
  const scales = curveScales(data, frame);
  const { x, y } = scales;
  const clip = `curve-${frame.width}-${data.valueName.length}`;
  const label = `${data.valueName}, by ${data.doseName}, at ${data.holdConstant}, size ${data.size}. ${data.marks
    .map(
      (mark) =>
        `${mark.name}: ${formatNumber(mark.potential_kV)} kV, ${formatNumber(mark.dose)} ${data.doseUnit}, ${formatNumber(mark.value)}`,
    )
    .join('; ')}. The figures are in the table below the plot.`;
  const cursor =
    cursor_kV === null
      ? []
      : pointsAt(data, cursor_kV).filter((reading) => reading.point.dose <= x.domain()[1]);
  return html`<svg class="chart" viewBox="0 0 ${frame.width} ${frame.height}" width=${frame.width} height=${frame.height} role="img" aria-label=${label}>
    <clipPath id=${clip}><rect x=${margin.left} y="0" width=${frame.width - margin.left - margin.right} height=${frame.height - margin.bottom + 1} /></clipPath>
    ${axes(data, scales, frame)}
    ${
      data.rose === null
        ? nothing
        : svg`<line class="rose" x1=${margin.left} x2=${frame.width - margin.right} y1=${y(data.rose)} y2=${y(data.rose)} />
      <text class="tick" text-anchor="end" x=${frame.width - margin.right} y=${y(data.rose) - 5}>Rose, k = ${data.rose}</text>`
    }
    <g clip-path="url(#${clip})">${data.lines.map((entry) => lineOf(entry, scales))}</g>
    ${plotNames(data, scales, frame)}
    ${cursor.map(({ point }) => svg`<circle class="cursor" cx=${x(point.dose)} cy=${y(point.value)} r="3" />`)}
    ${data.marks.map((mark) => techniqueMark(mark.ink, x(mark.dose), y(mark.value)))}
    ${data.investigational ? svg`<text class="warning" x=${margin.left + 4} y=${frame.height - margin.bottom - 8}>${data.investigational}</text>` : nothing}
  </svg>`;
}

/** The point of every line at the potential nearest to `potential_kV`. */
export const pointsAt = (
  data: DoseCurveData,
  potential_kV: number,
): { line: CurveLine; point: CurvePoint }[] =>
  data.lines.flatMap((entry) => {
    const distance = (point: CurvePoint) => Math.abs(point.potential_kV - potential_kV);
    const point = entry.points.reduce<CurvePoint | null>(
      (best, next) => (best && distance(best) <= distance(next) ? best : next),
      null,
    );
    return point ? [{ line: entry, point }] : [];
  });
