import { expect } from 'chai';
import { autosave } from '../../components/store/autosave.js';

/** Counts connections to the databases of this page while `work` runs. */
async function connections(work: () => Promise<void>): Promise<number> {
  const open = indexedDB.open.bind(indexedDB);
  let count = 0;
  indexedDB.open = (...request) => {
    count += 1;
    return open(...request);
  };
  try {
    await work();
  } finally {
    Reflect.deleteProperty(indexedDB, 'open');
  }
  return count;
}

const sheet = (title: string) => ({ document: { title }, files: {}, fileName: 'a.case.json' });

describe('keeping the case in the browser', () => {
  const name = 'stratabeam test';
  afterEach(() => indexedDB.deleteDatabase(name));

  it('keeps over one connection, and another page recovers the last with its file name', async () => {
    const storage = autosave(name);
    const count = await connections(async () => {
      for (const title of ['one', 'two', 'three']) {
        expect(await storage.keep(sheet(title))).to.equal(true);
      }
    });
    expect(count).to.equal(1);
    expect(await autosave(name).recover()).to.deep.equal(sheet('three'));
  });

  it('finds nothing where nothing was kept', async () => {
    expect(await autosave(name).recover()).to.equal(null);
  });

  it('says when a sheet cannot be kept, and keeps the next one', async () => {
    const storage = autosave(name);
    const uncloneable = { ...sheet('one'), document: (() => 1) as unknown as null };
    expect(await storage.keep(uncloneable)).to.equal(false);
    expect(await storage.keep(sheet('two'))).to.equal(true);
  });
});
