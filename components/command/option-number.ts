import { refuse } from './refusal.js';

/** What a number on the command line must be. */
export interface NumberRule {
  readonly min: number;
  readonly max: number;
  readonly remedy: string;
  readonly unit?: string;
}

/** A parser for commander that refuses anything but a number within bounds. */
export const optionNumber =
  (option: string, { min, max, remedy, unit }: NumberRule) =>
  (text: string): number => {
    const value = numberIn(text);
    if (value === null || value < min || value > max) {
      refuse(
        option,
        JSON.stringify(text),
        `must be a number, ${min} to ${max}${unit ? ` ${unit}` : ''}`,
        remedy,
      );
    }
    return value;
  };

/** The same for an option that may hold several numbers. */
export const optionNumbers =
  (option: string, rule: NumberRule) =>
  (text: string, before: readonly number[] | undefined): readonly number[] => [
    ...(before ?? []),
    ...text
      .split(/[,;\s]+/)
      .filter(Boolean)
      .map(optionNumber(option, rule)),
  ];

/** Plain decimal or exponent notation; `null` for anything else, hexadecimal and blanks included. */
export const numberIn = (text: string): number | null =>
  /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(text.trim()) ? Number(text) : null;
