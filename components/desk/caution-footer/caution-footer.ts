import { css, html, LitElement } from 'lit';
import { customElement } from 'lit/decorators.js';
import { cautions } from '../../../physics/cautions.js';

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
    return html`<footer>${cautions.join(' ')}</footer>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'caution-footer': CautionFooter;
  }
}
