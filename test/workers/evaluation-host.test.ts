import { describe, expect, test } from 'vitest';
import { evaluationHost } from '../../components/workers/evaluation-host.js';
import { type ParsedCase, parseCase } from '../../physics/case/index.js';
import { sampleDocument } from '../desk/sample/case.js';

const parsed = (): ParsedCase => {
  const read = parseCase(sampleDocument);
  if ('faults' in read) throw new Error('the sample must be sound');
  return read;
};

describe('what the evaluation worker answers', () => {
  test('every technique is evaluated at the size asked for', () => {
    const host = evaluationHost();
    host.load(parsed());
    const { evaluations } = host.weigh('median');
    expect(evaluations.map(({ technique, size }) => `${technique} ${size}`)).toEqual([
      'Current median',
      'Proposed median',
    ]);
  });

  test('answers clone to the page', () => {
    const host = evaluationHost();
    host.load(parsed());
    const answer = host.weigh('median');
    expect(structuredClone(answer)).toEqual(answer);
    expect(structuredClone(host.along('median'))).toEqual(host.along('median'));
  });

  test('the scan holds the detector air kerma of Current at every potential', () => {
    const host = evaluationHost();
    host.load(parsed());
    const scan = host.scan({
      size: 'median',
      filter: '0.2 Cu',
      potentials_kV: [60, 70, 80],
      hold: 'detectorAirKerma',
    });
    expect(scan.map(({ potential_kV }) => potential_kV)).toEqual([60, 70, 80]);
    for (const { values } of scan) expect(values?.detectorAirKerma_uGy).toBeCloseTo(2.5, 9);
  });

  test('the scan at Current’s own setting is Current as set', () => {
    const host = evaluationHost();
    host.load(parsed());
    const [point] = host.scan({
      size: 'median',
      filter: 'none',
      potentials_kV: [80],
      hold: 'sdnr',
    });
    const current = host
      .weigh('median')
      .evaluations.find(({ technique }) => technique === 'Current');
    expect(point.values?.incidentAirKerma_mGy).toBeCloseTo(
      current?.dose.incidentAirKerma_mGy ?? Number.NaN,
      9,
    );
  });

  test('the same case loaded again gives the same numbers', () => {
    const host = evaluationHost();
    host.load(parsed());
    const first = host.weigh('median');
    host.load(structuredClone(parsed()));
    expect(host.weigh('median')).toEqual(first);
  });

  test('a size that is not in the case gives nothing, and no error', () => {
    const host = evaluationHost();
    host.load(parsed());
    expect(host.weigh('none such').evaluations).toEqual([]);
    expect(host.along('none such')).toEqual([]);
    expect(
      host.scan({ size: 'none such', filter: 'none', potentials_kV: [80], hold: 'sdnr' }),
    ).toEqual([]);
  });

  test('asked before a case was loaded, it says so', () => {
    expect(() => evaluationHost().weigh('median')).toThrow('no case');
  });
});
