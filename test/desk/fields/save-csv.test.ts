import { describe, expect, test } from 'vitest';
import type { FaultReport } from '../../../components/desk/fields/report-faults.js';
import { saveCsv } from '../../../components/desk/fields/save-csv.js';

const saving = async (save: () => Promise<boolean>): Promise<string[]> => {
  const from = new EventTarget();
  const said: string[] = [];
  from.addEventListener('fault-report', (event) => {
    const { heading, faults } = (event as CustomEvent<FaultReport>).detail;
    said.push(`${heading}: ${faults[0].value}`);
  });
  await saveCsv(from, 'Aortography, abdomen', 'a\n', save);
  return said;
};

describe('a table saved from the desk', () => {
  test('that cannot be written is told at the head of the page', async () => {
    expect(await saving(() => Promise.reject(new Error('the disk is full')))).toEqual([
      'aortography-abdomen.csv was not saved: the disk is full',
    ]);
  });

  test('says nothing when it was written, or when the person left', async () => {
    expect(await saving(async () => true)).toEqual([]);
    expect(await saving(async () => false)).toEqual([]);
  });
});
