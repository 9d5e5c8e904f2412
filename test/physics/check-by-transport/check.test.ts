import { describe, expect, it } from 'vitest';
import {
  type CheckRequest,
  type CheckRow,
  type CheckSetup,
  checkReport,
  fates,
  setUpCheck,
  trackFates,
} from '../../../physics/check-by-transport/index.js';
import { runTransport } from '../../../physics/jobs/index.js';
import { recordTracks } from '../../../physics/transport/index.js';
import { weigh } from '../../../physics/weigh.js';
import { sampleCase } from '../sample-case.js';

type Changes = Parameters<typeof sampleCase>[0];

const request: CheckRequest = { technique: 'Current', size: 'as drawn', photons: 60_000, seed: 4 };

const setUp = (changes: Changes = {}, asked: Partial<CheckRequest> = {}): CheckSetup => {
  const setup = setUpCheck(sampleCase(changes).case, { ...request, ...asked });
  if (!('input' in setup)) throw new Error(JSON.stringify(setup.findings));
  return setup;
};
const flown = (changes: Changes = {}, asked: Partial<CheckRequest> = {}) => {
  const setup = setUp(changes, asked);
  return checkReport(setup, runTransport(setup.input), null);
};
const rowOf = (rows: readonly CheckRow[], quantity: CheckRow['quantity']): CheckRow => {
  const row = rows.find((candidate) => candidate.quantity === quantity);
  if (!row) throw new Error(`no row ${quantity}`);
  return row;
};

/** Estimate within the stated tolerance, with four standard errors of the run on top. */
const isNear = ({ estimate, transport, tolerance_percent }: CheckRow): boolean =>
  Math.abs((estimate ?? 0) - transport.value) <=
  (transport.value * (tolerance_percent ?? 0)) / 100 + 4 * (transport.standardError ?? 0);

