import { describe, expect, test } from 'vitest';
import { deskFiles } from '../../../components/desk/page/desk-files.js';
import { createCaseStore } from '../../../components/store/case-store.js';
import type { Json } from '../../../components/store/path.js';
import { sampleDocument } from '../sample/case.js';

const document = sampleDocument as unknown as Json;
const another = { ...sampleDocument, title: 'Another' };
const text = JSON.stringify(another);

const deskWith = (dialogs: Partial<Parameters<typeof deskFiles>[2]> = {}) => {
  const store = createCaseStore({ document, files: {}, fileName: 'a.case.json' }, () => 0);
  const offered: string[] = [];
  const said: string[] = [];
  const files = deskFiles(
    store,
    {
      status: (words) => said.push(words),
      refused: (report) => {
        if (report) said.push(`${report.heading}: ${report.faults[0].value}`);
      },
    },
    {
      chooseFiles: async () => null,
      saveCase: async (_, name) => {
        offered.push(name);
        return name;
      },
      ...dialogs,
    },
  );
  return { store, files, offered, said };
};

describe('files of the desk', () => {
  test('after another case was opened and undone, saving offers the first one’s name', async () => {
    const { store, files, offered } = deskWith();
    await files.handed([new File([text], 'b.case.json')]);
    await files.save();
    store.undo();
    await files.save();
    expect(offered).toEqual(['b.case.json', 'a.case.json']);
  });

  test('a case without a file is offered one by its title, and keeps the name chosen', async () => {
    const { store, files } = deskWith({ saveCase: async () => 'chosen.case.json' });
    files.open({ document: another as unknown as Json, files: {}, fileName: null });
    await files.save();
    expect(store.state().fileName).toBe('chosen.case.json');
  });

  test('leaving a dialog says nothing and changes nothing', async () => {
    const { store, files, said } = deskWith({ saveCase: async () => null });
    await files.save();
    await files.choose();
    expect(said).toEqual([]);
    expect(store.state().revision).toBe(0);
  });

  test('a file that cannot be written is told', async () => {
    const { files, said } = deskWith({
      saveCase: () => Promise.reject(new DOMException('the disk is full', 'QuotaExceededError')),
    });
    await files.save();
    expect(said).toEqual(['a.case.json was not saved: the disk is full']);
  });

  test('a file that cannot be read, or a dialog that cannot open, is told', async () => {
    const gone = {
      name: 'gone.json',
      size: 3,
      text: () => Promise.reject(new DOMException('it was moved', 'NotFoundError')),
    } as unknown as File;
    const { files, said } = deskWith({
      chooseFiles: () => Promise.reject(new DOMException('not allowed here', 'SecurityError')),
    });
    await files.handed([gone]);
    await files.choose();
    expect(said).toEqual([
      'gone.json was not opened: it was moved',
      'The file was not opened: not allowed here',
    ]);
  });
});
