import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { frontierOf } from '../../../physics/sweep/frontier.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import type { SweepValues } from '../../../physics/sweep/values.js';
import { window90_kV } from '../../../physics/sweep/window.js';

/** A setting of which only SdNR, incident air kerma and tube load matter. */
const setting = (
  sdnr: number,
  incidentAirKerma_mGy: number,
  tubeLoad_mAs = 1,
  more: Partial<SweepSetting> = {},
): SweepSetting => ({
  potential_kV: 70,
  filter: 'none',
  size: 'one',
  values: { sdnr, incidentAirKerma_mGy, tubeLoad_mAs } as SweepValues,
  findings: [],
  ...more,
});

const forbidden = [{ code: 'power', severity: 'limit', message: 'beyond' }] as const;

describe('a frontier', () => {
  it('keeps what no other setting beats', () => {
    const settings = [setting(10, 1), setting(10, 2), setting(12, 2), setting(9, 0.5)];
    expect(frontierOf(settings, ['incidentAirKerma'])).toEqual([0, 2, 3]);
  });

  it('keeps equals: rounding decides no dominance', () => {
    const settings = [setting(10, 1), setting(10 * (1 + 1e-12), 1), setting(10, 1 - 1e-13)];
    expect(frontierOf(settings, ['incidentAirKerma'])).toEqual([0, 1, 2]);
  });

  it('lets only allowed settings compete, and each size by itself', () => {
    const settings = [
      setting(10, 1, 1, { findings: forbidden }),
      setting(10, 2),
      setting(5, 9, 1, { size: 'other' }),
      setting(5, 9, 1, { values: null }),
    ];
    expect(frontierOf(settings, ['incidentAirKerma'])).toEqual([1, 2]);
  });

  it('leaves out settings whose chosen cost is not known', () => {
    const known = setting(10, 1).values as SweepValues;
    const unknown = setting(10, 1, 1, { values: { ...known, elementMass_g: null } });
    expect(frontierOf([unknown], ['elementMass'])).toEqual([]);
  });

  it('is what a look at every pair gives', () => {
    const coordinate = fc.integer({ min: 1, max: 6 });
    const many = fc.array(fc.tuple(coordinate, coordinate, coordinate), { maxLength: 40 });
    fc.assert(
      fc.property(many, (triples) => {
        const settings = triples.map(([sdnr, kerma, load]) => setting(sdnr, kerma, load));
        const byPairs = triples.flatMap(([s, k, l], i) =>
          triples.some(
            ([s2, k2, l2]) => s2 >= s && k2 <= k && l2 <= l && (s2 > s || k2 < k || l2 < l),
          )
            ? []
            : [i],
        );
        expect(frontierOf(settings, ['incidentAirKerma', 'tubeLoad'])).toEqual(byPairs);
      }),
    );
  });
});

describe('the 90 % window', () => {
  const kermas = [2, 1.2, 1.05, 1, 1.08, 1.3, 1];
  const line = kermas.map((kerma, i) => setting(10, kerma, 1, { potential_kV: 60 + 5 * i }));

  it('is the unbroken run around the best', () => {
    expect(window90_kV(line, 'incidentAirKerma', 75)).toEqual([70, 80]);
  });

  it('is a single potential where no neighbour is as good', () => {
    const peak = [2, 1, 2].map((kerma, i) => setting(10, kerma, 1, { potential_kV: 60 + 5 * i }));
    expect(window90_kV(peak, 'incidentAirKerma', 65)).toEqual([65, 65]);
    expect(window90_kV([line[0]], 'incidentAirKerma', 60)).toEqual([60, 60]);
  });
});
