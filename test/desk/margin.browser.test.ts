import { expect } from 'chai';
import '../../components/desk/comparison-table/comparison-table.js';
import '../../components/desk/curve-panel/curve-panel.js';
import '../../components/desk/fault-list/fault-list.js';
import '../../components/desk/finding-list/finding-list.js';
import type { Finding } from '../../physics/results.js';
import { sampleModel } from './sample/model.js';
import { sampleScan } from './sample/scan.js';
import { axeFaults, clear, deep, editsOf, modelWith, settled, stand } from './stand.js';

const textOf = (element: Element): string =>
  element.shadowRoot?.textContent?.replace(/\s+/g, ' ') ?? '';

describe('the contrast-versus-dose curve', () => {
  afterEach(clear);
  const panel = (properties = {}) =>
    stand('curve-panel', { model: sampleModel, scan: sampleScan, ...properties });

  it('has no accessibility fault', async () => {
    expect(await axeFaults(await panel())).to.deep.equal([]);
  });

  it('names what is shown, the dose and what is held equal, for eye and ear', async () => {
    const label = deep(await panel(), 'svg.chart').getAttribute('aria-label');
    expect(label)
      .to.contain('SdNR of the vessel')
      .and.to.contain('incident air kerma')
      .and.to.contain('equal detector air kerma');
  });

  it('draws a line per filter and marks both techniques', async () => {
    const element = await panel();
    const chart = deep(element, 'svg.chart');
    for (const words of [
      'no filter',
      '0.2 Cu',
      '0.9 Cu',
      'Current 80 kV',
      'Proposed 70 kV',
      'Rose, k = 5',
    ]) {
      expect(chart.textContent).to.contain(words);
    }
  });

  it('thins what a limit forbids and names the limit', async () => {
    const chart = deep(await panel(), 'svg.chart');
    expect(chart.querySelectorAll('.line.forbidden').length).to.be.greaterThan(0);
    expect(chart.textContent).to.contain('beyond tube power');
  });

  it('reads every line at the potential of the slider', async () => {
    const element = await panel();
    const slider = deep<HTMLInputElement>(element, 'input[type="range"]');
    slider.value = '60';
    slider.dispatchEvent(new Event('input'));
    await settled(element);
    expect(deep(element, 'output').textContent).to.contain('no filter: 3.00 mGy');
    expect(deep(element, 'svg.chart').querySelectorAll('.cursor').length).to.be.greaterThan(0);
  });

  it('gives the same figures as a table, forbidden ones marked', async () => {
    const table = deep(await panel(), 'table');
    expect(table.querySelectorAll('tbody tr')).to.have.length(76);
    expect(table.textContent).to.contain('*');
  });

  it('asks for another dose on its axis', async () => {
    const element = await panel();
    const edits = editsOf(element);
    const select = deep<HTMLSelectElement>(
      element,
      'choice-field[path="compare.primaryDose"]',
      'select',
    );
    select.value = 'kermaAreaProduct';
    select.dispatchEvent(new Event('change'));
    expect(edits).to.deep.equal([{ path: 'compare.primaryDose', value: 'kermaAreaProduct' }]);
  });

  it('says so when no technique shown can be computed', async () => {
    const none = { ...sampleModel, weighing: null };
    expect(textOf(await panel({ model: none }))).to.contain('No technique shown can be computed');
    expect(textOf(await panel())).not.to.contain('No technique shown');
  });

  it('labels an investigational agent on the plot', async () => {
    const element = await panel({ model: modelWith(['task.detail.agent.name', 'tantalum']) });
    expect(deep(element, 'svg.chart').textContent).to.contain('investigational');
  });
});

describe('the comparison in the margin', () => {
  afterEach(clear);

  it('has no accessibility fault and shows ratios under four equalities', async () => {
    const table = await stand('comparison-table', { model: sampleModel });
    expect(await axeFaults(table)).to.deep.equal([]);
    const first = table.shadowRoot?.querySelector('tbody tr')?.textContent?.replace(/\s+/g, ' ');
    expect(first)
      .to.contain('incident air kerma')
      .and.to.match(/0\.41.*0\.50.*0\.41.*1\.00/);
  });
});

describe('findings', () => {
  afterEach(clear);
  const finding = (severity: Finding['severity'], message: string): Finding => ({
    code: 'x',
    severity,
    message,
  });

  it('stand limits first, each once, severity said in a word', async () => {
    const list = await stand('finding-list', {
      findings: [
        finding('note', 'third'),
        finding('caution', 'second'),
        finding('limit', 'first'),
        finding('note', 'third'),
      ],
    });
    const items = [...(list.shadowRoot?.querySelectorAll('li') ?? [])].map(
      (item) => item.textContent,
    );
    expect(items).to.deep.equal(['Limit. first', 'Caution. second', 'Note. third']);
    expect(await axeFaults(list)).to.deep.equal([]);
  });
});

describe('faults of a file', () => {
  afterEach(clear);

  it('are shown as path, value, rule and remedy, markup as text', async () => {
    const fault = { path: 'title', value: '<b>x</b>', rule: 'must be text', remedy: 'enter text' };
    const list = await stand('fault-list', {
      heading: 'a.json was not opened',
      faults: [fault],
      closable: true,
    });
    expect(textOf(list)).to.contain('title: <b>x</b>: must be text; enter text');
    expect(list.shadowRoot?.querySelector('li b')).to.equal(null);
    expect(await axeFaults(list)).to.deep.equal([]);
  });
});
