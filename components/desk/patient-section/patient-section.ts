import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { formatEntry, formatPercent } from '../../charts/format.js';
import { addItems } from '../../store/list-changes.js';
import { requestEdit } from '../fields/case-edit.js';
import { fieldOf, numberSpec, textSpec } from '../fields/field-specs.js';
import { removeButton } from '../fields/list-buttons.js';
import { type PairSpec, pairFields } from '../fields/pair-fields.js';
import { layerEdits } from '../layer-fields/layer-edits.js';
import { type DeskModel, placed } from '../model/desk-model.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import './layer-row.js';

/** Width and height of the body: both or neither. */
const sides: PairSpec = {
  path: 'patient.lateral_mm',
  keys: [0, 1],
  labels: ['Width of the body', 'Height of the body'],
  unit: 'mm',
  step: 10,
  empty: 'without end',
};

/**
 * The patient: layers from entrance to exit, its sides, and the size mix.
 *
 * Properties: `model`. Events: `case-edit`.
 * Keyboard: in a layer's row Alt+ArrowUp/Down moves it, Alt+Delete removes it, Alt+Insert adds one.
 * Parts: none.
 */
@customElement('patient-section')
export class PatientSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;

  static override styles = [
    sectionSheet,
    css`
      .rows {
        display: grid;
        grid-template-columns: repeat(8, max-content);
        column-gap: 1.3rem;
        font-size: var(--small);
      }
      .head {
        display: contents;
        color: var(--soft);
      }
      .head > * {
        border-block-end: 1px solid var(--rule);
        padding-block-end: 0.28rem;
      }
      .bar {
        display: inline-block;
        height: 0.55rem;
        background: var(--soft);
        vertical-align: baseline;
      }
    `,
  ];

  private layers() {
    const { draft } = this.model;
    const { layers } = draft.case.patient;
    const { stack } = placed(this.model);
    const total = layers.reduce((sum, layer) => sum + layer.thickness_mm, 0);
    return html`<div class="wide">
      <h3>Layers, entrance to exit</h3>
      <p class="note">${formatEntry(Number(total.toFixed(1)))} mm as drawn${stack ? html`, ${formatEntry(Number(stack.thickness_mm.toFixed(1)))} mm at size ${stack.sizeName}` : nothing}.
        Alt with the up and down arrows moves a layer, Alt+Insert adds one below, Alt+Delete removes it.</p>
      <div class="scroll" tabindex="0" role="region" aria-label="Layers"><div class="rows" role="table" aria-label="Layers">
        <div class="head" role="row">${[
          'order',
          'name',
          'material',
          'thickness',
          'growth share',
          'at this size',
          'agent in it',
          '',
        ].map(
          (heading) => html`<span role=${heading ? 'columnheader' : 'cell'}>${heading}</span>`,
        )}</div>
        ${layers.map(
          (layer, i) =>
            html`<layer-row role="row" .model=${this.model} .index=${i} .thickness_mm=${stack?.layers[i]?.thickness_mm ?? layer.thickness_mm}></layer-row>`,
        )}
      </div></div>
      <p class="after"><button class="plain" type="button" @click=${(event: Event) =>
        requestEdit(
          event.target as HTMLElement,
          layerEdits.add(layers.length - 1),
        )}>add a layer</button></p>
    </div>`;
  }

  private sides() {
    return html`<div>
      <h3>Sides</h3>
      <p class="note">Width and height of the body that transport flies through; the estimate takes the layers without sides.</p>
      <div class="fields">${pairFields(this.model.draft, sides)}</div>
    </div>`;
  }

  private sizes() {
    const { draft } = this.model;
    const { sizes } = draft.case.patient;
    const shown = sizesOf(draft.case.patient);
    const total = shown.reduce((sum, size) => sum + size.weight, 0);
    const fresh = {
      name: `size ${shown.length + 1}`,
      thickness_mm: Math.round((shown.at(-1)?.thickness_mm ?? 200) + 20),
      weight: 1,
    };
    // The first size added stands beside the layers as drawn, which are then a size of their own.
    const added = 'file' in sizes || sizes.length > 0 ? [fresh] : [{ ...shown[0] }, fresh];
    return html`<div class="wide">
      <h3>Size mix</h3>
      ${
        'file' in sizes || sizes.length === 0
          ? html`<p class="note">One size: the layers as drawn.</p>`
          : html`<table>
            <thead><tr><th scope="col">name</th><th scope="col">thickness</th><th scope="col">weight</th><th scope="col">share</th><td></td></tr></thead>
            <tbody>${sizes.map((size, i) => {
              const at = `patient.sizes[${i}]`;
              const share = total > 0 ? size.weight / total : 0;
              return html`<tr>
                <td>${fieldOf(draft, textSpec(`${at}.name`, `Name of size ${i + 1}`), true)}</td>
                <td>${fieldOf(draft, numberSpec(`${at}.thickness_mm`, `Thickness of size ${size.name}`, 'mm', 5), true)}</td>
                <td>${fieldOf(draft, numberSpec(`${at}.weight`, `Weight of size ${size.name}`, ''), true)}</td>
                <td><span class="bar" style="width:${(share * 8).toFixed(2)}rem"></span> ${formatPercent(share)}</td>
                <td>${removeButton(draft, 'patient.sizes', i, `size ${size.name}`)}</td>
              </tr>`;
            })}</tbody></table>`
      }
      <p class="after"><button class="plain" type="button" @click=${(event: Event) =>
        requestEdit(event.target as HTMLElement, {
          change: addItems('patient.sizes', added),
        })}>add a size</button></p>
    </div>`;
  }

  override render() {
    return html`<section aria-labelledby="name">
      <h2 id="name">Patient</h2>
      <div class="groups">${this.layers()} ${this.sides()} ${this.sizes()}</div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'patient-section': PatientSection;
  }
}
