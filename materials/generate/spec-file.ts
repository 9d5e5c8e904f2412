import { readFileSync } from 'node:fs';

/** One numbered section of a spec-format data file: its column labels and its rows of numbers. */
export interface SpecSection {
  readonly title: string;
  readonly labels: readonly string[];
  readonly rows: readonly (readonly number[])[];
}

/** Reads a spec-format text file: `#S n title` opens a section, `#L a  b  c` names its columns. */
export function readSpecFile(path: string): SpecSection[] {
  const sections: { title: string; labels: string[]; rows: number[][] }[] = [];
  for (const line of readFileSync(path, 'utf8').split(/\r?\n/)) {
    if (line.startsWith('#S')) {
      sections.push({ title: line.replace(/^#S\s+\d+\s+/, ''), labels: [], rows: [] });
    } else if (line.startsWith('#L')) {
      sections[sections.length - 1].labels = line.slice(2).trim().split(/\s+/);
    } else if (line.trim() !== '' && !line.startsWith('#')) {
      sections[sections.length - 1].rows.push(line.trim().split(/\s+/).map(Number));
    }
  }
  return sections;
}
