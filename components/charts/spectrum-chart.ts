import { scaleLinear } from 'd3-scale';
import { area, curveStepAfter, line } from 'd3-shape';
import { html, nothing, type SVGTemplateResult, svg, type TemplateResult } from 'lit';
import type { AlongBeam } from '../../physics/along-beam.js';
import { formatNumber } from './format.js';
import { techniqueInk } from './inks.js';

/** One technique's spectrum where the primary beam reaches the detail. */
export interface SpectrumLine {
  readonly ink: number;
  readonly name: string;
  readonly atDetail: AlongBeam['atDetail'];
}

export interface SpectrumData {
  readonly spectra: readonly SpectrumLine[];
  readonly kEdges: AlongBeam['kEdges'];
  readonly size: string;
  /** Set for agents that are not in clinical use; printed on the plot. */
  readonly investigational: string | null;
}

const margin = { top: 18, right: 12, bottom: 40, left: 40 };

/** Lines are drawn as if one keV wide, so that their area is their photons. */
const lineWidth_keV = 1;

type Sample = readonly [energy_keV: number, fluence: number];

/** The continuum with the characteristic lines laid on it, as steps of the drawn outline. */
function outline({
  energies_keV,
  fluence_per_mm2_per_keV,
  lines,
}: AlongBeam['atDetail']): Sample[] {
  return energies_keV.map((energy, i) => {
    const on = lines.filter((entry) => Math.abs(entry.energy_keV - energy) <= lineWidth_keV / 2);
    const extra = on.reduce((sum, entry) => sum + entry.fluence_per_mm2 / lineWidth_keV, 0);
    return [energy, fluence_per_mm2_per_keV[i] + extra];
  });
}

function edgeMarks(
  data: SpectrumData,
  x: (energy_keV: number) => number,
  base: number,
): SVGTemplateResult[] {
  return data.kEdges.map(
    ({
      element,
      energy_keV,
    }) => svg`<line class="edge" x1=${x(energy_keV)} x2=${x(energy_keV)} y1=${margin.top - 6} y2=${base} />
      <text class="name" x=${x(energy_keV) + 5} y=${margin.top + 2} fill="var(--ink)">${element} K edge ${formatNumber(energy_keV, 4)} keV</text>`,
  );
}

/** Spectra of the techniques at the detail, per frame, with the K edges of the agent. */
export function spectrumChart(
  data: SpectrumData,
  { width, height }: { readonly width: number; readonly height: number },
): TemplateResult {
  const base = height - margin.bottom;
  const drawn = data.spectra.map((entry) => ({ ...entry, points: outline(entry.atDetail) }));
  const all = drawn.flatMap(({ points }) => points);
  const least = Math.min(10, ...data.kEdges.map((edge) => edge.energy_keV - 3));
  const x = scaleLinear(
    [least, Math.max(least + 1, ...all.map(([energy]) => energy))],
    [margin.left, width - margin.right],
  );
  const most = Math.max(0, ...all.map(([, fluence]) => fluence));
  const y = scaleLinear([0, most || 1], [base, margin.top]).nice(4);
  const path = line<Sample>(
    ([energy]) => x(energy),
    ([, fluence]) => y(fluence),
  ).curve(curveStepAfter);
  const filled = area<Sample>(
    ([energy]) => x(energy),
    base,
    ([, fluence]) => y(fluence),
  ).curve(curveStepAfter);
  const label = `Spectrum of primary photons reaching the detail, per frame, size ${data.size}. ${drawn
    .map(
      ({ name, points }) =>
        `${name}: most photons near ${formatNumber(points.reduce<Sample>((a, b) => (b[1] > a[1] ? b : a), [0, 0])[0])} keV`,
    )
    .join('; ')}.`;
  return html`<svg class="chart" viewBox="0 0 ${width} ${height}" width=${width} height=${height} role="img" aria-label=${label}>
    ${y.ticks(4).map(
      (
        tick,
      ) => svg`<line class="gridline" x1=${margin.left} x2=${width - margin.right} y1=${y(tick)} y2=${y(tick)} />
      <text class="tick" text-anchor="end" x=${margin.left - 6} y=${y(tick) + 4}>${formatTick(tick)}</text>`,
    )}
    ${x.ticks(8).map((tick) => svg`<text class="tick" text-anchor="middle" x=${x(tick)} y=${base + 16}>${tick}</text>`)}
    <text class="axis-name" text-anchor="end" x=${width - margin.right} y=${base + 33}>photon energy, keV</text>
    <text class="axis-name" x="0" y="9">photons per mm², keV and frame</text>
    ${drawn.map(({ ink, points }) => {
      const { color, dash } = techniqueInk(ink);
      return svg`<path d=${filled(points) ?? ''} fill=${color} opacity=".1" />
        <path class="line" style="stroke-width:1.4" d=${path(points) ?? ''} stroke=${color} stroke-dasharray=${dash} />`;
    })}
    ${edgeMarks(data, x, base)}
    ${data.investigational ? svg`<text class="warning" text-anchor="end" x=${width - margin.right} y=${margin.top + 2}>${data.investigational}</text>` : nothing}
  </svg>`;
}

/** Large counts shortened: 12k, 3M. */
const formatTick = (value: number): string =>
  value >= 1e6 ? `${value / 1e6}M` : value >= 1e3 ? `${value / 1e3}k` : String(value);
