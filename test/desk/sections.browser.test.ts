import { expect } from 'chai';
import '../../components/desk/balance-section/balance-section.js';
import '../../components/desk/patient-section/patient-section.js';
import '../../components/desk/room-section/room-section.js';
import '../../components/desk/task-section/task-section.js';
import '../../components/desk/techniques-section/techniques-section.js';
import type { CaseEdit } from '../../components/desk/fields/case-edit.js';
import type { FaultReport } from '../../components/desk/fields/report-faults.js';
import { type Json, valueAtPath } from '../../components/store/path.js';
import { sampleDocument } from './sample/case.js';
import { sampleModel } from './sample/model.js';
import { axeFaults, clear, deep, editsOf, modelWith, settled, stand } from './stand.js';

const document = sampleDocument as unknown as Json;
/** The document as an edit would leave it. */
const changedBy = (edit: CaseEdit): Json => ('change' in edit ? edit.change(document) : null);
const buttonNamed = (element: Element, name: string): HTMLButtonElement => {
  const buttons = [...(element.shadowRoot?.querySelectorAll('button') ?? [])];
  const found = buttons.find(
    (button) => (button.getAttribute('aria-label') ?? button.textContent)?.trim() === name,
  );
  if (!found) throw new Error(`no button ${name}`);
  return found;
};

describe('the room', () => {
  afterEach(clear);
  const room = (model = sampleModel) => stand('room-section', { model });

  it('has no accessibility fault, with a tube and with lines in its place', async () => {
    expect(await axeFaults(await room())).to.deep.equal([]);
    clear();
    const lines = modelWith(['room.source', { kind: 'lines', lines: [[60, 1]] }]);
    expect(await axeFaults(await room(lines))).to.deep.equal([]);
  });

  it('shows what the model makes of each reading', async () => {
    expect((await room()).shadowRoot?.textContent)
      .to.contain('2.26')
      .and.to.contain('+0.90 %');
  });

  it('adds a filter under a name of its own', async () => {
    const element = await room();
    const edits = editsOf(element);
    buttonNamed(element, 'add a filter').click();
    expect(valueAtPath(changedBy(edits[0]), 'room.filters[3].name')).to.equal('new filter');
  });

  it('does not let go of a filter that a technique uses', async () => {
    const element = await room();
    expect(buttonNamed(element, 'Remove filter 0.2 Cu').disabled).to.equal(true);
    expect(buttonNamed(element, 'Remove filter 0.9 Cu').disabled).to.equal(false);
  });

  it('shows a reading just added although it still lacks its values', async () => {
    const readings = [
      ...sampleDocument.room.readings,
      { potential_kV: 100, halfValueLayer_mmAl: null, airKerma_uGy_per_mAs: null },
    ];
    const element = await room(modelWith(['room.readings', readings as unknown as Json]));
    const table = deep(element, '[aria-label="Readings"] table');
    expect(table.querySelectorAll('tbody tr')).to.have.length(3);
  });

  it('adds readings from a table and names every line it could not read', async () => {
    const element = await room();
    const edits = editsOf(element);
    const reports: FaultReport[] = [];
    element.addEventListener('fault-report', ({ detail }) => reports.push(detail));
    const csv =
      'potential (kV),half-value layer (mm Al),air kerma (µGy/mAs)\n70,2.5,48\nseventy,2.5,48\n';
    const carried = new DataTransfer();
    carried.items.add(new File([csv], 'readings.csv'));
    const input = deep<HTMLInputElement>(element, 'input[type="file"]');
    input.files = carried.files;
    input.dispatchEvent(new Event('change'));
    await new Promise((done) => setTimeout(done, 50));
    const readings = valueAtPath(changedBy(edits[0]), 'room.readings') as {
      potential_kV: number;
    }[];
    expect(readings.map(({ potential_kV }) => potential_kV)).to.deep.equal([60, 80, 70]);
    expect(reports[0].faults.map(({ path }) => path)).to.deep.equal(['readings.csv, line 3']);
  });
});

describe('the patient', () => {
  afterEach(clear);

  it('has no accessibility fault, with an agent in a layer too', async () => {
    const filled = modelWith([
      'patient.layers[1].agent',
      { name: 'barium sulfate', amount: { value: 20, unit: '% w/v' } },
    ]);
    expect(await axeFaults(await stand('patient-section', { model: filled }))).to.deep.equal([]);
  });

  it('begins a size mix from the layers as drawn', async () => {
    const model = modelWith(['patient.sizes', []]);
    const element = await stand('patient-section', { model });
    const edits = editsOf(element);
    buttonNamed(element, 'add a size').click();
    const sizes = valueAtPath(
      'change' in edits[0] ? edits[0].change(model.draft.document) : null,
      'patient.sizes',
    );
    expect(
      (sizes as { thickness_mm: number }[]).map(({ thickness_mm }) => thickness_mm),
    ).to.deep.equal([202, 222]);
  });
});

describe('the task', () => {
  afterEach(clear);

  it('has no accessibility fault for a vessel, a coat and an insert', async () => {
    for (const shape of ['vessel', 'coat']) {
      const element = await stand('task-section', {
        model: modelWith(['task.detail.shape', shape]),
      });
      expect(await axeFaults(element)).to.deep.equal([]);
      clear();
    }
  });

  it('says that an agent is investigational', async () => {
    const element = await stand('task-section', {
      model: modelWith(['task.detail.agent.name', 'tantalum']),
    });
    expect(element.shadowRoot?.textContent).to.contain('Investigational agent');
  });
});

describe('techniques and balance', () => {
  afterEach(clear);

  it('have no accessibility fault', async () => {
    for (const tag of ['techniques-section', 'balance-section'] as const) {
      const element = await stand(tag, { model: sampleModel });
      expect(await axeFaults(element)).to.deep.equal([]);
    }
  });

  it('copy a technique', async () => {
    const element = await stand('techniques-section', { model: sampleModel });
    const edits = editsOf(element);
    buttonNamed(element, 'Copy Proposed as a new technique').click();
    expect(valueAtPath(changedBy(edits[0]), 'techniques[2].name')).to.equal('Proposed 2');
  });

  it('mark the K edge of the agent in the spectrum', async () => {
    const element = await stand('balance-section', { model: sampleModel });
    await settled(element);
    expect(deep(element, 'svg.chart').textContent).to.contain('I K edge 33.17 keV');
  });
});
