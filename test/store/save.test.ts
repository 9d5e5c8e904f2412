import { describe, expect, test } from 'vitest';
import { saveCase } from '../../components/store/case-files.js';
import { saveTable } from '../../components/store/save-table.js';

const left = () => Promise.reject(new DOMException('the person left', 'AbortError'));
const broken = () => Promise.reject(new DOMException('the disk is full', 'QuotaExceededError'));
const under = (name: string) => () => Promise.resolve({ name } as FileSystemFileHandle);
const downloaded = () => Promise.resolve(null);

describe('saving', () => {
  test('a case tells the name it was saved under, also where the browser tells none', async () => {
    expect(await saveCase({}, 'a.case.json', under('b.case.json'))).toBe('b.case.json');
    expect(await saveCase({}, 'a.case.json', downloaded)).toBe('a.case.json');
  });

  test('leaving the dialog is no failure', async () => {
    expect(await saveCase({}, 'a.case.json', left)).toBe(null);
    expect(await saveTable('a\n', 'a.csv', left)).toBe(false);
  });

  test('any other failure is not taken for a change of mind', async () => {
    await expect(saveCase({}, 'a.case.json', broken)).rejects.toThrow('disk is full');
    await expect(saveTable('a\n', 'a.csv', broken)).rejects.toThrow('disk is full');
  });
});
