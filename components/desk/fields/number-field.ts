import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { formatEntry } from '../../charts/format.js';
import type { Draft } from '../../store/draft.js';
import { faultAt, isAssumed, shownAt } from '../../store/draft.js';
import type { Json } from '../../store/path.js';
import { fieldSheet } from '../sheets/field-sheet.js';
import { type CaseEdit, requestEdit } from './case-edit.js';
import { faultNote } from './fault-note.js';
import { readNumber } from './read-number.js';

/**
 * A number of the case, typed in place beside its unit.
 *
 * Shows: the document's value, in italics where the case is silent and the value assumed; the
 * standing fault beneath it.
 * Properties: `draft`, `path`, `label`, `unit`, `step` (arrow step), `empty` (what an empty field
 * stands for; without it emptying is refused), `inline` (label for screen readers only).
 * Events: `case-edit` on Enter, on leaving, and on each arrow step.
 * Keyboard: ArrowUp/Down by `step`, with Shift by ten steps; Escape restores.
 * Parts: `input`.
 */
@customElement('number-field')
export class NumberField extends LitElement {
  @property({ attribute: false }) draft!: Draft;
  @property() path = '';
  @property() label = '';
  @property() unit = '';
  @property({ type: Number }) step = 1;
  @property() empty: string | null = null;
  @property({ type: Boolean, reflect: true }) inline = false;
  /** The edit a new value asks for, where that is more than writing it at `path`. */
  @property({ attribute: false }) edit: ((value: Json) => CaseEdit) | null = null;
  /** Words shown after the figure instead of the bare unit: `mm Al`, `per s`. */
  @property() unitShown: string | null = null;

  static override styles = [
    fieldSheet,
    css`
      input {
        /* A short figure is hit on 24 px but takes no more room than it is wide. */
        --natural: calc(var(--chars, 3) * 1ch + 3px);
        width: max(24px, var(--natural));
        margin-inline: min(0px, (var(--natural) - 24px) / 2);
        text-align: center;
      }
      /* Words in place of a figure have no unit. */
      input:placeholder-shown:not([placeholder=""]) + .unit {
        display: none;
      }
    `,
  ];

  private get text(): string {
    const value = shownAt(this.draft, this.path);
    if (value === null || value === undefined) return '';
    return typeof value === 'number' ? formatEntry(value) : String(value);
  }

  private commit(text: string) {
    if (text.trim() === this.text) return;
    const emptied = text.trim() === '' && this.empty !== null;
    const value = emptied ? null : (readNumber(text, this.unit) ?? text.trim());
    requestEdit(this, this.edit ? this.edit(value) : { path: this.path, value });
  }

  private onKey(event: KeyboardEvent) {
    const input = event.target as HTMLInputElement;
    if (event.key === 'Enter') this.commit(input.value);
    if (event.key === 'Escape') input.value = this.text;
    const direction = { ArrowUp: 1, ArrowDown: -1 }[event.key];
    if (direction === undefined || event.altKey) return;
    event.preventDefault();
    const number = readNumber(input.value, this.unit);
    if (number === null) return;
    const next = number + direction * this.step * (event.shiftKey ? 10 : 1);
    input.value = formatEntry(next);
    this.resize(input);
    this.commit(input.value);
  }

  private resize(input: HTMLInputElement) {
    input.style.setProperty(
      '--chars',
      String(Math.max(1, input.value.length || (this.empty ?? '').length)),
    );
  }

  override render() {
    const fault = faultAt(this.draft, this.path);
    const assumed = isAssumed(this.draft, this.path);
    const unit = this.unitShown ?? this.unit;
    const text = this.text;
    const chars = Math.max(1, text.length || (this.empty ?? '').length);
    return html`<label class=${`${assumed ? 'assumed' : ''} ${fault ? 'faulty' : ''}`} title=${assumed ? 'assumed: the case is silent here' : nothing}
        ><span class="name">${this.label}</span>
        <span class="entry"
          ><input part="input" type="text" inputmode="decimal" role="spinbutton" autocomplete="off" spellcheck="false"
            style="--chars:${chars}" .value=${text} placeholder=${this.empty ?? ''}
            aria-valuenow=${Number.isFinite(Number(text)) && text !== '' ? text : nothing}
            aria-valuetext=${text === '' ? (this.empty ?? 'empty') : `${text} ${this.unit}`}
            aria-invalid=${fault ? 'true' : 'false'} aria-describedby=${fault ? 'fault' : nothing}
            @input=${(event: Event) => this.resize(event.target as HTMLInputElement)}
            @keydown=${this.onKey} @change=${(event: Event) => this.commit((event.target as HTMLInputElement).value)}
          />${unit ? html`<span class="unit">${unit}</span>` : nothing}</span
        ></label
      >${faultNote(fault)}`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'number-field': NumberField;
  }
}
