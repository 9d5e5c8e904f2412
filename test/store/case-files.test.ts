import { describe, expect, test } from 'vitest';
import { fileNameFor, readHanded } from '../../components/store/case-files.js';
import { sampleDocument } from '../desk/sample/case.js';

const file = (name: string, text: string) => new File([text], name);

describe('files handed in', () => {
  test('a case comes with the tables beside it', async () => {
    const got = await readHanded([
      file('a.case.json', JSON.stringify(sampleDocument)),
      file('control.csv', 'x,y\n'),
    ]);
    expect(got.kind === 'case' && got.sheet.document).toEqual(sampleDocument);
    expect(got.kind === 'case' && Object.keys(got.sheet.files)).toEqual(['control.csv']);
  });

  test('tables alone are tables', async () => {
    expect(await readHanded([file('sizes.CSV', 'a\n')])).toEqual({
      kind: 'tables',
      files: { 'sizes.CSV': 'a\n' },
    });
  });

  test('what is not JSON is refused with line and column', async () => {
    const got = await readHanded([file('a.case.json', '{\n  "format": nonsense\n}')]);
    expect(got.kind === 'faults' && got.faults[0].path).toBe('line 2, column 13');
  });

  test('a file far too long is refused without being read', async () => {
    const huge = {
      name: 'a.case.json',
      size: 1e9,
      text: () => Promise.reject(new Error('must not be read')),
    };
    const got = await readHanded([huge as unknown as File]);
    expect(got.kind === 'faults' && got.faults[0].rule).toContain('million characters');
  });

  test('two cases at once are refused', async () => {
    const got = await readHanded([file('a.json', '{}'), file('b.json', '{}')]);
    expect(got.kind).toBe('faults');
  });
});

describe('the name a case is saved under', () => {
  test.each([
    ['Aortography, abdomen', 'aortography-abdomen.case.json'],
    ['  Röntgen / ../x ', 'rontgen-x.case.json'],
    ['', 'untitled.case.json'],
    ['***', 'untitled.case.json'],
  ])('"%s" gives %s', (title, name) => {
    expect(fileNameFor(title)).toBe(name);
  });
});
