import { html, type TemplateResult } from 'lit';
import type { Choice } from '../fields/choice-field.js';

/** A labelled choice that belongs to the desk, not to the case. */
export const selectOf = (
  label: string,
  choices: readonly Choice[],
  chosen: string,
  choose: (value: string) => void,
): TemplateResult =>
  html`<label><span>${label}</span><select @change=${(event: Event) =>
    choose((event.target as HTMLSelectElement).value)}>${choices.map(
    ({ value, words }) =>
      html`<option value=${value} .selected=${value === chosen}>${words}</option>`,
  )}</select></label>`;
