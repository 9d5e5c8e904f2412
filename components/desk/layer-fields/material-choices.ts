import { materialNames } from '../../../materials/index.js';
import type { Draft } from '../../store/draft.js';
import type { Choice } from '../fields/choice-field.js';

/** Every material a case can name: its own first, then those that come with the materials. */
export const materialChoices = (draft: Draft): Choice[] =>
  [...draft.case.materials.map(({ name }) => name), ...materialNames].map((name) => ({
    value: name,
    words: name,
  }));
