import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Fault } from '../../../physics/case/index.js';

/**
 * What is wrong with the case, or with a file that was refused: one line a fault, in the order
 * path, value, rule, remedy.
 *
 * Properties: `heading`, `faults`, `closable`. Events: `close`. Keyboard: native. Parts: none.
 */
@customElement('fault-list')
export class FaultList extends LitElement {
  @property() heading = '';
  @property({ attribute: false }) faults: readonly Fault[] = [];
  @property({ type: Boolean }) closable = false;

  static override styles = css`
    :host {
      display: block;
    }
    section {
      border-block-end: 1px solid var(--rule);
      background: var(--paper-shade);
      padding: 0.6rem 1.75rem;
      font-size: var(--small);
      line-height: 1.5;
    }
    h2 {
      margin: 0;
      font-size: inherit;
      font-weight: 700;
      display: inline;
    }
    ol {
      margin: 0.3rem 0 0;
      padding-inline-start: 1.4rem;
      max-height: 11rem;
      overflow: auto;
      overflow-wrap: anywhere;
    }
    code {
      font: inherit;
      font-weight: 700;
    }
    button {
      font: inherit;
      float: inline-end;
      color: var(--ink);
      background: none;
      border: 0;
      border-block-end: 1px dotted var(--entry-rule);
      padding: 0;
      cursor: pointer;
    }
    :focus-visible {
      outline: 2px solid var(--ink);
      outline-offset: 2px;
    }
  `;

  override render() {
    if (this.faults.length === 0) return nothing;
    const close = () => this.dispatchEvent(new CustomEvent('close'));
    return html`<section role="alert" aria-label=${this.heading}>
      ${this.closable ? html`<button type="button" @click=${close}>close</button>` : nothing}
      <h2>${this.heading}</h2>
      <ol tabindex="0" aria-label="Faults">${this.faults.map(
        ({ path, value, rule, remedy }) =>
          html`<li><code>${path}</code>: ${value}: ${rule}; ${remedy}</li>`,
      )}</ol>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'fault-list': FaultList;
  }
}
