import { html, LitElement } from 'lit';
import { customElement, property } from 'lit/decorators.js';

/** Exists to show that decorators are lowered the way Lit needs wherever the tests serve sources. */
@customElement('house-decorated')
export class DecoratedElement extends LitElement {
  @property({ type: Number, attribute: 'thickness-mm' }) thickness_mm = 1;

  override render() {
    return html`<p>${this.thickness_mm} mm</p>`;
  }
}
