import { scaleLinear, scaleLog } from 'd3-scale';
import { area, line } from 'd3-shape';
import { html, nothing, type SVGTemplateResult, svg, type TemplateResult } from 'lit';
import { formatNumber } from './format.js';
import { techniqueInk } from './inks.js';
import { techniqueMark } from './technique-mark.js';

/** What a run said of one quantity after so many photons. */
export interface ConvergencePoint {
  readonly photons: number;
  readonly value: number;
  readonly standardError: number | null;
}

export interface ConvergenceData {
  /** `Scatter to primary, behind grid`. */
  readonly quantity: string;
  readonly unit: string;
  readonly technique: string;
  /** Number of the technique, for its ink. */
  readonly ink: number;
  readonly size: string;
  /** Null where the estimate does not give the quantity. */
  readonly estimate: number | null;
  readonly tolerance_percent: number | null;
  /** In order of photons. */
  readonly points: readonly ConvergencePoint[];
  /** Photons the run was asked for. */
  readonly ofPhotons: number;
}

export interface ConvergenceFrame {
  readonly width: number;
  readonly height: number;
}

const margin = { top: 12, right: 12, bottom: 38, left: 46 };
/** Standard errors drawn as bands about the value, the wider first. */
const bands = [2, 1] as const;

const withErrors = (points: readonly ConvergencePoint[]) =>
  points.filter(
    (point): point is ConvergencePoint & { standardError: number } => point.standardError !== null,
  );

/**
 * Scales: photons logarithmic from the first known error to all asked for; values so that the last
 * three standard errors and the stated band fit, with what is earlier and wilder cut off.
 */
export function convergenceScales(data: ConvergenceData, { width, height }: ConvergenceFrame) {
  const known = withErrors(data.points);
  const last = known.at(-1);
  const first = known[0]?.photons ?? data.ofPhotons / 10;
  const x = scaleLog(
    [Math.min(first, data.ofPhotons / 2), data.ofPhotons],
    [margin.left, width - margin.right],
  );
  const about = [
    ...(data.estimate === null ? [] : statedBand(data)),
    ...(last ? [last.value - 3 * last.standardError, last.value + 3 * last.standardError] : []),
  ];
  const low = about.length > 0 ? Math.min(...about) : 0;
  const high = about.length > 0 ? Math.max(...about) : 1;
  const spare = 0.15 * (high - low || Math.abs(high) || 1);
  const y = scaleLinear([low - spare, high + spare], [height - margin.bottom, margin.top]);
  return { x, y };
}

type Scales = ReturnType<typeof convergenceScales>;

/** The stated band about the estimate, lower and upper end. */
const statedBand = ({ estimate, tolerance_percent }: ConvergenceData): [number, number] => {
  const value = estimate ?? 0;
  const half = (Math.abs(value) * (tolerance_percent ?? 0)) / 100;
  return [value - half, value + half];
};

function axes({ x, y }: Scales, { width, height }: ConvergenceFrame): SVGTemplateResult {
  const base = height - margin.bottom;
  const right = width - margin.right;
  const digits = y.tickFormat(4);
  return svg`
    ${y.ticks(4).map(
      (
        tick,
      ) => svg`<line class="gridline" x1=${margin.left} x2=${right} y1=${y(tick)} y2=${y(tick)} />
        <text class="tick" text-anchor="end" x=${margin.left - 7} y=${y(tick) + 4}>${digits(tick)}</text>`,
    )}
    ${photonTicks(x).map((tick) => svg`<text class="tick" text-anchor="middle" x=${x(tick)} y=${base + 15}>${tick / 1000}</text>`)}
    <text class="axis-name" text-anchor="end" x=${right} y=${base + 31}>photons flown, thousands</text>`;
}

/** Round numbers that leave room for one another: 1, 2, 5 in a decade, powers of ten over many. */
function photonTicks(x: Scales['x']): number[] {
  const [least, most] = x.domain();
  const leading = most / least > 100 ? '1' : '125';
  return x.ticks().filter((tick) => leading.includes(tick.toExponential()[0]));
}

function estimateOf(data: ConvergenceData, { y }: Scales, width: number) {
  if (data.estimate === null) return nothing;
  const [low, high] = statedBand(data);
  const right = width - margin.right;
  return svg`<rect class="stated" x=${margin.left} width=${right - margin.left} y=${y(high)} height=${Math.max(0, y(low) - y(high))} />
    <line class="estimate" x1=${margin.left} x2=${right} y1=${y(data.estimate)} y2=${y(data.estimate)} />
    <text class="name" x=${margin.left + 5} y=${y(low) - 6} fill="var(--ink)">${statedWords(data)}</text>`;
}

const statedWords = ({ tolerance_percent }: ConvergenceData): string =>
  tolerance_percent === null
    ? 'estimate'
    : `estimate, stated within ${formatNumber(tolerance_percent, 2)} %`;

function runOf(data: ConvergenceData, { x, y }: Scales) {
  const known = withErrors(data.points);
  const ink = techniqueInk(data.ink);
  const band = (errors: number) =>
    area<(typeof known)[number]>()
      .x((point) => x(point.photons))
      .y0((point) => y(point.value - errors * point.standardError))
      .y1((point) => y(point.value + errors * point.standardError));
  const path = line<ConvergencePoint>()
    .x((point) => x(point.photons))
    .y((point) => y(point.value));
  return svg`${bands.map((errors) => svg`<path class="error" d=${band(errors)(known) ?? ''} fill=${ink.color} />`)}
    <path class="line" d=${path(known) ?? ''} stroke=${ink.color} stroke-dasharray=${ink.dash || nothing} />`;
}

const valueText = (value: number, unit: string): string =>
  [formatNumber(value, 4), unit].filter(Boolean).join(' ');

/** The chart in words: estimate, transport so far, and how sure. */
export function convergenceWords(data: ConvergenceData): string {
  const { quantity, unit, technique, size, estimate, tolerance_percent, ofPhotons } = data;
  const last = withErrors(data.points).at(-1);
  const stated =
    estimate === null
      ? 'no estimate'
      : `estimate ${valueText(estimate, unit)}${tolerance_percent === null ? '' : `, stated within ${formatNumber(tolerance_percent, 2)} %`}`;
  const run = last
    ? `transport ${valueText(last.value, unit)}, standard error ${formatNumber(last.standardError, 2)}, after ${last.photons} of ${ofPhotons} photons`
    : 'nothing flown yet';
  return `${quantity}, ${technique}, size ${size}: ${stated}; ${run}.`;
}

/**
 * One quantity as photons are flown: transport with one and two standard errors about it, beside the
 * estimate with its stated band.
 */
export function convergenceChart(data: ConvergenceData, frame: ConvergenceFrame): TemplateResult {
  const scales = convergenceScales(data, frame);
  const { x, y } = scales;
  const { width, height } = frame;
  const last = withErrors(data.points).at(-1);
  return html`<svg class="chart" viewBox="0 0 ${width} ${height}" width=${width} height=${height} role="img" aria-label=${convergenceWords(data)}>
    <clipPath id="convergence-plot"><rect x=${margin.left} y=${margin.top - 6} width=${width - margin.left - margin.right + 6} height=${height - margin.bottom - margin.top + 6} /></clipPath>
    ${axes(scales, frame)}
    <g clip-path="url(#convergence-plot)">${estimateOf(data, scales, width)} ${runOf(data, scales)}</g>
    ${last ? techniqueMark(data.ink, x(last.photons), y(last.value)) : nothing}
  </svg>`;
}
