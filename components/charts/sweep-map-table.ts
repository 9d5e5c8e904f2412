import { html, type TemplateResult } from 'lit';
import { formatEntry, formatNumber } from './format.js';
import { filterName } from './sweep-map.js';
import type { SweepMapData } from './sweep-map-layout.js';

/** The figures behind the map: a row per potential, a column per filter, an asterisk where forbidden. */
export function sweepMapTable(data: SweepMapData): TemplateResult {
  const limits = [
    ...new Set(data.rows.flatMap(({ cells }) => cells.flatMap(({ forbidden }) => forbidden ?? []))),
  ];
  return html`<div class="scroll" tabindex="0" role="region" aria-label="${data.meritName} of every setting, as a table"><table>
    <caption>${data.meritName}, ${data.meritUnit}, at ${data.holdConstant}, size ${data.size}${
      limits.length > 0 ? `; * forbidden: ${limits.join(', ')}` : ''
    }${data.investigational ? `; ${data.investigational}` : ''}</caption>
    <thead><tr><th scope="col">kV</th>${data.rows.map(({ filter }) => html`<th scope="col" class="number">${filterName(filter)}</th>`)}</tr></thead>
    <tbody>${data.potentials_kV.map(
      (kV, i) =>
        html`<tr><th scope="row">${formatEntry(kV)}</th>${data.rows.map(({ cells }) => {
          const cell = cells[i];
          return html`<td class="number">${formatNumber(cell?.merit)}${cell?.forbidden ? ' *' : ''}</td>`;
        })}</tr>`,
    )}</tbody>
  </table></div>`;
}
