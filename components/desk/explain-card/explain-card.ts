import { css, html, LitElement, nothing } from 'lit';
import { customElement, state } from 'lit/decorators.js';
import { formatNumber } from '../../charts/format.js';
import { quantity } from '../../charts/quantities.js';
import type { ExplainRequest } from '../figure-value/figure-value.js';

/**
 * Explains one number where it stands: its name, value to full precision, how it is computed, and
 * where it comes from.
 *
 * Methods: `show(request, from)` beside the element `from`. Properties and events: none.
 * Keyboard: Escape closes and returns to the number. Parts: none.
 */
@customElement('explain-card')
export class ExplainCard extends LitElement {
  @state() private request: ExplainRequest | null = null;

  static override styles = css`
    :host {
      position: fixed;
      inset: auto;
      margin: 0;
      width: 19rem;
      padding: 0.7rem 0.9rem 0.8rem;
      border: 1px solid var(--soft);
      background: var(--paper);
      color: var(--ink);
      font-size: var(--small);
      line-height: 1.45;
      box-shadow: 0 2px 14px rgb(0 0 0 / 14%);
    }
    h2 {
      margin: 0;
      font-size: var(--text);
    }
    p {
      margin: 0.35rem 0 0;
    }
    .soft {
      color: var(--soft);
    }
    :host(:focus-visible) {
      outline: 2px solid var(--ink);
      outline-offset: 2px;
    }
  `;

  override connectedCallback() {
    super.connectedCallback();
    this.setAttribute('popover', 'auto');
    this.setAttribute('role', 'dialog');
    this.setAttribute('aria-label', 'Where this number comes from');
    this.tabIndex = -1;
  }

  /** Opens beside `from`, inside the window. */
  show(request: ExplainRequest, from: HTMLElement): void {
    this.request = request;
    const box = from.getBoundingClientRect();
    this.style.left = `${Math.max(8, Math.min(box.left, innerWidth - 330))}px`;
    this.style.top = `${Math.max(8, Math.min(box.bottom + 6, innerHeight - 190))}px`;
    this.showPopover();
    this.focus({ preventScroll: true });
    const back = (event: Event) => {
      if ((event as ToggleEvent).newState !== 'closed') return;
      this.removeEventListener('toggle', back);
      if (this.matches(':focus') || document.activeElement === document.body)
        from.focus({ preventScroll: true });
    };
    this.addEventListener('toggle', back);
  }

  override render() {
    if (!this.request) return nothing;
    const { name, unit, per, words } = quantity(this.request.quantity);
    const { value, technique } = this.request;
    return html`<h2>${name}${per ? `, ${per}` : ''}</h2>
      <p>${technique}: ${formatNumber(value, 7)} ${unit}</p>
      <p>${words}</p>
      <p class="soft">Computed by the model from the case as entered; confirm by measurement.</p>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'explain-card': ExplainCard;
  }
}
