import { html, nothing, type TemplateResult } from 'lit';
import type { Draft } from '../../store/draft.js';
import type { Json } from '../../store/path.js';
import { choiceSpec, fieldOf, numberSpec } from '../fields/field-specs.js';
import { agentChoices, amountUnits } from '../task-fields/detail-choices.js';

const none = { value: 'none', words: 'none' };

/** The agent a layer is filled with, if any: a column of barium, a bladder. */
export function layerAgent(draft: Draft, index: number): TemplateResult {
  const { name, agent } = draft.case.patient.layers[index];
  const path = `patient.layers[${index}].agent`;
  const chosen = (choice: string): Json =>
    choice === 'none'
      ? null
      : {
          name: choice,
          amount: agent ? { ...agent.amount } : { value: 100, unit: 'mg element/mL' },
        };
  return html`<choice-field inline .draft=${draft} path=${path} label="Agent in layer ${name}" .value=${agent?.name ?? 'none'}
      .choices=${[none, ...agentChoices]} .toJson=${chosen}></choice-field>${
        agent
          ? html` ${fieldOf(draft, numberSpec(`${path}.amount.value`, `Amount of agent in layer ${name}`, '', 5), true)}
              ${fieldOf(draft, choiceSpec(`${path}.amount.unit`, `Unit of the amount in layer ${name}`, amountUnits), true)}`
          : nothing
      }`;
}
