import { html, nothing, type TemplateResult } from 'lit';
import type { Source } from '../../../physics/case/schema.js';
import type { Draft } from '../../store/draft.js';
import type { Json } from '../../store/path.js';
import { fieldOf, numberSpec, textSpec } from '../fields/field-specs.js';
import { addButton, removeButton } from '../fields/list-buttons.js';

const path = 'room.source';

const kinds = [
  { value: 'tube', words: 'the tube below' },
  { value: 'monoenergetic', words: 'photons of one energy' },
  { value: 'lines', words: 'lines of a radionuclide' },
  { value: 'spectrum', words: 'a spectrum from a CSV file' },
];

/** Where each kind begins: something to be overwritten. */
const begins: Record<string, Json> = {
  tube: null,
  monoenergetic: { kind: 'monoenergetic', energy_keV: 60 },
  lines: { kind: 'lines', lines: [[60, 1]] },
  spectrum: { kind: 'spectrum', file: 'spectrum.csv' },
};

function own(draft: Draft, source: Source): TemplateResult | typeof nothing {
  if (source.kind === 'monoenergetic') {
    return fieldOf(draft, numberSpec(`${path}.energy_keV`, 'Photon energy', 'keV'));
  }
  if (source.kind === 'spectrum') {
    return html`${fieldOf(draft, textSpec(`${path}.file`, 'File'))}
      <p class="note">Drop the file on the page together with the case, or after it.</p>`;
  }
  return html`${source.lines.map(
    (
      _,
      i,
    ) => html`<span>${fieldOf(draft, numberSpec(`${path}.lines[${i}][0]`, `Energy of line ${i + 1}`, 'keV'), true)}
      ${fieldOf(draft, numberSpec(`${path}.lines[${i}][1]`, `Photons of line ${i + 1}`, 'photons', 0.1), true)}
      ${removeButton(draft, `${path}.lines`, i, `line ${i + 1}`, source.lines.length > 1)}</span>`,
  )}
  ${addButton(draft, `${path}.lines`, [100, 1], 'a line')}`;
}

/** What the beam comes from: the room's tube, or something that replaces it. */
export function sourceFields(draft: Draft): TemplateResult {
  const { source } = draft.case.room;
  return html`<choice-field .draft=${draft} path=${path} label="The beam comes from" .value=${source?.kind ?? 'tube'}
      .choices=${kinds} .toJson=${(chosen: string) => begins[chosen]}></choice-field>
    ${source ? own(draft, source) : nothing}`;
}
