import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { DeskModel } from '../model/desk-model.js';
import { agentChoices, amountUnits, detailShapes } from '../task-fields/detail-choices.js';
import '../fields/choice-field.js';
import '../fields/number-field.js';

/**
 * The detail named where it lies: shape and size, and the agent and amount in it.
 *
 * Properties: `model`. Events: `case-edit`. Keyboard: that of its fields. Parts: none.
 */
@customElement('detail-label')
export class DetailLabel extends LitElement {
  @property({ attribute: false }) model!: DeskModel;

  static override styles = css`
    :host {
      padding: 0.05rem 0.3rem 0.1rem;
      background: color-mix(in srgb, var(--paper) 84%, transparent);
      line-height: 1.55;
    }
    div {
      display: flex;
      align-items: baseline;
      gap: 0.3em;
    }
  `;

  override render() {
    const { draft } = this.model;
    const { detail } = draft.case.task;
    const path = 'task.detail';
    return html`<div>
        <number-field inline .draft=${draft} path="${path}.size_mm" label="Size of the detail" unit="mm"></number-field>
        <choice-field inline .draft=${draft} path="${path}.shape" label="Shape of the detail" .choices=${detailShapes}></choice-field>
      </div>
      ${
        detail.agent
          ? html`<div>
            <number-field inline .draft=${draft} path="${path}.agent.amount.value" label="Amount of agent" unit=${detail.agent.amount.unit} .unitShown=${''} step="5"></number-field>
            <choice-field inline .draft=${draft} path="${path}.agent.amount.unit" label="Unit of the amount" .choices=${amountUnits}></choice-field>
          </div>
          <div><choice-field inline .draft=${draft} path="${path}.agent.name" label="Agent" .choices=${agentChoices}></choice-field></div>`
          : nothing
      }`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'detail-label': DetailLabel;
  }
}
