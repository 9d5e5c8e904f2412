import { html, type TemplateResult } from 'lit';
import type { DoseCurveData } from './dose-curve.js';
import { formatNumber } from './format.js';

/** The figures behind a curve: one row per potential, a pair of columns per filter. */
export function doseCurveTable(data: DoseCurveData): TemplateResult {
  const potentials = [
    ...new Set(data.lines.flatMap((line) => line.points.map((point) => point.potential_kV))),
  ].sort((a, b) => a - b);
  const cells = (potential_kV: number) =>
    data.lines.map((line) => {
      const point = line.points.find((candidate) => candidate.potential_kV === potential_kV);
      return html`<td>${formatNumber(point?.dose)}</td>
        <td>${formatNumber(point?.value)}${point?.forbidden ? ' *' : ''}</td>`;
    });
  const limits = [
    ...new Set(data.lines.flatMap((line) => line.points.flatMap((point) => point.forbidden ?? []))),
  ];
  return html`<div class="scroll" tabindex="0" role="region" aria-label="${data.valueName} by ${data.doseName}, as a table"><table>
    <caption>${data.valueName}, by ${data.doseName} in ${data.doseUnit}, at ${data.holdConstant}, size ${data.size}${
      limits.length > 0 ? `; * forbidden: ${limits.join(', ')}` : ''
    }${data.investigational ? `; ${data.investigational}` : ''}</caption>
    <thead><tr><th scope="col">kV</th>${data.lines.map((line) => html`<th scope="col" colspan="2">${line.filter === 'none' ? 'no filter' : line.filter}</th>`)}</tr></thead>
    <tbody>${potentials.map((potential) => html`<tr><th scope="row">${potential}</th>${cells(potential)}</tr>`)}</tbody>
  </table></div>`;
}
