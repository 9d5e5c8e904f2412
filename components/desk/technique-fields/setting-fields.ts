import { html, nothing, type TemplateResult } from 'lit';
import { limitName } from '../../charts/limit-names.js';
import { quantity } from '../../charts/quantities.js';
import { renameTechnique } from '../../store/technique-changes.js';
import { type DeskModel, evaluationOf } from '../model/desk-model.js';

const number = (model: DeskModel, technique: number, id: string): TemplateResult => {
  const evaluation = evaluationOf(model, technique);
  return html`<figure-value quantity=${id} .value=${evaluation ? quantity(id).of(evaluation) : null} ?stale=${model.stale}
    technique=${model.draft.case.techniques[technique].name}></figure-value>`;
};

/** What forbids a technique at the size looked at, by the name of the first limit. */
function forbidden(model: DeskModel, technique: number) {
  const limits = evaluationOf(model, technique)?.findings.filter(
    ({ severity }) => severity === 'limit',
  );
  if (!limits || limits.length === 0) return nothing;
  const more = limits.length > 1 ? ` and ${limits.length - 1} more` : '';
  return html`<p class="forbidden">■ not allowed: ${limitName(limits[0].code)}${more}</p>`;
}

/** The technique's name, and on the right the choice among several Proposed ones. */
export function techniqueName(model: DeskModel, technique: number): TemplateResult {
  const { techniques } = model.draft.case;
  const choosable = technique !== model.left && techniques.length > 2;
  const choose = (event: Event) => {
    const detail = Number((event.target as HTMLSelectElement).value);
    event.target?.dispatchEvent(
      new CustomEvent('show-technique', { detail, bubbles: true, composed: true }),
    );
  };
  return html`<h2 class="technique">
      <text-field inline .draft=${model.draft} path="techniques[${technique}].name" label="Name of technique ${technique + 1}"
        .edit=${(name: string) => ({ change: renameTechnique(technique, name) })}></text-field>
    </h2>
    ${
      choosable
        ? html`<label class="switch">shown <select @change=${choose}>${techniques.map((entry, i) =>
            i === model.left
              ? null
              : html`<option value=${i} ?selected=${i === technique}>${entry.name}</option>`,
          )}</select></label>`
        : null
    }
    ${forbidden(model, technique)}`;
}

/** Potential, typed in place. */
export const potentialField = (model: DeskModel, technique: number): TemplateResult =>
  html`<span class="name">Potential</span
    ><number-field inline style="--field-size:var(--value)" .draft=${model.draft} path="techniques[${technique}].potential_kV" label="Potential" unit="kV"
      step=${model.draft.case.room.tube.potential_kV.step}></number-field>`;

/** Filter among the room's, and the half-value layer it gives. */
export const filterField = (model: DeskModel, technique: number): TemplateResult =>
  html`<span class="name">Filter · half-value layer</span
    ><span class="pair"
      ><choice-field inline style="--field-size:var(--value)" .draft=${model.draft} path="techniques[${technique}].filter" label="Filter"
        .choices=${model.draft.case.room.filters.map(({ name }) => ({ value: name, words: name }))}></choice-field>
      <span class="dot">·</span> ${number(model, technique, 'halfValueLayer')}</span
    >`;

/** Grid in or out, and what it asks of the beam. */
export function gridField(model: DeskModel, technique: number): TemplateResult {
  const fitted = model.draft.case.room.grid !== null;
  const isIn = evaluationOf(model, technique)?.grid !== null && fitted;
  return html`<span class="name">Grid${isIn ? ' · Bucky factor' : ''}</span
    ><span class="pair"
      ><choice-field inline style="--field-size:var(--value)" .draft=${model.draft} path="techniques[${technique}].grid" label="Grid"
        .choices=${[{ value: 'in', words: fitted ? 'in' : 'none fitted' }, { value: 'out', words: 'out' }]}></choice-field>
      ${isIn ? html`<span class="dot">·</span> ${number(model, technique, 'buckyFactor')}` : null}</span
    >`;
}
