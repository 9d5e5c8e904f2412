import { dirname, join } from 'node:path';
import {
  type CaseFiles,
  type Fault,
  type ParsedCase,
  parseCase,
  readCaseText,
  referencedFiles,
} from '../../physics/case/index.js';
import type { Io } from './io.js';
import { Refusal, refuse } from './refusal.js';

/** A case file and the CSV files it names, read and parsed; anything wrong with them is a refusal. */
export const readCase = (io: Io, path: string): ParsedCase => {
  const read = readCaseText(textOf(io, path));
  if ('fault' in read) throw new Refusal([{ ...read.fault, path: `${path}, ${read.fault.path}` }]);
  const parsed = parseCase(read.value, filesBeside(io, path, referencedFiles(read.value)));
  if ('faults' in parsed) throw new Refusal(parsed.faults);
  return parsed;
};

const textOf = (io: Io, path: string): string => {
  try {
    return io.readFile(path);
  } catch {
    return refuse(path, 'not readable', 'must be a case file', 'check the path');
  }
};

// A case may come from someone else: it reaches only files in its own folder.
const filesBeside = (io: Io, casePath: string, names: readonly string[]): CaseFiles => {
  const files: [string, string][] = [];
  const faults: Fault[] = [];
  for (const name of names) {
    if (/[/\\:]|^\.\.?$/.test(name)) {
      faults.push({
        path: 'case',
        value: JSON.stringify(name),
        rule: 'must be the name of a file in the folder of the case',
        remedy: 'put the file beside the case and write its bare name',
      });
      continue;
    }
    try {
      files.push([name, io.readFile(join(dirname(casePath), name))]);
    } catch {
      // Left out: parseCase says which path of the case asks for it.
    }
  }
  if (faults.length > 0) throw new Refusal(faults);
  return Object.fromEntries(files);
};
