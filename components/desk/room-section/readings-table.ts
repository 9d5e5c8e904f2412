import { html, type TemplateResult } from 'lit';
import type { Residual } from '../../../physics/results.js';
import { formatNumber } from '../../charts/format.js';
import { listAt } from '../../store/draft.js';
import { faultNote } from '../fields/fault-note.js';
import { choiceSpec, fieldOf, numberSpec } from '../fields/field-specs.js';
import { addButton, removeButton } from '../fields/list-buttons.js';
import type { DeskModel } from '../model/desk-model.js';
import { readingsImport } from './readings-import.js';

const signed = (percent: number): string =>
  `${percent > 0 ? '+' : ''}${formatNumber(percent, 2)} %`;

/** The user's own measurements, which calibrate the model, each with what the model makes of it. */
export function readingsTable({ draft, weighing }: DeskModel): TemplateResult {
  const readings = listAt(draft, 'room.readings');
  const names = draft.case.room.filters.map(({ name }) => name);
  const residual = (i: number, quantity: Residual['quantity']) => {
    const found = weighing?.calibration?.residuals.find(
      (entry) =>
        entry.quantity === quantity &&
        (entry.path === `room.readings[${i}]` || entry.path.startsWith(`room.readings[${i}].`)),
    );
    return found ? `${formatNumber(found.model)} (${signed(found.relative_percent)})` : '–';
  };
  const row = (i: number) => {
    const at = `room.readings[${i}]`;
    const name = (label: string) => `${label}, reading ${i + 1}`;
    return html`<tr>
      <td>${fieldOf(draft, numberSpec(`${at}.potential_kV`, name('Potential'), 'kV'), true)}</td>
      <td>${fieldOf(draft, choiceSpec(`${at}.filter`, name('Filter'), names), true)}</td>
      <td>${fieldOf(draft, numberSpec(`${at}.halfValueLayer_mmAl`, name('Half-value layer'), 'mm Al', 0.01, '–'), true)}</td>
      <td>${residual(i, 'halfValueLayer_mmAl')}</td>
      <td>${fieldOf(draft, numberSpec(`${at}.airKerma_uGy_per_mAs`, name('Air kerma'), 'µGy/mAs', 0.1, '–'), true)}</td>
      <td>${residual(i, 'airKerma_uGy_per_mAs')}</td>
      <td>${fieldOf(draft, numberSpec(`${at}.distance_mm`, name('Distance'), 'mm', 10), true)}</td>
      <td>${fieldOf(draft, numberSpec(`${at}.relativeUncertainty_percent`, name('Uncertainty'), '%'), true)}</td>
      <td>${removeButton(draft, 'room.readings', i, `reading ${i + 1}`)}</td>
    </tr>`;
  };
  return html`${
    readings.length > 0
      ? html`<div class="scroll" tabindex="0" role="region" aria-label="Readings"><table>
          <thead><tr>${[
            'potential',
            'filter',
            'half-value layer',
            'model',
            'air kerma',
            'model',
            'distance',
            'uncertainty',
          ].map((heading) => html`<th scope="col">${heading}</th>`)}<td></td></tr></thead>
          <tbody>${readings.map((_, i) => row(i))}</tbody></table></div>`
      : html`<p class="note">None entered: the tube is not calibrated to this room, and its output may be off by a third.</p>`
  }
    <p class="after">${addButton(draft, 'room.readings', { potential_kV: 80, filter: names[0] ?? 'none', halfValueLayer_mmAl: null, airKerma_uGy_per_mAs: null }, 'a reading')}
      ${readingsImport()}</p>
    ${faultNote(draft.faults.find(({ path }) => /^room\.readings\[\d+\]$/.test(path)))}`;
}
