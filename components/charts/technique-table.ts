import { html, type TemplateResult } from 'lit';
import { csvText } from '../../physics/csv/csv-text.js';
import type { TechniqueRow } from '../../physics/sizes.js';
import { formatEntry, formatNumber, formatPercent } from './format.js';
import { techniqueInk } from './inks.js';
import { limitName } from './limit-names.js';
import { filterName } from './sweep-map.js';

/** The technique table by size: what the room would be told, and what it gives, one frame as set. */
export function techniqueTable(
  rows: readonly TechniqueRow[],
  techniques: readonly string[],
): TemplateResult {
  const headings = [
    'share',
    'technique',
    'kV',
    'filter',
    'grid',
    'mA',
    'ms',
    'mAs',
    'detector µGy',
    'at equal SdNR µGy',
    'SdNR',
    'incident mGy',
  ];
  return html`<table>
    <caption>One frame, as set. Detector air kerma at equal SdNR is what the control would have to hold for ${techniques[0]}’s SdNR at that size.</caption>
    <thead><tr><th scope="col">size</th>${headings.map((heading) => html`<th scope="col" class=${['technique', 'filter', 'grid'].includes(heading) ? '' : 'number'}>${heading}</th>`)}<th scope="col">limits</th></tr></thead>
    <tbody>${rows.map((row, i) => {
      const isFirst = i === 0 || rows[i - 1].size !== row.size;
      const ink = techniqueInk(Math.max(0, techniques.indexOf(row.technique))).color;
      return html`<tr class=${isFirst ? 'first' : ''}>
        <th scope="row">${isFirst ? html`${row.size}, ${formatEntry(Number(row.thickness_mm.toFixed(1)))} mm` : html`<span class="unseen">${row.size}</span>`}</th>
        <td class="number">${isFirst ? formatPercent(row.share) : ''}</td>
        <td style="color:${ink}">${row.technique}</td>
        <td class="number">${formatEntry(row.potential_kV)}</td><td>${filterName(row.filter)}</td><td>${row.grid}</td>
        <td class="number">${formatNumber(row.tubeCurrent_mA)}</td><td class="number">${formatNumber(row.exposureTime_ms)}</td>
        <td class="number">${formatNumber(row.tubeLoad_mAs)}</td><td class="number">${formatNumber(row.detectorAirKerma_uGy)}</td>
        <td class="number">${formatNumber(row.detectorAirKermaAtEqualSdnr_uGy)}</td>
        <td class="number">${formatNumber(row.sdnr)}</td><td class="number">${formatNumber(row.incidentAirKerma_mGy)}</td>
        <td>${row.limits.length > 0 ? [...new Set(row.limits)].map(limitName).join(', ') : ''}</td>
      </tr>`;
    })}</tbody>
  </table>`;
}

/** The same as CSV at full precision. */
export const techniqueCsv = (rows: readonly TechniqueRow[]): string =>
  csvText(
    [
      'size',
      'thickness_mm',
      'share',
      'technique',
      'potential_kV',
      'filter',
      'grid',
      'tubeCurrent_mA',
      'exposureTime_ms',
      'tubeLoad_mAs',
      'detectorAirKerma_uGy',
      'detectorAirKermaAtEqualSdnr_uGy',
      'sdnr',
      'incidentAirKerma_mGy',
      'limits',
    ],
    rows.map((row) => [
      row.size,
      row.thickness_mm,
      row.share,
      row.technique,
      row.potential_kV,
      row.filter,
      row.grid,
      row.tubeCurrent_mA,
      row.exposureTime_ms,
      row.tubeLoad_mAs,
      row.detectorAirKerma_uGy,
      row.detectorAirKermaAtEqualSdnr_uGy,
      row.sdnr,
      row.incidentAirKerma_mGy,
      row.limits.join(' '),
    ]),
  );
