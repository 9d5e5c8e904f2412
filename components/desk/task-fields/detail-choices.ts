import { agentNames } from '../../../materials/index.js';
import type { Choice } from '../fields/choice-field.js';

const same = (names: readonly string[]): Choice[] =>
  names.map((name) => ({ value: name, words: name }));

/** Shapes a detail can have, units an amount of agent can be given in, and the agents. */
export const detailShapes = same(['vessel', 'slab', 'coat', 'defect', 'insert']);
export const amountUnits = same(['mg element/mL', 'mg compound/mL', 'mmol/mL', '% w/v']);
export const agentChoices = same(agentNames);
