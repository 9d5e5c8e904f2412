import { css, html, LitElement } from 'lit';
import { customElement } from 'lit/decorators.js';

/** What the desk is and is not for; always in view. No properties, events, keys or parts. */
@customElement('caution-footer')
export class CautionFooter extends LitElement {
  static override styles = css`
    :host {
      display: block;
      border-block-start: 1px solid var(--rule);
      background: var(--paper);
      color: var(--soft);
      font-size: 0.65rem;
      line-height: 1.4;
      padding: 0.4rem 1.75rem;
    }
    @media (max-width: 719px) {
      :host {
        padding-inline: 1rem;
      }
    }
  `;

  override render() {
    return html`<footer>
      Planning and documentation aid for qualified medical physicists. Modelled values need
      confirmation by measurement before clinical use. Local regulations and licensed practice
      decide. No patient identifiers. Not for decisions on an individual’s treatment.
    </footer>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'caution-footer': CautionFooter;
  }
}
