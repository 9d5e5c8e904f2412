import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { formatEntry } from '../../charts/format.js';
import { layerEdits } from '../layer-fields/layer-edits.js';
import { layerKeys } from '../layer-fields/layer-keys.js';
import { materialChoices } from '../layer-fields/material-choices.js';
import type { DeskModel } from '../model/desk-model.js';
import '../fields/choice-field.js';
import '../fields/number-field.js';

/**
 * One layer named where it lies in the section: material and thickness, edited in place.
 *
 * Shows: also what the layer measures at the size looked at, where that is not what is drawn.
 * Properties: `model`, `index`, `thickness_mm` (at the size shown). Events: `case-edit`.
 * Keyboard: Alt+ArrowUp/Down moves the layer, Alt+Delete removes it, Alt+Insert adds one below.
 * Parts: none.
 */
@customElement('layer-label')
export class LayerLabel extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ type: Number }) index = 0;
  @property({ type: Number, attribute: 'thickness-mm' }) thickness_mm = 0;

  static override styles = css`
    :host {
      display: inline-flex;
      align-items: baseline;
      gap: 0.35em;
      padding: 0.05rem 0.3rem;
      background: color-mix(in srgb, var(--paper) 84%, transparent);
    }
    .grown {
      color: var(--soft);
    }
  `;

  constructor() {
    super();
    this.addEventListener('keydown', (event) => layerKeys(this, event, this.index));
  }

  override render() {
    const { draft } = this.model;
    const layer = draft.case.patient.layers[this.index];
    const path = `patient.layers[${this.index}]`;
    const grown = Math.abs(this.thickness_mm - layer.thickness_mm) > 0.05;
    return html`<choice-field data-field inline .draft=${draft} path="${path}.material" label="Material of layer ${layer.name}"
        .choices=${materialChoices(draft)}></choice-field>
      <number-field data-field inline .draft=${draft} path="${path}.thickness_mm" label="Thickness of layer ${layer.name}" unit="mm"
        .edit=${layerEdits.thickness(this.index)}></number-field>
      ${layer.agent ? html`<span class="grown">with ${layer.agent.name}</span>` : nothing}
      ${grown ? html`<span class="grown">· ${formatEntry(Number(this.thickness_mm.toFixed(1)))} here</span>` : nothing}`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'layer-label': LayerLabel;
  }
}
