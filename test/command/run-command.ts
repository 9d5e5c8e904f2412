import { readFileSync } from 'node:fs';
import { run } from '../../components/command/run.js';

export interface Outcome {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

/** Runs a command line in this process; `files` stand in for the disk where they are given. */
export const runCommand = async (
  words: readonly string[],
  files: Readonly<Record<string, string>> = {},
): Promise<Outcome> => {
  let out = '';
  let err = '';
  const code = await run(words, {
    out: (text) => {
      out += text;
    },
    err: (text) => {
      err += text;
    },
    readFile: (path) => files[path] ?? readFileSync(path, 'utf8'),
  });
  return { code, out, err };
};

/** The same for an answer in JSON. */
export const jsonOf = async (words: readonly string[]): Promise<Record<string, never>> =>
  JSON.parse((await runCommand([...words, '--json'])).out);
