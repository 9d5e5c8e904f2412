import { html, type TemplateResult } from 'lit';
import type { Fault } from '../../../physics/case/index.js';
import type { BadRow } from '../../../physics/csv/index.js';

/** Rows of a table that could not be read, for the list at the head of the page. */
export const rowFaults = (fileName: string, badRows: readonly BadRow[]): Fault[] =>
  badRows.map(({ line, reason }) => ({
    path: `${fileName}, line ${line}`,
    value: 'not read',
    rule: reason,
    remedy: 'correct the line and read the file again',
  }));

/** Headings without a unit, whose figures were taken in the unit named here. */
export const unitFaults = (fileName: string, columns: readonly string[]): Fault[] =>
  columns.map((column) => ({
    path: fileName,
    value: column,
    rule: 'must name its unit in the heading; it was taken as written here',
    remedy: `write the heading as ${column}`,
  }));

/** A way to hand in a CSV file; `columns` says what its headings may be. */
export const fileButton = (
  words: string,
  columns: string,
  read: (file: File, from: HTMLElement) => Promise<void>,
): TemplateResult =>
  html`<label class="file"><span>${words}</span>
    <input type="file" accept=".csv,text/csv" title=${columns} @change=${async (event: Event) => {
      const input = event.target as HTMLInputElement;
      const file = input.files?.[0];
      if (!file) return;
      await read(file, input);
      input.value = '';
    }} /></label>`;
