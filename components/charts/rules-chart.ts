import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import { html, svg, type TemplateResult } from 'lit';
import { departureAllowed, type RuleDeparture } from '../../physics/rules-of-thumb.js';
import { formatEntry, formatNumber } from './format.js';
import { plotAxes } from './plot-frame.js';

export interface RulesData {
  readonly departures: readonly RuleDeparture[];
  readonly size: string;
  readonly filter: string;
}

const margin = { top: 22, right: 142, bottom: 40, left: 42 };
const dashes = ['', '7 4', '2 3'];

const percent = (departure: number): string =>
  `${departure > 0 ? '+' : ''}${formatNumber(100 * departure, 2)}`;

/** The rules, each with its departures by potential. */
const byRule = (departures: readonly RuleDeparture[]): [string, RuleDeparture[]][] => {
  const rules = [...new Set(departures.map(({ rule }) => rule))];
  return rules.map((rule) => [rule, departures.filter((one) => one.rule === rule)]);
};

/**
 * Where rules of thumb part from the model: how far the factor found is from the one the rule
 * promises. The band is what counts as right; points outside it are drawn.
 */
export function rulesChart(
  { departures, size, filter }: RulesData,
  { width, height }: { readonly width: number; readonly height: number },
): TemplateResult {
  const potentials = departures.map(({ potential_kV }) => potential_kV);
  const x = scaleLinear(
    [Math.min(...potentials), Math.max(...potentials)],
    [margin.left, width - margin.right],
  );
  const shown = departures.map(({ departure }) => 100 * Math.min(1.2, departure));
  const y = scaleLinear(
    [Math.min(-30, ...shown), Math.max(30, ...shown)],
    [height - margin.bottom, margin.top],
  ).nice(5);
  const top = y.domain()[1];
  const yOf = ({ departure }: RuleDeparture): number => y(Math.min(top, 100 * departure));
  const draw = line<RuleDeparture>(({ potential_kV }) => x(potential_kV), yOf);
  const rules = byRule(departures);
  const band = 100 * departureAllowed;
  // Names at the right end, apart by at least a line.
  const ends = rules
    .map(([rule, own], i) => ({
      rule,
      i,
      y: yOf(own[own.length - 1]),
      x: x(own[own.length - 1].potential_kV),
    }))
    .sort((a, b) => a.y - b.y);
  ends.forEach((end, i) => {
    if (i > 0) end.y = Math.max(end.y, ends[i - 1].y + 14);
  });
  const label = `Departure of rules of thumb from the model, filter ${filter}, size ${size}. ${rules
    .map(([rule, own]) => {
      const off = own.filter(({ isOff }) => isOff).map(({ potential_kV }) => potential_kV);
      return `${rule}: ${off.length > 0 ? `more than ${band} % off at ${off.map(formatEntry).join(', ')} kV` : 'within 20 % everywhere'}`;
    })
    .join('; ')}.`;
  return html`<svg class="chart" viewBox="0 0 ${width} ${height}" width=${width} height=${height} role="img" aria-label=${label}>
    <rect class="band" x=${margin.left} y=${y(band)} width=${width - margin.left - margin.right} height=${y(-band) - y(band)} />
    ${plotAxes({
      width,
      height,
      margin,
      x,
      y,
      xTicks: x.ticks(5),
      yTicks: y.ticks(5),
      xName: 'tube potential, kV',
      yName: 'found over promised, less one, %',
      tickText: (tick) => formatEntry(tick).replace('-', '−'),
    })}
    ${rules.map(
      (
        [, own],
        i,
      ) => svg`<path class="line rule" d=${draw(own) ?? ''} stroke-dasharray=${dashes[i] ?? ''} />
        ${own.filter(({ isOff }) => isOff).map((one) => svg`<circle class="off" cx=${x(one.potential_kV)} cy=${yOf(one)} r="2.4" />`)}`,
    )}
    ${ends.map((end) => svg`<text class="name" x=${width - margin.right + 8} y=${end.y + 4} fill="var(--ink)">${end.rule}</text>`)}
  </svg>`;
}

/** The same figures: promised, found and how far off, rule by rule. */
export function rulesTable({ departures, size, filter }: RulesData): TemplateResult {
  const rules = byRule(departures);
  const potentials = [...new Set(departures.map(({ potential_kV }) => potential_kV))];
  return html`<div class="scroll" tabindex="0" role="region" aria-label="Rules of thumb, as a table"><table>
    <caption>factor of detector air kerma per mAs found by the model, filter ${filter}, size ${size}; * more than 20 % from what the rule promises</caption>
    <thead><tr><th scope="col">kV</th>${rules.map(([rule, own]) => html`<th scope="col" class="number">${rule}, promises ×${own[0].promised}</th>`)}</tr></thead>
    <tbody>${potentials.map(
      (kV) =>
        html`<tr><th scope="row">${formatEntry(kV)}</th>${rules.map(([, own]) => {
          const one = own.find(({ potential_kV }) => potential_kV === kV);
          return html`<td class="number">${one ? `×${formatNumber(one.computed)} (${percent(one.departure)} %)${one.isOff ? ' *' : ''}` : '–'}</td>`;
        })}</tr>`,
    )}</tbody></table></div>`;
}