describe('the check by transport', () => {
  const report = flown();

  it('sets the values that weigh prints beside those of the run', () => {
    const [evaluation] = weigh(sampleCase()).evaluations;
    const { estimate } = report;
    expect(estimate.spr).toBe(evaluation.scatter.spr);
    expect(estimate.sprBehindGrid).toBe(evaluation.scatter.sprBehindGrid);
    expect(estimate.backscatterFactor).toBe(evaluation.dose.backscatterFactor);
    expect(estimate.energyImparted_mJ).toBe(evaluation.dose.energyImparted_mJ);
    expect(estimate.layerAbsorbedDose_mGy).toEqual(
      evaluation.dose.layerAbsorbedDose_mGy?.map(({ value }) => value),
    );
  });

  it('finds the estimate within its stated accuracy in 20 cm of water', () => {
    const compared = report.rows.filter(({ verdict }) => verdict !== null);
    expect(compared.map(({ quantity }) => quantity)).toEqual([
      'spr',
      'sprBehindGrid',
      'scatterFraction',
      'backscatterFactor',
      'energyImparted',
      'layerAbsorbedDose',
    ]);
    expect(compared.filter((row) => !isNear(row)).map(({ quantity }) => quantity)).toEqual([]);
  });

  it('finds all energy again', () => {
    expect(report.isBalanced).toBe(true);
    expect(report.energyBalance.sum).toBeCloseTo(1, 9);
  });

  it('gives every value the same whether layers are one or cut in two', () => {
    const halves = ['upper', 'lower'].map((name) => ({
      name,
      material: 'water',
      thickness_mm: 100,
    }));
    const cut = flown({ patient: { layers: halves }, task: { detail: { inLayer: 'upper' } } });
    expect(cut.spr.value).toBeCloseTo(report.spr.value, 1);
    const doses = cut.rows.filter(({ quantity }) => quantity === 'layerAbsorbedDose');
    expect(doses.map(({ layer }) => layer)).toEqual(['upper', 'lower']);
    expect(doses[0].transport.value).toBeGreaterThan(doses[1].transport.value);
  });

  it('flies a parallel beam as a pencil and means the same dose by it', () => {
    const beam = { room: { geometry: { beam: 'parallel', air: false } } };
    const setup = setUp(beam);
    expect(setup.input.source.kind).toBe('pencil');
    const { rows } = checkReport(setup, runTransport(setup.input), null);
    expect(rows.some(({ quantity }) => quantity === 'columnAbsorbedDose')).toBe(false);
    for (const quantity of ['energyImparted', 'layerAbsorbedDose', 'spr'] as const) {
      expect(isNear(rowOf(rows, quantity)), quantity).toBe(true);
    }
  });

  it('leaves the grid out where the technique does', () => {
    const [current, proposed] = sampleCase().case.techniques;
    const setup = setUp({ techniques: [{ ...current, grid: 'out' }, proposed] });
    expect(setup.hasGrid).toBe(false);
    expect(setup.setting).toBe('80 kV, no filter, grid out');
    expect(setup.estimate.sprBehindGrid).toBe(null);
  });

  it('takes a measured grid for both sides of the comparison', () => {
    const measured = { primaryTransmission: 0.7, scatterTransmission: 0.1 };
    const { spr, sprBehindGrid, findings } = flown({ room: { grid: { measured } } });
    expect(sprBehindGrid?.value).toBeCloseTo(spr.value / 7, 12);
    expect(findings.map(({ code }) => code)).toContain('checkMeasuredGrid');
  });

  it('gives the middle of a 20 × 20 cm field 0.92 of the average at entrance, 0.68 at exit', () => {
    // 20 cm of water, 80 keV; the two shares were computed separately with a parallel beam.
    const layers = [
      { name: 'entrance', material: 'water', thickness_mm: 10 },
      { name: 'water', material: 'water', thickness_mm: 180 },
      { name: 'exit', material: 'water', thickness_mm: 10 },
    ];
    const geometry = {
      sourceToDetector_mm: 3000,
      exitToDetector_mm: 50,
      field_mm: [211, 211],
      air: false,
    };
    const source = { kind: 'monoenergetic', energy_keV: 80 };
    const { rows } = flown(
      { room: { source, grid: null, geometry }, patient: { layers } },
      { photons: 300_000 },
    );
    const values = (quantity: CheckRow['quantity']) =>
      rows.filter((row) => row.quantity === quantity).map(({ transport }) => transport);
    const [atEntrance, , atExit] = values('columnAbsorbedDose').map(
      ({ value, standardError }, k) => {
        const average = values('layerAbsorbedDose')[k].value;
        return { share: value / average, error: (standardError ?? 0) / average };
      },
    );
    expect(Math.abs(atEntrance.share - 0.92)).toBeLessThan(3 * atEntrance.error);
    expect(Math.abs(atExit.share - 0.68)).toBeLessThan(3 * atExit.error);
    expect(atEntrance.error).toBeLessThan(0.02);
    expect(atExit.error).toBeLessThan(0.05);
  });

  it('says what the two do not have in common, and where the accuracy was not tried', () => {
    const codes = (changes: Changes) => setUp(changes).findings.map(({ code }) => code);
    const usual = { room: { geometry: { exitToDetector_mm: 100, field_mm: [250, 250] } } };
    expect(codes(usual)).toEqual([]);
    expect(codes({ ...usual, patient: { lateral_mm: [400, 400] } })).toContain('checkSides');
    const oblong = { room: { geometry: { exitToDetector_mm: 100, field_mm: [300, 200] } } };
    expect(codes(oblong)).toContain('checkField');
    expect(codes({ room: { geometry: { exitToDetector_mm: 300 } } })).toContain('checkUntried');
    const opaque = { patient: { layers: [{ name: 'water', material: 'lead', thickness_mm: 10 }] } };
    expect(codes(opaque)).toContain('checkOpaque');
  });

  it('refuses names the case does not have, and beams it has no tables for', () => {
    const refusal = (changes: Changes, asked: Partial<CheckRequest>) => {
      const answer = setUpCheck(sampleCase(changes).case, { ...request, ...asked });
      return 'input' in answer ? '' : answer.findings[0].message;
    };
    expect(refusal({}, { technique: 'Nobody' })).toContain('no technique called Nobody');
    expect(refusal({}, { size: 'giant' })).toContain('no size called giant');
    const source = { kind: 'lines', lines: [[1173.2, 1]] };
    expect(refusal({ room: { source, grid: null } }, {})).toContain('1173.2 keV');
  });

  it('tells the end of every photon whose path is drawn, the patient taking most', () => {
    const { input } = setUp();
    const tracks = recordTracks(input, 400);
    const counts = trackFates(input, tracks);
    expect(fates.reduce((sum, fate) => sum + counts[fate], 0)).toBe(400);
    expect(counts.absorbed).toBeGreaterThan(200);
    expect(counts.turnedBack).toBeGreaterThan(20);
    expect(counts.unscattered + counts.scattered).toBeGreaterThan(0);
    expect(counts.leftSide).toBe(0);
  });
});
