import { html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Draft } from '../../store/draft.js';
import { faultAt, isAssumed, shownAt } from '../../store/draft.js';
import type { Json } from '../../store/path.js';
import { fieldSheet } from '../sheets/field-sheet.js';
import { requestEdit } from './case-edit.js';
import { faultNote } from './fault-note.js';

/** One thing that can be chosen: what the case holds, and the words for it. */
export interface Choice {
  readonly value: string;
  readonly words: string;
}

/**
 * A choice among named things, set as words on a dotted rule.
 *
 * Shows: the chosen words; a value outside the list is listed too, so that nothing is lost.
 * Properties: `draft`, `path`, `label`, `choices`, `inline`; `value` and `edit` replace reading and
 * writing `path` where a choice stands for more than one value.
 * Events: `case-edit` on choosing. Keyboard: that of a native select. Parts: `input`.
 */
@customElement('choice-field')
export class ChoiceField extends LitElement {
  @property({ attribute: false }) draft!: Draft;
  @property() path = '';
  @property() label = '';
  @property({ attribute: false }) choices: readonly Choice[] = [];
  @property({ attribute: false }) value: string | null = null;
  @property({ attribute: false }) toJson: (chosen: string) => Json | undefined = (chosen) => chosen;
  @property({ type: Boolean, reflect: true }) inline = false;

  static override styles = fieldSheet;

  private get chosen(): string {
    const shown = this.value ?? shownAt(this.draft, this.path);
    return typeof shown === 'string' || typeof shown === 'number' ? String(shown) : '';
  }

  private onChange(event: Event) {
    const chosen = (event.target as HTMLSelectElement).value;
    requestEdit(this, { path: this.path, value: this.toJson(chosen) });
  }

  override render() {
    const fault = faultAt(this.draft, this.path);
    const assumed = isAssumed(this.draft, this.path);
    const chosen = this.chosen;
    const listed = this.choices.some((choice) => choice.value === chosen);
    const choices = listed
      ? this.choices
      : [...this.choices, { value: chosen, words: chosen || '–' }];
    return html`<label class=${`${assumed ? 'assumed' : ''} ${fault ? 'faulty' : ''}`} title=${assumed ? 'assumed: the case is silent here' : nothing}
        ><span class="name">${this.label}</span>
        <span class="choice"
          ><select part="input" aria-invalid=${fault ? 'true' : 'false'} aria-describedby=${fault ? 'fault' : nothing} @change=${this.onChange}>
            ${choices.map((choice) => html`<option value=${choice.value} ?selected=${choice.value === chosen} .selected=${choice.value === chosen}>${choice.words}</option>`)}
          </select></span
        ></label
      >${faultNote(fault)}`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'choice-field': ChoiceField;
  }
}
