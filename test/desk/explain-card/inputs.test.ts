import { describe, expect, test } from 'vitest';
import { inputsOf } from '../../../components/desk/explain-card/inputs.js';
import type { DeskModel } from '../../../components/desk/model/desk-model.js';
import { createCaseStore } from '../../../components/store/case-store.js';
import type { Json } from '../../../components/store/path.js';
import { sampleDocument } from '../sample/case.js';
import { sampleModel } from '../sample/model.js';

const modelWith = (...edits: [path: string, value: Json][]): DeskModel => {
  const document = sampleDocument as unknown as Json;
  const store = createCaseStore({ document, files: {}, fileName: null }, () => 0);
  for (const [path, value] of edits) store.setAt(path, value);
  return { ...sampleModel, draft: store.state().draft };
};
const said = (id: string, model: DeskModel) =>
  Object.fromEntries(inputsOf(id, model, 'Current').map(({ what, from }) => [what, from]));

describe('what a number was computed from', () => {
  test('readings are measured, and what they replace is not called entered', () => {
    const from = said('sdnr', modelWith())['Tube spectrum'];
    expect(from).toContain('fitted to 2 readings of the room (measured)');
    expect(from).toContain('anode angle assumed');
    expect(from).not.toContain('output factor');
  });

  test('without readings the tube’s own values are said, entered or assumed', () => {
    const model = { ...modelWith(['room.tube.outputFactor', 0.9]), weighing: null };
    const from = said('sdnr', model)['Tube spectrum'];
    expect(from).toContain('output factor entered');
    expect(from).toContain('inherent filter assumed');
  });

  test('a source in place of the tube is entered', () => {
    const model = modelWith(['room.source', { kind: 'monoenergetic', energy_keV: 60 }]);
    expect(said('sdnr', model)).not.toHaveProperty('Tube spectrum');
    expect(said('sdnr', model).Source).toBe('entered: photons of one energy');
  });

  test('a room silent about its detector has it assumed; one value entered is not the rest', () => {
    expect(said('sdnr', modelWith()).Detector).toBe('assumed');
    const entered = said('sdnr', modelWith(['room.detector.pixel_mm', 0.15])).Detector;
    expect(entered).toMatch(/^entered, but \d+ of \d+ values assumed$/);
  });

  test('few assumed values are named', () => {
    const geometry = {
      beam: 'point',
      sourceToDetector_mm: 1150,
      exitToDetector_mm: 100,
      minSourceToSkin_mm: 380,
      anchor: 'detector',
      field_mm: [250, 250],
    };
    expect(said('sdnr', modelWith(['room.geometry', geometry])).Geometry).toBe(
      'entered, but reference point from source assumed',
    );
  });

  test('a grid is computed from its make-up until its transmissions are measured', () => {
    expect(said('sdnr', modelWith()).Grid).toContain('computed from its make-up');
    const measured = { primaryTransmission: 0.7, scatterTransmission: 0.1 };
    expect(said('sdnr', modelWith(['room.grid.measured', measured])).Grid).toContain('measured');
    expect(said('sdnr', modelWith(['techniques[0].grid', 'out']))).not.toHaveProperty('Grid');
  });

  test('compositions recalled are called so', () => {
    expect(said('sdnr', modelWith()).Patient).toContain('recalled');
    expect(said('sdnr', modelWith()).Attenuation).toContain('published');
  });

  test('the half-value layer needs neither patient nor detector', () => {
    expect(Object.keys(said('halfValueLayer', modelWith()))).toEqual([
      'Tube spectrum',
      'Added filter',
      'Attenuation',
    ]);
  });

  test('a dose does not depend on the detail, SdNR does', () => {
    expect(said('incidentAirKerma', modelWith())).not.toHaveProperty('Detail');
    expect(said('sdnr', modelWith())).toHaveProperty('Detail');
  });

  test('a technique that is not in the case has nothing said of it', () => {
    expect(inputsOf('sdnr', modelWith(), 'none such')).toEqual([]);
  });
});
