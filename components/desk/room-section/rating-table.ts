import { html, type TemplateResult } from 'lit';
import { type Draft, listAt } from '../../store/draft.js';
import { faultNote } from '../fields/fault-note.js';
import { fieldOf, numberSpec } from '../fields/field-specs.js';
import { addButton, removeButton } from '../fields/list-buttons.js';

const path = 'room.tube.rating';

/** Where a row begins: at the room's own bounds, then at twice the longest time already there. */
function fresh({ case: c }: Draft) {
  const { rating, exposureTime_ms, power_kW } = c.room.tube;
  const last = rating.at(-1);
  return last
    ? { exposureTime_ms: 2 * last.exposureTime_ms, power_kW: last.power_kW }
    : { exposureTime_ms: exposureTime_ms.max, power_kW };
}

/** The tube's rating chart: greatest power against exposure time, in ascending time. */
export function ratingTable(draft: Draft): TemplateResult {
  const rows = listAt(draft, path);
  const row = (i: number) => html`<tr>
    <td>${fieldOf(draft, numberSpec(`${path}[${i}].exposureTime_ms`, `Exposure time, rating row ${i + 1}`, 'ms', 10), true)}</td>
    <td>${fieldOf(draft, numberSpec(`${path}[${i}].power_kW`, `Power, rating row ${i + 1}`, 'kW'), true)}</td>
    <td>${removeButton(draft, path, i, `rating row ${i + 1}`)}</td>
  </tr>`;
  return html`${
    rows.length > 0
      ? html`<table><thead><tr><th scope="col">exposure time</th><th scope="col">greatest power</th><td></td></tr></thead>
          <tbody>${rows.map((_, i) => row(i))}</tbody></table>`
      : html`<p class="note">None entered: the greatest power holds at every exposure time.</p>`
  }
    <p class="after">${addButton(draft, path, fresh(draft), 'a row')}</p>
    ${faultNote(draft.faults.find((fault) => fault.path === path))}`;
}
