import { expect } from 'chai';
import '../../components/desk/page/desk-page.js';
import { createCaseStore } from '../../components/store/case-store.js';
import type { Json } from '../../components/store/path.js';
import { addTechnique } from '../../components/store/technique-changes.js';
import { cautions } from '../../physics/cautions.js';
import { sampleDocument } from './sample/case.js';
import { sampleModel } from './sample/model.js';
import { sampleScan } from './sample/scan.js';
import { axeFaults, clear, deep, editsOf, modelWith, press, settled, stand } from './stand.js';

const markup = '<img src=x onerror="globalThis.hit = true">';
const page = async (properties = {}) => {
  const element = await stand('desk-page', { model: sampleModel, scan: sampleScan, ...properties });
  await settled(element);
  return element;
};
/** All text on a page, through shadow roots. */
const wordsOf = (root: ParentNode): string =>
  [...root.querySelectorAll('*')]
    .map(
      (element) =>
        `${[...element.childNodes]
          .filter((node) => node.nodeType === Node.TEXT_NODE)
          .map((node) => node.textContent)
          .join(' ')} ${element.shadowRoot ? wordsOf(element.shadowRoot) : ''}`,
    )
    .join(' ');
const everyElement = (root: ParentNode): Element[] =>
  [...root.querySelectorAll('*')].flatMap((element) => [
    element,
    ...(element.shadowRoot ? everyElement(element.shadowRoot) : []),
  ]);

describe('the desk', () => {
  afterEach(() => {
    document.documentElement.removeAttribute('data-paper');
    clear();
  });

  for (const paper of ['light', 'dark']) {
    it(`has no accessibility fault on ${paper} paper`, async () => {
      document.documentElement.dataset.paper = paper;
      expect(await axeFaults(await page())).to.deep.equal([]);
    });
  }

  it('has none while faults stand and a file was refused', async () => {
    const fault = {
      path: 'line 1, column 1',
      value: 'x',
      rule: 'must be a value',
      remedy: 'enter one',
    };
    const model = modelWith(
      ['techniques[1].potential_kV', 7000],
      ['patient.layers[0].thickness_mm', 'thick'],
    );
    const element = await page({
      model,
      refused: { heading: 'a.json was not opened', faults: [fault] },
    });
    expect(await axeFaults(element)).to.deep.equal([]);
    expect(wordsOf(element)).to.contain('2 faults stand').and.to.contain('a.json was not opened');
  });

  it('stands with nothing computed yet', async () => {
    const element = await page({
      model: { ...sampleModel, weighing: null, along: [] },
      scan: null,
    });
    expect(await axeFaults(element)).to.deep.equal([]);
    expect(wordsOf(element)).not.to.match(/NaN|undefined|\[object/);
  });

  it('never interprets markup in names', async () => {
    const model = modelWith(
      ['title', markup],
      ['question', markup],
      ['room.name', markup],
      ['techniques[0].name', markup],
      ['techniques[1].name', `${markup}2`],
      ['patient.sizes[0].name', markup],
    );
    const element = await page({ model });
    expect(everyElement(element).filter(({ localName }) => localName === 'img')).to.deep.equal([]);
    expect((globalThis as Record<string, unknown>).hit).to.equal(undefined);
  });

  it('stands with three techniques', async () => {
    const store = createCaseStore(
      { document: sampleDocument as unknown as Json, files: {}, fileName: null },
      () => 0,
    );
    store.change(addTechnique(1));
    const three = await page({ model: { ...sampleModel, draft: store.state().draft } });
    expect(await axeFaults(three)).to.deep.equal([]);
  });

  it('stands with one technique alone', async () => {
    const alone = { ...sampleDocument, techniques: [sampleDocument.techniques[0]] };
    const store = createCaseStore(
      { document: alone as unknown as Json, files: {}, fileName: null },
      () => 0,
    );
    const one = await page({ model: { ...sampleModel, draft: store.state().draft, right: null } });
    expect(await axeFaults(one)).to.deep.equal([]);
    expect(wordsOf(one)).to.contain('nothing to weigh');
  });

  it('explains a number where it stands and returns to it on Escape', async () => {
    const element = await page();
    const figure = deep(element, 'beam-path', '.row[data-station="incident"] figure-value');
    const button = deep<HTMLButtonElement>(figure, 'button');
    button.click();
    const card = deep(element, 'explain-card');
    await settled(card);
    expect(card.matches(':popover-open')).to.equal(true);
    expect(card.shadowRoot?.textContent).to.contain('without backscatter');
    expect(await axeFaults(card)).to.deep.equal([]);
    card.hidePopover();
    await settled(card);
    expect(card.matches(':popover-open')).to.equal(false);
  });

  it('moves a layer with Alt and an arrow', async () => {
    const element = await page();
    const edits = editsOf(element);
    const label = deep(element, 'beam-path', 'layer-label');
    press(deep(label, 'number-field', 'input'), 'ArrowDown', { altKey: true });
    expect(edits).to.have.length(1);
    const [edit] = edits;
    const changed =
      'change' in edit ? (edit.change(sampleModel.draft.document) as typeof sampleDocument) : null;
    expect(changed?.patient.layers.map(({ name }) => name)).to.deep.equal([
      'abdomen',
      'front',
      'spine',
    ]);
  });
});

describe('the desk, looked at', () => {
  let desk: Awaited<ReturnType<typeof page>>;
  before(async () => {
    desk = await page();
  });
  after(clear);

  it('shows no NaN, undefined or object where a word or number belongs', async () => {
    expect(wordsOf(desk)).not.to.match(/NaN|undefined|\[object/);
  });

  it('always shows every caution', async () => {
    const words = wordsOf(desk).replace(/\s+/g, ' ');
    expect(cautions.length).to.be.greaterThan(2);
    for (const caution of cautions) expect(words).to.contain(caution);
  });

  it('sets the rows of both sides at the same heights, none over another', async () => {
    const root = deep(desk, 'beam-path').shadowRoot as ShadowRoot;
    for (const side of ['.left', '.right']) {
      const boxes = [...root.querySelectorAll(`.side${side} .row.placed`)].map((row) =>
        row.getBoundingClientRect(),
      );
      expect(boxes.length).to.be.greaterThan(8);
      boxes.slice(1).forEach((box, i) => {
        expect(box.top).to.be.at.least(boxes[i].bottom - 1);
      });
    }
    const tops = (side: string) =>
      [...root.querySelectorAll<HTMLElement>(`.side${side} .row.placed`)].map(
        (row) => row.offsetTop,
      );
    expect(tops('.left')).to.deep.equal(tops('.right'));
  });
});

describe('a patient that has no place in the room', () => {
  afterEach(clear);

  it('is said to have none, and the layers stay editable', async () => {
    const model = modelWith(['patient.sizes', [{ name: 'vast', thickness_mm: 1400, weight: 1 }]]);
    const element = await page({
      model: { ...model, sizeName: 'vast', weighing: null, along: [] },
    });
    expect(await axeFaults(element)).to.deep.equal([]);
    expect(wordsOf(element)).to.contain('has no place in this room at size');
    expect(deep(element, 'beam-path').shadowRoot?.querySelectorAll('layer-label')).to.have.length(
      3,
    );
  });
});
