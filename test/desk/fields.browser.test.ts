import { expect } from 'chai';
import '../../components/desk/fields/choice-field.js';
import '../../components/desk/fields/number-field.js';
import '../../components/desk/fields/text-field.js';
import { readNumber } from '../../components/desk/fields/read-number.js';
import {
  axeFaults,
  clear,
  deep,
  editsOf,
  modelWith,
  press,
  settled,
  stand,
  type,
} from './stand.js';

const markup = '<img src=x onerror="globalThis.hit = true"><b>bold</b>';

describe('a number field', () => {
  afterEach(clear);
  const potential = (model = modelWith()) =>
    stand('number-field', {
      draft: model.draft,
      path: 'techniques[1].potential_kV',
      label: 'Potential',
      unit: 'kV',
    });
  const inputOf = (field: Element) => deep<HTMLInputElement>(field, 'input');

  it('has no accessibility fault, with and without a standing fault', async () => {
    expect(await axeFaults(await potential())).to.deep.equal([]);
    clear();
    expect(
      await axeFaults(await potential(modelWith(['techniques[1].potential_kV', 7000]))),
    ).to.deep.equal([]);
  });

  it('asks for the number typed, on leaving', async () => {
    const field = await potential();
    const edits = editsOf(field);
    type(inputOf(field), '72,5');
    expect(edits).to.deep.equal([{ path: 'techniques[1].potential_kV', value: 72.5 }]);
  });

  it('steps with the arrow keys, tenfold with Shift', async () => {
    const field = await potential();
    const edits = editsOf(field);
    press(inputOf(field), 'ArrowUp');
    press(inputOf(field), 'ArrowDown', { shiftKey: true });
    expect(edits.map((edit) => 'value' in edit && edit.value)).to.deep.equal([71, 61]);
  });

  it('gives back what stood there on Escape', async () => {
    const field = await potential();
    const edits = editsOf(field);
    const input = inputOf(field);
    input.value = '99';
    press(input, 'Escape');
    expect(input.value).to.equal('70');
    expect(edits).to.deep.equal([]);
  });

  it('hands on what is not a number, so that nothing is lost', async () => {
    const field = await potential();
    const edits = editsOf(field);
    type(inputOf(field), 'about 70');
    expect(edits).to.deep.equal([{ path: 'techniques[1].potential_kV', value: 'about 70' }]);
  });

  it('shows a fault beneath the faulty value, tied to the input', async () => {
    const field = await potential(modelWith(['techniques[1].potential_kV', 7000]));
    expect(inputOf(field).value).to.equal('7000');
    expect(inputOf(field).getAttribute('aria-invalid')).to.equal('true');
    expect(deep(field, '#fault').textContent).to.contain('150');
  });

  it('sets assumed values in italics and says so', async () => {
    const field = await stand('number-field', {
      draft: modelWith().draft,
      path: 'room.tube.anodeAngle_deg',
      label: 'Anode angle',
      unit: '°',
    });
    expect(inputOf(field).value).to.equal('12');
    expect(getComputedStyle(inputOf(field)).fontStyle).to.equal('italic');
    expect(deep(field, 'label').title).to.contain('assumed');
  });

  it('may be emptied where emptiness has a meaning, and writes null', async () => {
    const field = await stand('number-field', {
      draft: modelWith().draft,
      path: 'task.detail.depthInLayer_mm',
      label: 'Depth',
      unit: 'mm',
      empty: 'middle',
    });
    const edits = editsOf(field);
    type(inputOf(field), '');
    expect(edits).to.deep.equal([{ path: 'task.detail.depthInLayer_mm', value: null }]);
  });
});

describe('a typed figure', () => {
  for (const [text, unit, value] of [
    ['20', 'mm', 20],
    ['2 cm', 'mm', 20],
    ['0,2 m', 'cm', 20],
    ['50 nGy', 'µGy', 0.05],
    ['70 kVp', 'kV', 70],
    ['−3', 'mm', -3],
    ['1.5e2', 'mA', 150],
    ['20 kg', 'mm', null],
    ['2 s', 'mm', null],
    ['', 'mm', null],
    ['12,345.6', 'mm', null],
  ] as const) {
    it(`"${text}" where ${unit} is asked is ${value ?? 'refused'}`, () => {
      expect(readNumber(text, unit)).to.equal(value);
    });
  }
});

describe('a choice field', () => {
  afterEach(clear);

  it('has no accessibility fault and asks for what was chosen', async () => {
    const field = await stand('choice-field', {
      draft: modelWith().draft,
      path: 'techniques[1].filter',
      label: 'Filter',
      choices: ['none', '0.2 Cu'].map((name) => ({ value: name, words: name })),
    });
    expect(await axeFaults(field)).to.deep.equal([]);
    const edits = editsOf(field);
    const select = deep<HTMLSelectElement>(field, 'select');
    select.value = 'none';
    select.dispatchEvent(new Event('change'));
    expect(edits).to.deep.equal([{ path: 'techniques[1].filter', value: 'none' }]);
  });

  it('also lists a value that is not among the choices, as plain text', async () => {
    const field = await stand('choice-field', {
      draft: modelWith(['techniques[1].filter', markup]).draft,
      path: 'techniques[1].filter',
      label: 'Filter',
      choices: [],
    });
    expect(deep<HTMLSelectElement>(field, 'select').value).to.equal(markup);
    expect(field.shadowRoot?.querySelector('img')).to.equal(null);
  });
});

describe('a text field', () => {
  afterEach(clear);

  it('shows markup as text and never interprets it', async () => {
    const field = await stand('text-field', {
      draft: modelWith(['title', markup]).draft,
      path: 'title',
      label: 'Title',
    });
    await settled(field);
    expect(deep<HTMLInputElement>(field, 'input').value).to.equal(markup);
    expect(field.shadowRoot?.querySelector('img, b')).to.equal(null);
    expect((globalThis as Record<string, unknown>).hit).to.equal(undefined);
  });

  it('asks for the new text on Enter', async () => {
    const field = await stand('text-field', {
      draft: modelWith().draft,
      path: 'title',
      label: 'Title',
    });
    const edits = editsOf(field);
    const input = deep<HTMLInputElement>(field, 'input');
    input.value = 'Another';
    press(input, 'Enter');
    expect(edits).to.deep.equal([{ path: 'title', value: 'Another' }]);
  });
});
