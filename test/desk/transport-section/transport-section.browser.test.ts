import { expect } from 'chai';
import '../../../components/desk/transport-section/transport-section.js';
import type { TransportSection } from '../../../components/desk/transport-section/transport-section.js';
import { sampleModel } from '../sample/model.js';
import { axeFaults, clear, deep, modelWith, settled, stand } from '../stand.js';
import { sampleCheck, sampleReport } from './sample-check.js';

const section = (properties: Partial<TransportSection> = {}) =>
  stand('transport-section', { model: sampleModel, ...properties });
const done = {
  ...sampleCheck,
  phase: 'done' as const,
  report: { ...sampleReport, photons: 1_000_000, isComplete: true },
};
const words = (element: Element): string =>
  element.shadowRoot?.textContent?.replace(/\s+/g, ' ') ?? '';
const button = (element: Element): HTMLButtonElement => deep(element, 'button.plain');
const field = (element: Element, n: number): HTMLSelectElement =>
  [...(element.shadowRoot?.querySelectorAll<HTMLSelectElement>('.setting select') ?? [])][n];

describe('check by transport', () => {
  afterEach(() => {
    document.documentElement.removeAttribute('data-paper');
    clear();
  });

  for (const paper of ['light', 'dark']) {
    it(`has no accessibility fault on ${paper} paper, before, during and after a run`, async () => {
      document.documentElement.dataset.paper = paper;
      const element = await section();
      expect(await axeFaults(element)).to.deep.equal([]);
      element.check = sampleCheck;
      await settled(element);
      expect(await axeFaults(element)).to.deep.equal([]);
      element.check = done;
      await settled(element);
      expect(await axeFaults(element)).to.deep.equal([]);
    });
  }

  it('asks for a run with what was chosen', async () => {
    const element = await section();
    const asked: unknown[] = [];
    element.addEventListener('run-check', ({ detail }) => asked.push(detail));
    button(element).click();
    const choose = (n: number, value: string) => {
      field(element, n).value = value;
      field(element, n).dispatchEvent(new Event('change'));
    };
    choose(0, 'Proposed');
    choose(2, '100 000');
    const seed = deep<HTMLInputElement>(element, 'input[type="text"]');
    seed.value = '42';
    seed.dispatchEvent(new Event('change'));
    await settled(element);
    button(element).click();
    expect(asked).to.deep.equal([
      { technique: 'Current', size: 'median', photons: 1_000_000, seed: 1 },
      { technique: 'Proposed', size: 'median', photons: 100_000, seed: 42 },
    ]);
  });

  it('puts back a seed that is none', async () => {
    const element = await section();
    const seed = deep<HTMLInputElement>(element, 'input[type="text"]');
    for (const text of ['-3', '1.5', 'x', '']) {
      seed.value = text;
      seed.dispatchEvent(new Event('change'));
      expect(seed.value, text).to.equal('1');
    }
  });

  it('can be run and cancelled from the keyboard, the focus staying where it was', async () => {
    const element = await section();
    let cancelled = 0;
    element.addEventListener('cancel-check', () => {
      cancelled += 1;
    });
    const before = button(element);
    before.focus();
    element.check = sampleCheck;
    await settled(element);
    expect(element.shadowRoot?.activeElement).to.equal(before);
    expect(before.textContent).to.equal('Cancel');
    before.click();
    expect(cancelled).to.equal(1);
    expect([0, 1, 2].every((n) => field(element, n).disabled)).to.equal(true);
  });

  it('labels what is partial as incomplete, with seed and speed', async () => {
    const element = await section({ check: sampleCheck });
    expect(words(element)).to.contain(
      'incomplete: 400 000 of 1 000 000 photons, 250 000 a second, 3 s left',
    );
    expect(words(element)).to.contain('Current, 80 kV, no filter, grid in, size median, seed 1');
    const bar = deep<HTMLProgressElement>(element, 'progress');
    expect(bar.value / bar.max).to.equal(0.4);
    element.check = { ...sampleCheck, phase: 'cancelled', message: 'cancelled' };
    await settled(element);
    expect(words(element)).to.contain('cancelled; incomplete: 400 000 of 1 000 000 photons');
    element.check = done;
    await settled(element);
    expect(words(element)).not.to.contain('incomplete');
    expect(words(element)).to.contain('1 000 000 photons, 250 000 a second');
  });

  it('gives every quantity its verdict in words, and the energy balance', async () => {
    const element = await section({ check: done });
    const verdicts = [...(element.shadowRoot?.querySelectorAll('.verdict') ?? [])].map((cell) =>
      cell.textContent?.trim().replace(/\s+/g, ' '),
    );
    expect(verdicts).to.deep.equal([
      '≈ agrees within 10 %',
      '? not yet decided: needs 2.1 million photons',
      '≠ differs by more than 3 %',
      '≈ agrees within 4 %',
      '≈ agrees within 6 %',
      '≈ agrees within 6 %',
    ]);
    expect(words(element)).to.match(/found again\s*100.00 %\s*closes within 0.2 %/);
  });

  it('charts the quantity chosen, and says it in words', async () => {
    const element = await section({ check: done });
    const label = () => deep(element, 'svg.chart').getAttribute('aria-label');
    expect(label()).to.contain(
      'Scatter to primary, behind grid, Current, size median: estimate 0.62',
    );
    const choice = deep<HTMLSelectElement>(element, 'h3 select');
    choice.value = '2';
    choice.dispatchEvent(new Event('change'));
    await settled(element);
    expect(label()).to.contain('Backscatter factor, Current, size median: estimate 1.52');
    expect(label()).to.contain('after 400000 of 1000000 photons');
  });

  it('offers to draw the photons, telling how they ended', async () => {
    const element = await section({ check: done });
    const told: boolean[] = [];
    element.addEventListener('draw-tracks', ({ detail }) => told.push(detail));
    deep<HTMLInputElement>(element, 'input[type="checkbox"]').click();
    expect(told).to.deep.equal([true]);
    expect(words(element)).to.contain('the first 300 photons of the run, by how they ended');
    expect(words(element)).to.match(/absorbed in the patient\s*222/);
    expect(words(element)).not.to.contain('left by the side ');
  });

  it('greys results of another case, but not for a new title', async () => {
    const element = await section({ check: done });
    const isStale = () =>
      element.shadowRoot?.querySelector('.results')?.classList.contains('stale');
    element.model = modelWith(['title', 'Another title']);
    await settled(element);
    expect(isStale()).to.equal(false);
    element.model = modelWith(['techniques[0].potential_kV', 84]);
    await settled(element);
    expect(isStale()).to.equal(true);
    expect(words(element)).to.contain('stale: the case has changed since this run');
    expect(await axeFaults(element)).to.deep.equal([]);
  });

  it('says why a run could not be made', async () => {
    const check = { ...sampleCheck, phase: 'failed' as const, report: null, message: 'no beam' };
    const element = await section({ check });
    expect(words(element)).to.contain('not flown: no beam');
  });

  it('tells a screen reader of beginning and end, not of every batch', async () => {
    const element = await section({ check: sampleCheck });
    const status = deep(element, '[role="status"]');
    expect(status.textContent).to.equal('Run begun.');
    element.check = { ...sampleCheck, report: { ...sampleReport, photons: 500_000 } };
    await settled(element);
    expect(status.textContent).to.equal('Run begun.');
    element.check = done;
    await settled(element);
    expect(status.textContent).to.equal(
      'Run done: 4 quantities agree, 1 differ, 1 not yet decided.',
    );
  });
});
