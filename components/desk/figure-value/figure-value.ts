import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { formatNumber } from '../../charts/format.js';
import { quantity } from '../../charts/quantities.js';
import { ratioBar } from '../../charts/ratio-bar.js';
import { ratioSheet } from '../sheets/ratio-sheet.js';

/** Asks the desk to explain a number beside where it stands. */
export interface ExplainRequest {
  readonly quantity: string;
  readonly value: number | null;
  readonly technique: string;
}

/**
 * One computed number: value, unit and, where there is something to compare with, its ratio.
 *
 * Shows: `value` in the unit of `quantity`, greyed while `stale`.
 * Properties: `quantity` (id), `value`, `ratio`, `technique`, `stale`, `unit` (replaces the
 * quantity's own), `small`.
 * Events: `explain` with an ExplainRequest, on click or Enter. Parts: `figure`.
 */
@customElement('figure-value')
export class FigureValue extends LitElement {
  @property() quantity = '';
  @property({ attribute: false }) value: number | null = null;
  @property({ attribute: false }) ratio: number | null | undefined = undefined;
  @property() technique = '';
  @property() unit: string | null = null;
  @property({ type: Boolean, reflect: true }) stale = false;
  @property({ type: Boolean, reflect: true }) small = false;

  static override styles = [
    ratioSheet,
    css`
      :host {
        display: inline-flex;
        align-items: baseline;
        gap: 0.3em;
        white-space: nowrap;
      }
      button {
        font: inherit;
        font-size: var(--value);
        font-variant-numeric: inherit;
        line-height: 1.25;
        color: var(--field-ink, inherit);
        background: none;
        border: 0;
        padding: 0;
        min-width: 24px;
        min-height: 24px;
        text-align: inherit;
        cursor: help;
      }
      :host([small]) button {
        font-size: inherit;
      }
      .value {
        display: inline-flex;
        align-items: baseline;
        gap: 0.3em;
      }
      /* Ratios of one column share the place of their 1. */
      .value.compared {
        min-width: 6.6rem;
      }
      button:hover {
        text-decoration: underline dotted 1px;
        text-underline-offset: 3px;
      }
      :focus-visible {
        outline: 2px solid var(--field-ink, var(--ink));
        outline-offset: 2px;
        border-radius: 1px;
      }
      .unit {
        color: var(--soft);
        font-size: var(--text);
      }
      :host([small]) .unit {
        font-size: inherit;
      }
      /* An answer that comes at once greys nothing: no flicker while an arrow key is held. */
      :host([stale]) button {
        color: var(--soft);
        transition: color 0s 0.12s;
      }
      :host([stale]) .ratio svg {
        opacity: 0.45;
      }
      /* On a narrow page the ratio goes below its number. */
      @media (max-width: 719px) {
        :host {
          flex-wrap: wrap;
        }
        .value.compared {
          min-width: 0;
        }
        .ratio {
          margin-inline-start: 0;
        }
      }
    `,
  ];

  private explain() {
    const detail: ExplainRequest = {
      quantity: this.quantity,
      value: this.value,
      technique: this.technique,
    };
    this.dispatchEvent(new CustomEvent('explain', { detail, bubbles: true, composed: true }));
  }

  override render() {
    const { name, unit } = quantity(this.quantity);
    const shown = formatNumber(this.value);
    const shownUnit = this.unit ?? unit;
    return html`<span class=${this.ratio === undefined ? 'value' : 'value compared'}><button part="figure" type="button" aria-label="${name}, ${this.technique}: ${shown} ${shownUnit}" @click=${this.explain}>${shown}</button
      >${shownUnit ? html`<span class="unit">${shownUnit}</span>` : nothing}</span>${this.ratio === undefined ? nothing : ratioBar(this.ratio)}`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'figure-value': FigureValue;
  }
  interface HTMLElementEventMap {
    explain: CustomEvent<ExplainRequest>;
  }
}
