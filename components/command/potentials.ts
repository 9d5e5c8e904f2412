import { numberIn } from './option-number.js';
import { refuse } from './refusal.js';

/** More potentials than any generator has steps. */
const most = 1000;

/** Potentials of a sweep: `50:120:5` (the end included where a step meets it), or `60,70,80`. */
export const potentialsIn = (text: string): readonly number[] => {
  const parts = text.split(/[:,]/).map(numberIn);
  const isRange = text.includes(':');
  const bad = (rule: string): never =>
    refuse('--potential', JSON.stringify(text), rule, 'write it as 50:120:5 or 60,70,80');
  if (parts.some((part) => part === null)) return bad('must be numbers in kV');
  const numbers = parts as number[];
  if (!isRange)
    return inRange(
      [...new Set(numbers)].sort((a, b) => a - b),
      bad,
    );
  const [from, to, step = 1] = numbers;
  if (numbers.length < 2 || numbers.length > 3) return bad('must be from:to or from:to:step');
  if (!(step > 0 && to >= from)) return bad('must rise, with a step above 0');
  const count = Math.floor((to - from) / step + 1e-9) + 1;
  if (count > most) return bad(`must be at most ${most} potentials`);
  const potentials = Array.from({ length: count }, (_, i) => Number((from + i * step).toFixed(6)));
  return inRange(potentials, bad);
};

/** The tube model's range. */
const inRange = (potentials: readonly number[], bad: (rule: string) => never): readonly number[] =>
  potentials[0] < 20 || potentials[potentials.length - 1] > 150
    ? bad('must lie between 20 and 150 kV')
    : potentials;
