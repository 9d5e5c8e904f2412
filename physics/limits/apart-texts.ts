import { numberText } from '../number-text.js';

/** A value and its bound for one sentence, with as many digits as it takes to tell them apart. */
export const apartTexts = (
  value: number,
  bound: number,
  least = 3,
): [value: string, bound: string] => {
  for (let digits = least; digits < 9; digits++) {
    const texts: [string, string] = [numberText(value, digits), numberText(bound, digits)];
    if (texts[0] !== texts[1]) return texts;
  }
  return [String(value), String(bound)];
};
