import { holdConstants, holdConstantWords } from '../../../physics/compare.js';
import { type CostName, costNames, costs } from '../../../physics/sweep/costs.js';
import type { Choice } from '../fields/choice-field.js';

/** What can be held equal, SdNR first: it makes costs comparable by themselves. */
export const holdChoices: readonly Choice[] = [
  'sdnr' as const,
  ...holdConstants.filter((hold) => hold !== 'sdnr'),
].map((hold) => ({ value: hold, words: holdConstantWords[hold] }));

export const costChoices: readonly Choice[] = costNames.map((cost) => ({
  value: cost,
  words: costs[cost].words,
}));

/** For the third cost, which may be left out. */
export const noCost: Choice = { value: '', words: 'no third' };

/** Costs chosen, each once, in order. */
export const chosenCosts = (picked: readonly (CostName | '')[]): CostName[] => [
  ...new Set(picked.filter((cost): cost is CostName => cost !== '')),
];
