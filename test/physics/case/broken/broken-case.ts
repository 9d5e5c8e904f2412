import { readFileSync } from 'node:fs';

/** A sound case, the one of the worked example, to break in one place at a time. */
export const soundText = readFileSync(new URL('../aortography.case.json', import.meta.url), 'utf8');

// biome-ignore lint/suspicious/noExplicitAny: fixtures break the types on purpose
export type Loose = any;
export const soundCase = (): Loose => JSON.parse(soundText);

/** A case file with one thing wrong, and where and how the first fault must name it. */
export interface BrokenCase {
  readonly name: string;
  /** The text of the broken file. */
  readonly text: string;
  readonly path: string;
  /** The rule, or the part of it that does not depend on models. */
  readonly rule: string;
}

export const changed = (
  name: string,
  change: (c: Loose) => void,
  path: string,
  rule: string,
): BrokenCase => {
  const c = soundCase();
  change(c);
  return { name, text: JSON.stringify(c), path, rule };
};

export const written = (name: string, text: string, path: string, rule: string): BrokenCase => ({
  name,
  text,
  path,
  rule,
});

/** The sound file with one piece of its text replaced: for what JSON.stringify cannot write. */
export const rewritten = (
  name: string,
  [from, to]: readonly [string, string],
  path: string,
  rule: string,
): BrokenCase => {
  if (!soundText.includes(from)) throw new Error(`${name}: the sound case holds no ${from}`);
  return written(name, soundText.replace(from, to), path, rule);
};
