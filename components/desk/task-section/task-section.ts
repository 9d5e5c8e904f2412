import { html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { materialNames } from '../../../materials/index.js';
import { formatNumber } from '../../charts/format.js';
import type { Json } from '../../store/path.js';
import { requestEdit } from '../fields/case-edit.js';
import { choiceSpec, type FieldSpec, fieldOf, numberSpec } from '../fields/field-specs.js';
import { type DeskModel, placed } from '../model/desk-model.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { agentChoices, amountUnits, detailShapes } from '../task-fields/detail-choices.js';

const detail = 'task.detail';

/**
 * The task: the detail that must be seen, the agent in it, and what it is judged by.
 *
 * Properties: `model`. Events: `case-edit`. Keyboard: that of its fields. Parts: none.
 */
@customElement('task-section')
export class TaskSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;

  static override styles = sectionSheet;

  private detailSpecs(): FieldSpec[] {
    const { patient, task } = this.model.draft.case;
    const { shape } = task.detail;
    const layers = patient.layers.map(({ name }) => name);
    const isVessel = shape === 'vessel';
    return [
      choiceSpec(`${detail}.shape`, 'Shape', detailShapes),
      choiceSpec(`${detail}.inLayer`, 'In layer', layers),
      numberSpec(
        `${detail}.depthInLayer_mm`,
        'Depth of its centre in the layer',
        'mm',
        5,
        'middle',
      ),
      numberSpec(
        `${detail}.size_mm`,
        isVessel
          ? 'Diameter'
          : shape === 'coat'
            ? 'Thickness per wall'
            : 'Thickness along the beam',
        'mm',
      ),
      numberSpec(`${detail}.length_mm`, isVessel ? 'Length seen' : 'Length', 'mm'),
      ...(isVessel ? [] : [numberSpec(`${detail}.width_mm`, 'Width', 'mm', 1, 'as length')]),
      ...(shape === 'coat'
        ? [choiceSpec(`${detail}.walls`, 'Walls coated', ['1', '2'], true)]
        : []),
      ...(shape === 'insert'
        ? [choiceSpec(`${detail}.material`, 'Material of the insert', materialNames)]
        : []),
      choiceSpec(`${detail}.reference`, 'Seen against', ['layer', ...materialNames]),
      ...(isVessel
        ? [numberSpec(`${detail}.fillingFraction`, 'Filled share of the lumen', '', 0.05)]
        : []),
    ];
  }

  private agent() {
    const { draft } = this.model;
    const { agent } = draft.case.task.detail;
    const set = (value: Json) => (event: Event) =>
      requestEdit(event.target as HTMLElement, { path: `${detail}.agent`, value });
    if (!agent) {
      const iodine = { name: 'iodine', amount: { value: 100, unit: 'mg element/mL' } };
      return html`<div><h3>Agent</h3><p class="note">None: the detail is made of a material.</p>
        <button class="plain" type="button" @click=${set(iodine)}>put an agent in the detail</button></div>`;
    }
    const found = placed(this.model).detail?.agent;
    return html`<div>
      <h3>Agent, as in the lumen</h3>
      <div class="fields">
        ${fieldOf(draft, choiceSpec(`${detail}.agent.name`, 'Agent', agentChoices))}
        ${fieldOf(draft, numberSpec(`${detail}.agent.amount.value`, 'Amount', agent.amount.unit, 5))}
        ${fieldOf(draft, choiceSpec(`${detail}.agent.amount.unit`, 'Unit of the amount', amountUnits))}
        ${fieldOf(draft, choiceSpec(`${detail}.agent.carrier`, 'Carrier', materialNames))}
      </div>
      ${
        found
          ? html`<p class="note after">${formatNumber(found.elementConcentration_mg_per_mL)} mg ${found.element}/mL, areal density ${formatNumber(found.arealDensity_mg_per_cm2)} mg/cm² along the central path${
              found.isInvestigational
                ? html`. <b>Investigational agent, not in clinical use.</b>`
                : nothing
            }</p>`
          : nothing
      }
      <p class="after"><button class="plain" type="button" @click=${set(null)}>take the agent out</button></p>
    </div>`;
  }

  override render() {
    const { draft } = this.model;
    const judged = [
      numberSpec('task.roseThreshold', 'Rose threshold k', '', 0.5),
      numberSpec('task.backgroundNoise_fraction', 'Background noise', 'of signal', 0.01),
      numberSpec('task.subtractionResidual_fraction', 'of it left by subtraction', '', 0.05),
      numberSpec('task.motion_mm_per_s', 'Motion', 'mm/s'),
    ];
    return html`<section aria-labelledby="name">
      <h2 id="name">Task</h2>
      <div class="groups">
        <div><h3>Detail</h3><div class="fields">${this.detailSpecs().map((spec) => fieldOf(draft, spec))}</div></div>
        ${this.agent()}
        <div><h3>Judged by</h3><div class="fields">${judged.map((spec) => fieldOf(draft, spec))}</div></div>
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'task-section': TaskSection;
  }
}
