import { html, type TemplateResult } from 'lit';
import { materialNames } from '../../../materials/index.js';
import type { Draft } from '../../store/draft.js';
import { renameFilter } from '../../store/list-changes.js';
import { choiceSpec, fieldOf, numberSpec } from '../fields/field-specs.js';
import { addButton, removeButton } from '../fields/list-buttons.js';

/** The filters the room can add to the beam: each a name and its slabs. */
export function filtersTable(draft: Draft): TemplateResult {
  const { filters } = draft.case.room;
  const { techniques } = draft.case;
  const names = filters.map(({ name }) => name);
  const fresh = ['new filter', ...Array.from({ length: 99 }, (_, i) => `new filter ${i + 2}`)].find(
    (name) => !names.includes(name),
  );
  return html`<div class="scroll" tabindex="0" role="region" aria-label="Added filters"><table>
      <thead><tr><th scope="col">name</th><th scope="col">slabs</th><td></td></tr></thead>
      <tbody>${filters.map(({ name, layers }, i) => {
        const path = `room.filters[${i}].layers`;
        const used = techniques.some((technique) => technique.filter === name);
        return html`<tr>
          <td><text-field inline .draft=${draft} path="room.filters[${i}].name" label="Name of filter ${i + 1}"
            .edit=${(text: string) => ({ change: renameFilter(i, text) })}></text-field></td>
          <td>${layers.map(
            (
              _,
              k,
            ) => html`<span>${fieldOf(draft, choiceSpec(`${path}[${k}].material`, `Material, filter ${name}`, materialNames), true)}
              ${fieldOf(draft, numberSpec(`${path}[${k}].thickness_mm`, `Thickness, filter ${name}`, 'mm', 0.1), true)}
              ${removeButton(draft, path, k, `slab ${k + 1} of filter ${name}`)}</span>`,
          )}${addButton(draft, path, { material: 'copper', thickness_mm: 0.1 }, 'a slab')}</td>
          <td>${removeButton(draft, 'room.filters', i, `filter ${name}`, !used && filters.length > 1)}</td>
        </tr>`;
      })}</tbody>
    </table></div>
    <p class="after">${addButton(draft, 'room.filters', { name: fresh ?? 'filter', layers: [{ material: 'copper', thickness_mm: 0.1 }] }, 'a filter')}</p>`;
}
