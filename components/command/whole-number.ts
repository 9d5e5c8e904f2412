import { type NumberRule, optionNumber } from './option-number.js';
import { refuse } from './refusal.js';

/** A parser for commander that refuses anything but a whole number within bounds; 1e6 is one. */
export const wholeNumber =
  (option: string, rule: NumberRule) =>
  (text: string): number => {
    const value = optionNumber(option, rule)(text);
    return Number.isInteger(value)
      ? value
      : refuse(option, JSON.stringify(text), 'must be a whole number', rule.remedy);
  };
