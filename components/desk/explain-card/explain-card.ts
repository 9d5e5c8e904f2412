import { css, html, LitElement, nothing } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { formatNumber } from '../../charts/format.js';
import { quantity } from '../../charts/quantities.js';
import type { ExplainRequest } from '../figure-value/figure-value.js';
import type { DeskModel } from '../model/desk-model.js';
import { inputsOf } from './inputs.js';

/**
 * Explains one number where it stands: its name, value to full precision, how it is computed, and
 * where each thing it was computed from comes from.
 *
 * Methods: `show(request, from)` beside the element `from`. Properties: `model`. Events: none.
 * Keyboard: Escape closes and returns to the number. Parts: none.
 */
@customElement('explain-card')
export class ExplainCard extends LitElement {
  @property({ attribute: false }) model: DeskModel | null = null;
  @state() private request: ExplainRequest | null = null;

  static override styles = css`
    :host {
      position: fixed;
      inset: auto;
      margin: 0;
      width: min(23rem, calc(100vw - 16px));
      max-height: calc(100vh - 16px);
      overflow: auto;
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
    h3 {
      margin: 0.6rem 0 0;
      font-size: inherit;
    }
    dl {
      margin: 0.15rem 0 0;
    }
    dl div {
      display: grid;
      grid-template-columns: 6.2rem minmax(0, 1fr);
      gap: 0 0.5rem;
    }
    dt,
    .soft {
      color: var(--soft);
    }
    dd {
      margin: 0;
      overflow-wrap: anywhere;
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
    this.showPopover();
    void this.place(from);
    this.focus({ preventScroll: true });
    const back = (event: Event) => {
      if ((event as ToggleEvent).newState !== 'closed') return;
      this.removeEventListener('toggle', back);
      if (this.matches(':focus') || document.activeElement === document.body)
        from.focus({ preventScroll: true });
    };
    this.addEventListener('toggle', back);
  }

  /** Below the number where there is room, else as near as the window lets it. */
  private async place(from: HTMLElement) {
    await this.updateComplete;
    const box = from.getBoundingClientRect();
    const { width, height } = this.getBoundingClientRect();
    this.style.left = `${Math.max(8, Math.min(box.left, innerWidth - width - 8))}px`;
    this.style.top = `${Math.max(8, Math.min(box.bottom + 6, innerHeight - height - 8))}px`;
  }

  private inputs(technique: string) {
    if (!this.model || !this.request) return nothing;
    const said = inputsOf(this.request.quantity, this.model, technique);
    return said.length === 0
      ? nothing
      : html`<h3>Computed from</h3>
        <dl>${said.map(({ what, from }) => html`<div><dt>${what}</dt><dd>${from}</dd></div>`)}</dl>`;
  }

  override render() {
    if (!this.request) return nothing;
    const { name, unit, per, words } = quantity(this.request.quantity);
    const { value, technique } = this.request;
    return html`<h2>${name}${per ? `, ${per}` : ''}</h2>
      <p>${technique}: ${formatNumber(value, 7)} ${unit}</p>
      <p>${words}</p>
      ${this.inputs(technique)}
      <p class="soft">Modelled: confirm by measurement before clinical use.</p>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'explain-card': ExplainCard;
  }
}
