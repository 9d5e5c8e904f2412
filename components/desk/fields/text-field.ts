import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Draft } from '../../store/draft.js';
import { faultAt, shownAt } from '../../store/draft.js';
import { fieldSheet } from '../sheets/field-sheet.js';
import { type CaseEdit, requestEdit } from './case-edit.js';
import { faultNote } from './fault-note.js';

/**
 * A name or sentence of the case, edited in place.
 *
 * Shows: the document's text as plain text. Properties: `draft`, `path`, `label`, `inline`,
 * `placeholder`. Events: `case-edit` on Enter and on leaving. Keyboard: Escape restores.
 * Parts: `input`.
 */
@customElement('text-field')
export class TextField extends LitElement {
  @property({ attribute: false }) draft!: Draft;
  @property() path = '';
  @property() label = '';
  @property() placeholder = '';
  @property({ type: Boolean, reflect: true }) inline = false;
  /** The edit a new text asks for, where that is more than writing it at `path`. */
  @property({ attribute: false }) edit: ((text: string) => CaseEdit) | null = null;

  static override styles = [
    fieldSheet,
    css`
      input {
        field-sizing: content;
        text-overflow: ellipsis;
        font-weight: inherit;
        font-style: inherit;
        min-width: 3em;
      }
    `,
  ];

  private get text(): string {
    const shown = shownAt(this.draft, this.path);
    return shown === null || shown === undefined ? '' : String(shown);
  }

  private commit(text: string) {
    if (text === this.text) return;
    requestEdit(this, this.edit ? this.edit(text) : { path: this.path, value: text });
  }

  private onKey(event: KeyboardEvent) {
    const input = event.target as HTMLInputElement;
    if (event.key === 'Enter') this.commit(input.value);
    if (event.key === 'Escape') input.value = this.text;
  }

  override render() {
    const fault = faultAt(this.draft, this.path);
    return html`<label class=${fault ? 'faulty' : ''}
        ><span class="name">${this.label}</span
        ><input part="input" type="text" autocomplete="off" .value=${this.text} placeholder=${this.placeholder}
          aria-invalid=${fault ? 'true' : 'false'} aria-describedby=${fault ? 'fault' : nothing}
          @keydown=${this.onKey} @change=${(event: Event) => this.commit((event.target as HTMLInputElement).value)} /></label
      >${faultNote(fault)}`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'text-field': TextField;
  }
}
