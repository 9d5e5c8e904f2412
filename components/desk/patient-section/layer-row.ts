import { css, html, LitElement } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { formatEntry } from '../../charts/format.js';
import { renameLayer } from '../../store/layer-changes.js';
import { requestEdit } from '../fields/case-edit.js';
import { layerAgent } from '../layer-fields/layer-agent.js';
import { layerEdits } from '../layer-fields/layer-edits.js';
import { layerKeys } from '../layer-fields/layer-keys.js';
import { materialChoices } from '../layer-fields/material-choices.js';
import type { DeskModel } from '../model/desk-model.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import '../fields/choice-field.js';
import '../fields/number-field.js';
import '../fields/text-field.js';

/**
 * One layer as a row: its place, name, material, thickness, and share of growth.
 *
 * Properties: `model`, `index`, `thickness_mm` (at the size looked at). Events: `case-edit`.
 * Keyboard: Alt+ArrowUp/Down moves, Alt+Delete removes, Alt+Insert adds below. Parts: none.
 */
@customElement('layer-row')
export class LayerRow extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ type: Number }) index = 0;
  @property({ type: Number, attribute: 'thickness-mm' }) thickness_mm = 0;

  static override styles = [
    sectionSheet,
    css`
      :host {
        display: grid;
        grid-template-columns: subgrid;
        grid-column: 1 / -1;
        border: 0;
        border-block-end: 1px solid var(--rule);
        padding: 0.28rem 0;
        align-items: baseline;
        white-space: nowrap;
      }
      button.plain {
        margin-inline-end: 0.5rem;
      }
    `,
  ];

  constructor() {
    super();
    this.addEventListener('keydown', (event) => layerKeys(this, event, this.index));
  }

  override render() {
    const { draft } = this.model;
    const { layers } = draft.case.patient;
    const { name } = layers[this.index];
    const path = `patient.layers[${this.index}]`;
    const move = (by: -1 | 1, sign: string, words: string, enabled: boolean) =>
      html`<button class="plain" type="button" aria-label="Move layer ${name} ${words}" ?disabled=${!enabled}
        @click=${() => requestEdit(this, layerEdits.move(this.index, by))}>${sign}</button>`;
    return html`<span role="cell">${move(-1, '↑', 'up', this.index > 0)}${move(1, '↓', 'down', this.index < layers.length - 1)}</span>
      <span role="cell"><text-field data-field inline .draft=${draft} path="${path}.name" label="Name of layer ${this.index + 1}"
        .edit=${(text: string) => ({ change: renameLayer(this.index, text) })}></text-field></span>
      <span role="cell"><choice-field data-field inline .draft=${draft} path="${path}.material" label="Material of layer ${name}" .choices=${materialChoices(draft)}></choice-field></span>
      <span role="cell"><number-field data-field inline .draft=${draft} path="${path}.thickness_mm" label="Thickness of layer ${name}" unit="mm"
        .edit=${layerEdits.thickness(this.index)}></number-field></span>
      <span role="cell"><number-field data-field inline .draft=${draft} path="${path}.growthShare" label="Growth share of layer ${name}" unit="" step="0.1" empty="by thickness"></number-field></span>
      <span role="cell">${formatEntry(Number(this.thickness_mm.toFixed(1)))} mm</span>
      <span role="cell">${layerAgent(draft, this.index)}</span>
      <span role="cell"><button class="plain" type="button" aria-label="Remove layer ${name}" ?disabled=${layers.length < 2}
        @click=${() => requestEdit(this, layerEdits.remove(this.index))}>remove</button></span>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'layer-row': LayerRow;
  }
}
