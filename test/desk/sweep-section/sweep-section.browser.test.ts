import { expect } from 'chai';
import '../../../components/desk/sweep-section/sweep-section.js';
import type { DeskModel } from '../../../components/desk/model/desk-model.js';
import type { SweepSection } from '../../../components/desk/sweep-section/sweep-section.js';
import { valueAtPath } from '../../../components/store/path.js';
import { samePool } from '../sample/pool.js';
import { axeFaults, clear, deep, editsOf, modelWith, press, settled, stand } from '../stand.js';

/** The sample desk with a coarse generator, so that a sweep is a moment. */
const model = (): DeskModel =>
  modelWith(['room.tube.potential_kV', { min: 50, max: 125, step: 15 }]);

const standing = async (properties: Partial<SweepSection> = {}): Promise<SweepSection> =>
  stand('sweep-section', { model: model(), pool: samePool, ...properties });

const until = async (section: SweepSection, phase: string): Promise<void> => {
  for (let turn = 0; turn < 400 && section.sweep?.phase !== phase; turn++) {
    await new Promise((done) => setTimeout(done, 20));
  }
  expect(section.sweep?.phase).to.equal(phase);
  await settled(section);
  await settled(deep(section, 'map-panel'));
};

const done = async (properties: Partial<SweepSection> = {}): Promise<SweepSection> => {
  const section = await standing(properties);
  await until(section, 'done');
  return section;
};

const textOf = (element: Element): string =>
  element.shadowRoot?.textContent?.replace(/\s+/g, ' ') ?? '';

describe('the sweep', () => {
  afterEach(clear);

  it('begins by itself and says what it swept', async () => {
    const section = await done();
    expect(textOf(section)).to.match(/36 settings: 6 potentials, 3 filters, 2 sizes, in [\d.]+ s/);
  });

  it('has no accessibility fault', async () => {
    expect(await axeFaults(await done())).to.deep.equal([]);
  });

  it('names figure of merit, condition and size, for eye and ear', async () => {
    const map = deep(await done(), 'map-panel');
    expect(textOf(map)).to.contain(
      'SdNR² per incident air kerma of every setting, equal SdNR, size median',
    );
    const label = deep(map, 'svg.chart').getAttribute('aria-label');
    for (const words of ['equal SdNR', 'Best allowed', 'Current: 80 kV, no filter', 'Proposed']) {
      expect(label).to.contain(words);
    }
  });

  it('draws a row per filter, the techniques, the best, and what is forbidden with its limit', async () => {
    const section = await done({
      model: modelWith(
        ['room.tube.potential_kV', { min: 50, max: 125, step: 15 }],
        ['room.tube.power_kW', 40],
      ),
    });
    const chart = deep(section, 'map-panel', 'svg.chart');
    for (const words of ['no filter', '0.2 Cu', '0.9 Cu', 'Current 80 kV', 'best ']) {
      expect(chart.textContent).to.contain(words);
    }
    expect(chart.querySelectorAll('.forbidden').length).to.be.greaterThan(0);
    expect(chart.textContent).to.contain('beyond tube power');
  });

  it('reads settings with the arrow keys and adopts the one read with Enter', async () => {
    const section = await done();
    const edits = editsOf(section);
    const map = deep(section, 'map-panel');
    const box = deep(map, '.map-box');
    press(box, 'Home');
    press(box, 'Home');
    await settled(map);
    expect(deep(map, '#reading').textContent).to.match(/50 kV.*SdNR².*of the best/);
    press(box, 'Enter');
    await settled(section);
    await settled(map);
    expect(edits).to.have.length(1);
    const [edit] = edits;
    if (!('change' in edit)) throw new Error('not a change of the document');
    const next = edit.change(section.model.draft.document);
    expect(valueAtPath(next, 'techniques[1].potential_kV')).to.equal(50);
    expect(valueAtPath(next, 'techniques[1].control')).to.deep.equal(
      valueAtPath(section.model.draft.document, 'techniques[1].control'),
    );
    expect(deep(map, '#reading').textContent).to.contain('adopted as Proposed; Undo takes it back');
  });

  it('adopts a click, with the detector air kerma where that is asked', async () => {
    const section = await done();
    const edits = editsOf(section);
    deep<HTMLInputElement>(section, '.also input').click();
    await settled(section);
    const box = deep(section, 'map-panel', '.map-box');
    const { left, top, width, height } = deep(
      section,
      'map-panel',
      'svg.chart',
    ).getBoundingClientRect();
    const at = { clientX: left + width * 0.6, clientY: top + height * 0.4, bubbles: true };
    box.dispatchEvent(new MouseEvent('click', at));
    const [edit] = edits;
    if (!edit || !('change' in edit)) throw new Error('nothing was adopted');
    const next = edit.change(section.model.draft.document);
    const control = valueAtPath(next, 'techniques[1].control');
    expect(Object.keys(control as object)).to.deep.equal(['detectorAirKerma_uGy']);
  });

  it('lists the frontier, and adopts from it', async () => {
    const section = await done();
    const edits = editsOf(section);
    const panel = deep(section, 'frontier-panel');
    expect(textOf(panel)).to.match(/\d+ settings that no other beats/);
    expect(deep(panel, 'svg.chart').getAttribute('aria-label')).to.contain('allowed settings');
    deep<HTMLButtonElement>(panel, '.members button').click();
    expect(edits).to.have.length(1);
  });

  it('has the map as a table', async () => {
    const map = deep(await done(), 'map-panel');
    deep(map, 'summary').click();
    await new Promise((opened) => setTimeout(opened, 50));
    await settled(map);
    expect(map.shadowRoot?.querySelectorAll('details tbody tr')).to.have.length(6);
  });

  it('sweeps again when the condition changes, not when Proposed does', async () => {
    const section = await done();
    const first = section.sweep?.basis;
    section.model = modelWith(
      ['room.tube.potential_kV', { min: 50, max: 125, step: 15 }],
      ['techniques[1].potential_kV', 65],
    );
    await settled(section);
    await new Promise((finished) => setTimeout(finished, 500));
    expect(section.sweep?.basis).to.equal(first);
    const select = deep<HTMLSelectElement>(section, '.setting select');
    select.value = 'tubeLoad';
    select.dispatchEvent(new Event('change'));
    await settled(section);
    expect(textOf(section)).to.contain('stale');
    await new Promise((finished) => setTimeout(finished, 450));
    await until(section, 'done');
    expect(section.sweep?.request.holdConstant).to.equal('tubeLoad');
  });

  it('cancelled, says that it is incomplete, and begins again only when asked', async () => {
    const section = await standing();
    while (section.sweep?.phase !== 'running') await new Promise((turn) => setTimeout(turn));
    await section.updateComplete;
    deep<HTMLButtonElement>(section, '.setting button').click();
    await until(section, 'cancelled');
    expect(textOf(section)).to.match(/cancelled after \d+ of 36 settings: incomplete/);
    await new Promise((finished) => setTimeout(finished, 600));
    expect(section.sweep?.phase).to.equal('cancelled');
    deep<HTMLButtonElement>(section, '.setting button').click();
    await until(section, 'done');
  });

  it('computes nothing without workers, and says nothing wrong', async () => {
    const section = await standing({ pool: null });
    expect(section.sweep).to.equal(null);
    expect(deep<HTMLButtonElement>(section, '.setting button').disabled).to.equal(true);
  });
});
