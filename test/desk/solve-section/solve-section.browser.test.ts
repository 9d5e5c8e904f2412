import { expect } from 'chai';
import '../../../components/desk/solve-section/solve-section.js';
import type { SolveSection } from '../../../components/desk/solve-section/solve-section.js';
import { type Json, valueAtPath } from '../../../components/store/path.js';
import { samePool } from '../sample/pool.js';
import { axeFaults, clear, deep, editsOf, modelWith, settled, stand, type } from '../stand.js';

const coarse: [string, Json] = ['room.tube.potential_kV', { min: 50, max: 125, step: 15 }];

const standing = (...edits: [string, Json][]): Promise<SolveSection> =>
  stand('solve-section', {
    model: modelWith(coarse, ['techniques[1].potential_kV', 65], ...edits),
    pool: samePool,
  });

const blockOf = (section: SolveSection, heading: string): HTMLElement => {
  const blocks = [...(section.shadowRoot?.querySelectorAll<HTMLElement>('.questions > div') ?? [])];
  const found = blocks.find((block) => block.querySelector('h3')?.textContent === heading);
  if (!found) throw new Error(`no question ${heading}`);
  return found;
};

/** Presses Solve under a heading and waits for what stands below. */
async function solved(section: SolveSection, heading: string): Promise<HTMLElement> {
  const block = blockOf(section, heading);
  block.querySelector<HTMLButtonElement>('.go button')?.click();
  for (let turn = 0; turn < 400 && !block.querySelector('.found'); turn++) {
    await new Promise((done) => setTimeout(done, 20));
  }
  await settled(section);
  return deep(block, '.answer');
}

const words = (element: Element): string => element.textContent?.replace(/\s+/g, ' ') ?? '';

describe('solving', () => {
  afterEach(clear);

  it('has no accessibility fault, with an answer standing', async () => {
    const section = await standing();
    await solved(section, 'Best setting');
    expect(await axeFaults(section)).to.deep.equal([]);
  });

  it('shows the best setting with its forward run, and adopts it with what its control must hold', async () => {
    const section = await standing();
    const edits = editsOf(section);
    const answer = await solved(section, 'Best setting');
    expect(words(answer)).to.match(/\d+ kV, .*SdNR² .* per mGy incident air kerma, equal SdNR/);
    expect(words(answer)).to.match(/Run forward again: .* met within 0\.01 %/);
    answer.querySelector('button')?.click();
    const [edit] = edits;
    if (!edit || !('change' in edit)) throw new Error('nothing was adopted');
    const next = edit.change(section.model.draft.document);
    expect(valueAtPath(next, 'techniques[1].control.detectorAirKerma_uGy')).to.be.a('number');
  });

  it('finds the least iodine for the SdNR typed, and writes it into the task', async () => {
    const section = await standing();
    const edits = editsOf(section);
    const field = blockOf(section, 'Least iodine').querySelector('input');
    if (!field) throw new Error('no field for the target');
    type(field, '6,5');
    await settled(section);
    const answer = await solved(section, 'Least iodine');
    expect(words(answer)).to.match(/mg element\/mL of iodine/);
    expect(words(answer)).to.contain('target 6.500, met within');
    answer.querySelector('button')?.click();
    const [edit] = edits;
    if (!edit || !('change' in edit)) throw new Error('nothing was written');
    const amount = valueAtPath(
      edit.change(section.model.draft.document),
      'task.detail.agent.amount.value',
    );
    expect(amount).to.be.greaterThan(0).and.to.be.lessThan(120);
  });

  it('finds the thickest patient, and names what stops a thicker one', async () => {
    const section = await standing(['techniques[1].control', { detectorAirKerma_uGy: 0.5 }]);
    const answer = await solved(section, 'Thickest patient');
    expect(words(answer)).to.match(/\d+(\.\d)? mm/);
    const findings = deep(answer, 'finding-list');
    expect(findings.shadowRoot?.textContent).to.contain('Limit');
  });

  it('names the limit when nothing can be had', async () => {
    const section = await standing(['room.tube.power_kW', 0.01]);
    const answer = await solved(section, 'Best setting');
    expect(words(answer)).to.contain('No answer within the limits');
    expect(deep(answer, 'finding-list').shadowRoot?.textContent).to.contain('kW');
  });

  it('marks an answer that belongs to another state of the case', async () => {
    const section = await standing();
    await solved(section, 'Best setting');
    section.model = modelWith(coarse, ['techniques[0].potential_kV', 95]);
    await settled(section);
    expect(words(blockOf(section, 'Best setting'))).to.contain('stale');
  });

  it('asks nothing about iodine where the detail holds no agent', async () => {
    const section = await standing([
      'task.detail',
      { shape: 'insert', material: 'air', inLayer: 'abdomen', size_mm: 6 },
    ]);
    expect(section.shadowRoot?.querySelectorAll('.questions > div')).to.have.length(2);
  });
});
