import { type SVGTemplateResult, svg } from 'lit';

/** A scale as axes need it. */
export interface AxisScale {
  (value: number): number;
  ticks(count?: number): number[];
}

export interface PlotMargin {
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
  readonly left: number;
}

export interface PlotAxes {
  readonly width: number;
  readonly height: number;
  readonly margin: PlotMargin;
  readonly x: AxisScale;
  readonly y: AxisScale;
  readonly xTicks: readonly number[];
  readonly yTicks: readonly number[];
  readonly xName: string;
  /** Set above the plot, at its left edge. */
  readonly yName: string;
  readonly tickText?: (value: number) => string;
}

/** Horizontal rules with their figures, figures along the foot, and the names of both axes. */
export function plotAxes({
  width,
  height,
  margin,
  x,
  y,
  xTicks,
  yTicks,
  xName,
  yName,
  tickText = String,
}: PlotAxes): SVGTemplateResult {
  const base = height - margin.bottom;
  return svg`
    ${yTicks.map(
      (
        tick,
      ) => svg`<line class="gridline" x1=${margin.left} x2=${width - margin.right} y1=${y(tick)} y2=${y(tick)} />
        <text class="tick" text-anchor="end" x=${margin.left - 7} y=${y(tick) + 4}>${tickText(tick)}</text>`,
    )}
    ${xTicks.map((tick) => svg`<text class="tick" text-anchor="middle" x=${x(tick)} y=${base + 16}>${tickText(tick)}</text>`)}
    <text class="axis-name" text-anchor="end" x=${width - margin.right} y=${base + 33}>${xName}</text>
    <text class="axis-name" x="0" y="10">${yName}</text>`;
}
