import { expect } from 'chai';
import '../../components/desk/patient-section/patient-section.js';
import '../../components/desk/room-section/room-section.js';
import type { DeskModel } from '../../components/desk/model/desk-model.js';
import { createCaseStore } from '../../components/store/case-store.js';
import { type Json, valueAtPath } from '../../components/store/path.js';
import { sampleDocument } from './sample/case.js';
import { sampleModel } from './sample/model.js';
import { axeFaults, clear, deep, press, settled, stand, type } from './stand.js';

/** A section over a store of its own: what is typed comes back to its fields. */
async function section(tag: 'room-section' | 'patient-section') {
  const store = createCaseStore(
    { document: sampleDocument as unknown as Json, files: {}, fileName: null },
    () => 0,
  );
  const model = (): DeskModel => ({ ...sampleModel, draft: store.state().draft });
  const element = await stand(tag, { model: model() });
  store.subscribe(() => {
    element.model = model();
  });
  element.addEventListener('case-edit', ({ detail }) => {
    if ('path' in detail) store.setAt(detail.path, detail.value);
    else store.change(detail.change, detail.joins);
  });
  const field = (path: string) => deep(element, `number-field[path="${path}"]`);
  const enter = async (path: string, text: string) => {
    const input = deep<HTMLInputElement>(field(path), 'input');
    type(input, text);
    await settled(element);
    await settled(field(path));
  };
  const at = (path: string) => valueAtPath(store.state().draft.document, path);
  const click = async (name: string) => {
    const buttons = [...(element.shadowRoot?.querySelectorAll('button') ?? [])];
    const label = (button: Element) => button.getAttribute('aria-label') ?? button.textContent;
    buttons.find((button) => label(button)?.trim() === name)?.click();
    await settled(element);
  };
  return { element, field, enter, at, click };
}
const faultOf = (field: Element) => field.shadowRoot?.querySelector('.fault')?.textContent ?? '';

describe('what the room may be told beyond its plate', () => {
  afterEach(clear);
  const primary = 'room.grid.measured.primaryTransmission';
  const scatter = 'room.grid.measured.scatterTransmission';

  it('takes the transmissions of the grid both or not at all, the fault at the one missing', async () => {
    const { element, field, enter, at } = await section('room-section');
    await enter(primary, '0.71');
    expect(faultOf(field(scatter))).not.to.equal('');
    expect(await axeFaults(element)).to.deep.equal([]);
    await enter(scatter, '0.12');
    expect(faultOf(field(scatter))).to.equal('');
    expect(at('room.grid.measured')).to.deep.equal({
      primaryTransmission: 0.71,
      scatterTransmission: 0.12,
    });
    await enter(primary, '');
    await enter(scatter, '');
    expect(at('room.grid.measured')).to.equal(null);
  });

  it('takes a transmission above 1 back to its field as a fault', async () => {
    const { field, enter } = await section('room-section');
    await enter(primary, '71');
    expect(faultOf(field(primary))).to.contain('1');
  });

  it('takes slabs for the cover of the grid', async () => {
    const { element, at } = await section('room-section');
    const add = [...(element.shadowRoot?.querySelectorAll('button') ?? [])].filter(
      (button) => button.textContent?.trim() === 'add a slab',
    );
    add.at(-1)?.click();
    await settled(element);
    expect(at('room.grid.cover')).to.deep.equal([{ material: 'aluminium', thickness_mm: 1 }]);
    expect(await axeFaults(element)).to.deep.equal([]);
  });

  it('takes rows of the rating chart, and wants them in ascending time', async () => {
    const { element, field, enter, at, click } = await section('room-section');
    await click('add a row');
    await click('add a row');
    expect(at('room.tube.rating')).to.deep.equal([
      { exposureTime_ms: 200, power_kW: 80 },
      { exposureTime_ms: 400, power_kW: 80 },
    ]);
    await enter('room.tube.rating[1].power_kW', '50');
    await enter('room.tube.rating[1].exposureTime_ms', '100');
    expect(faultOf(field('room.tube.rating[1].exposureTime_ms'))).to.contain('order the rating');
    expect(await axeFaults(element)).to.deep.equal([]);
    await click('Remove rating row 2');
    expect(at('room.tube.rating')).to.have.length(1);
  });
});

describe('the sides of the patient', () => {
  afterEach(clear);

  it('are entered with the keyboard, both or not at all', async () => {
    const { element, field, enter, at } = await section('patient-section');
    await enter('patient.lateral_mm[0]', '40 cm');
    expect(faultOf(field('patient.lateral_mm[1]'))).not.to.equal('');
    await enter('patient.lateral_mm[1]', '220');
    expect(at('patient.lateral_mm')).to.deep.equal([400, 220]);
    press(deep(field('patient.lateral_mm[1]'), 'input'), 'ArrowUp');
    await settled(element);
    expect(at('patient.lateral_mm')).to.deep.equal([400, 230]);
    expect(await axeFaults(element)).to.deep.equal([]);
  });
});
