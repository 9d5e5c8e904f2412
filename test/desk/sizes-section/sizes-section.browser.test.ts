import { expect } from 'chai';
import '../../../components/desk/sizes-section/sizes-section.js';
import type { FaultReport } from '../../../components/desk/fields/report-faults.js';
import type { DeskModel } from '../../../components/desk/model/desk-model.js';
import type { SizesSection } from '../../../components/desk/sizes-section/sizes-section.js';
import { type Json, valueAtPath } from '../../../components/store/path.js';
import { weigh } from '../../../physics/weigh.js';
import { samePool } from '../sample/pool.js';
import { axeFaults, clear, deep, editsOf, modelWith, settled, stand } from '../stand.js';

const coarse: [string, Json] = ['room.tube.potential_kV', { min: 50, max: 125, step: 15 }];

/** The sample desk weighed at both of its sizes. */
const weighed = (...edits: [string, Json][]): DeskModel => {
  const model = modelWith(coarse, ['techniques[1].potential_kV', 65], ...edits);
  const { case: c, assumed } = model.draft;
  const [median, large] = c.patient.sizes;
  return {
    ...model,
    weighing: weigh({ case: c, assumed }, [median]),
    others: [weigh({ case: c, assumed }, [large])],
  };
};
const model = weighed();

const standing = (properties: Partial<SizesSection> = {}): Promise<SizesSection> =>
  stand('sizes-section', { model, pool: samePool, ...properties });

const answered = async (section: SizesSection): Promise<SizesSection> => {
  for (let turn = 0; turn < 400 && section.answer === null; turn++) {
    await new Promise((done) => setTimeout(done, 20));
  }
  await settled(section);
  return section;
};

const textOf = (element: Element): string =>
  element.shadowRoot?.textContent?.replace(/\s+/g, ' ') ?? '';

/** Hands a CSV file to the button with these words. */
async function hand(
  section: SizesSection,
  words: string,
  name: string,
  text: string,
): Promise<void> {
  const labels = [...(section.shadowRoot?.querySelectorAll('.file') ?? [])];
  const input = labels.find((label) => label.textContent?.includes(words))?.querySelector('input');
  if (!input) throw new Error(`no button ${words}`);
  const files = new DataTransfer();
  files.items.add(new File([text], name, { type: 'text/csv' }));
  input.files = files.files;
  input.dispatchEvent(new Event('change'));
  await new Promise((done) => setTimeout(done, 50));
  await settled(section);
}

describe('the size mix', () => {
  afterEach(clear);

  it('has no accessibility fault', async () => {
    expect(await axeFaults(await answered(await standing()))).to.deep.equal([]);
  });

  it('says what Proposed means for all patients, first in a sentence', async () => {
    const text = textOf(await standing());
    expect(text).to.match(
      /Proposed, as set: incident air kerma per run ×\d+\.\d+ averaged over the size mix/,
    );
    expect(text).to.contain('patients at sizes the room forbids');
  });

  it('shows thin, middle and thick patients', async () => {
    const text = textOf(await answered(await standing()));
    for (const words of ['P5, 202 mm', 'P50, ', 'P95, 290 mm']) expect(text).to.contain(words);
  });

  it('tabulates what the room would need, a row per technique and size', async () => {
    const table = deep(await standing(), '.technique-table table');
    expect(table.querySelectorAll('tbody tr')).to.have.length(4);
    expect(table.textContent).to.contain('at equal SdNR µGy');
  });

  it('warns that the control is not modelled where no curve is given', async () => {
    expect(textOf(await standing())).to.contain('exposure control is not modelled for Current');
  });

  it('labels what it shows incomplete until every size is weighed', async () => {
    const section = await standing({ model: { ...model, others: [] } });
    expect(textOf(section)).to.contain('1 of 2 sizes weighed: incomplete');
  });

  it('reads a mix from CSV, and lists every row it cannot read', async () => {
    const section = await standing();
    const edits = editsOf(section);
    const reports: FaultReport[] = [];
    section.addEventListener('fault-report', (event) => reports.push(event.detail));
    const csv = 'thickness (cm),count\n20,3\n30,1\nthick,2\n25,-1\n';
    await hand(section, 'size mix', 'mix.csv', csv);
    const [edit] = edits;
    if (!('change' in edit)) throw new Error('not a change of the document');
    expect(valueAtPath(edit.change(model.draft.document), 'patient.sizes')).to.deep.equal([
      { name: '200 mm', thickness_mm: 200, weight: 3 },
      { name: '300 mm', thickness_mm: 300, weight: 1 },
    ]);
    expect(reports[0].faults.map(({ path }) => path)).to.deep.equal([
      'mix.csv, line 4',
      'mix.csv, line 5',
    ]);
    expect(textOf(section)).to.contain('mix.csv: 2 rows, 2 sizes');
  });

  it('makes bins of a long list of patients', async () => {
    const section = await standing();
    const edits = editsOf(section);
    const rows = Array.from({ length: 90 }, (_, i) => `${150 + 2 * i}`).join('\n');
    await hand(section, 'size mix', 'list.csv', `thickness (mm)\n${rows}\n`);
    const [edit] = edits;
    if (!('change' in edit)) throw new Error('not a change of the document');
    const mix = valueAtPath(edit.change(model.draft.document), 'patient.sizes') as Json[];
    expect(mix.length).to.be.within(8, 12);
    expect(textOf(section)).to.match(/list\.csv: 90 rows, \d+ sizes in bins of 20 mm/);
  });

  it('reads a control curve, and shows the filter withdrawn as a jump', async () => {
    const section = await standing();
    const edits = editsOf(section);
    const csv = [
      'thickness (mm),potential (kV),tube current (mA),exposure time (ms),filter',
      '200,65,300,80,0.2 Cu',
      '250,80,600,80,none',
      '300,80,900,80,9 Cu',
    ].join('\n');
    await hand(section, 'control curve for Proposed', 'room.csv', csv);
    const [edit] = edits;
    if (!('change' in edit)) throw new Error('not a change of the document');
    const control = valueAtPath(edit.change(model.draft.document), 'techniques[1].control');
    expect(valueAtPath(control, 'rows')).to.have.length(2);
    section.model = weighed(['techniques[1].control', control as Json]);
    section.answer = null;
    await answered(section);
    const chart = deep(section, '.along svg.chart');
    expect(chart.querySelectorAll('.jump').length).to.equal(2);
    expect(chart.getAttribute('aria-label')).to.contain('no filter from 250 mm on');
    expect(textOf(section)).to.contain('take Proposed off its control curve');
  });
});
