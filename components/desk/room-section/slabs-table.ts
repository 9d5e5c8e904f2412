import { html, type TemplateResult } from 'lit';
import { materialNames } from '../../../materials/index.js';
import { type Draft, listAt } from '../../store/draft.js';
import { choiceSpec, fieldOf, numberSpec } from '../fields/field-specs.js';
import { addButton, removeButton } from '../fields/list-buttons.js';

/** A list of slabs, material and thickness, with rows to add and remove; `sided` adds the side. */
export function slabsTable(
  draft: Draft,
  path: string,
  caption: string,
  sided = false,
): TemplateResult {
  const rows = listAt(draft, path);
  const row = (i: number) => {
    const at = `${path}[${i}]`;
    const what = `slab ${i + 1} of ${caption.toLowerCase()}`;
    return html`<tr>
      <td>${fieldOf(draft, choiceSpec(`${at}.material`, `Material, ${what}`, materialNames), true)}</td>
      <td>${fieldOf(draft, numberSpec(`${at}.thickness_mm`, `Thickness, ${what}`, 'mm', 0.1), true)}</td>
      ${sided ? html`<td>${fieldOf(draft, choiceSpec(`${at}.side`, `Side, ${what}`, ['entrance', 'exit']), true)}</td>` : null}
      <td>${removeButton(draft, path, i, what)}</td>
    </tr>`;
  };
  return html`${
    rows.length > 0
      ? html`<table><thead><tr><th scope="col">material</th><th scope="col">thickness</th>${sided ? html`<th scope="col">side</th>` : null}<td></td></tr></thead>
          <tbody>${rows.map((_, i) => row(i))}</tbody></table>`
      : html`<p class="note">None.</p>`
  }
    <p class="after">${addButton(draft, path, { material: 'aluminium', thickness_mm: 1 }, 'a slab')}</p>`;
}
