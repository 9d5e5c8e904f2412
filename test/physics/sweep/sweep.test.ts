import { describe, expect, it } from 'vitest';
import { isAllowed } from '../../../physics/limits.js';
import { settingLabel } from '../../../physics/setting.js';
import { costs } from '../../../physics/sweep/costs.js';
import {
  combineSweep,
  sweep,
  sweepPiece,
  sweepPieceCount,
  wholeRoom,
} from '../../../physics/sweep.js';
import { weigh } from '../../../physics/weigh.js';
import { sampleCase, sampleJson } from '../sample-case.js';

const coarse = { room: { tube: { potential_kV: { min: 50, max: 120, step: 10 } } } };
const c = sampleCase(coarse).case;
const request = wholeRoom(c, 'detectorAirKerma');
const map = sweep(c, request);

describe('a sweep of the room', () => {
  it('holds every potential, filter and size once', () => {
    expect(map.settings.length).toBe(8 * 4 * 1);
    const keys = map.settings.map((s) => `${s.potential_kV} ${s.filter} ${s.size}`);
    expect(new Set(keys).size).toBe(keys.length);
  });

  it('gives the same numbers as weighing that setting as a technique', () => {
    const technique = { ...sampleJson.techniques[1], potential_kV: 90, filter: '0.1 Cu' };
    const weighed = weigh(
      sampleCase({ ...coarse, techniques: [sampleJson.techniques[0], technique] }),
    ).evaluations[1];
    const swept = map.settings.find((s) => s.potential_kV === 90 && s.filter === '0.1 Cu')?.values;
    expect(swept?.sdnr).toBeCloseTo(weighed.sdnr, 8);
    expect(swept?.incidentAirKerma_mGy).toBeCloseTo(weighed.dose.incidentAirKerma_mGy, 10);
    expect(swept?.tubeLoad_mAs).toBeCloseTo(weighed.exposure.tubeLoad_mAs, 8);
    expect(swept?.halfValueLayer_mmAl).toBeCloseTo(
      weighed.beam.halfValueLayers[0].first_mm ?? 0,
      10,
    );
  });

  it('is the same whatever order its pieces are computed in', () => {
    const pieces: ReturnType<typeof sweepPiece>[] = [];
    for (let i = sweepPieceCount(request) - 1; i >= 0; i--) pieces[i] = sweepPiece(c, request, i);
    expect(combineSweep(request, pieces)).toEqual(map);
  });

  it('has no frontier member that another allowed setting beats', () => {
    const { members, costs: chosen } = map.frontier;
    expect(members.length).toBeGreaterThan(0);
    const allowed = map.settings.filter(({ values, findings }) => values && isAllowed(findings));
    for (const member of members) {
      expect(isAllowed(member.findings)).toBe(true);
      const beaten = allowed.some(
        (other) =>
          other !== member &&
          chosen.every((cost) => paid(other, cost) < 0.999 * paid(member, cost)) &&
          (other.values?.sdnr ?? 0) > 1.001 * (member.values?.sdnr ?? 0),
      );
      expect(beaten).toBe(false);
    }
  });

  it('names the nearest allowed setting with every limit that another setting might meet', () => {
    const forbidden = map.settings.filter(({ findings }) => !isAllowed(findings));
    expect(forbidden.length).toBeGreaterThan(0);
    const allowed = map.settings.filter(({ findings }) => isAllowed(findings));
    for (const { findings } of forbidden) {
      for (const { severity, nearest } of findings) {
        if (severity !== 'limit') continue;
        expect(allowed.map((setting) => settingLabel(setting))).toContain(nearest);
      }
    }
  });

  it('as set, says that a control curve speaks for its own settings only', () => {
    const rows = [
      {
        thickness_mm: 200,
        potential_kV: 80,
        tubeCurrent_mA: 200,
        exposureTime_ms: 50,
        filter: 'none',
      },
    ];
    const [current] = c.techniques;
    const curved = { ...c, techniques: [{ ...current, control: { curve: 'room.csv', rows } }] };
    const { settings } = sweepPiece(curved, wholeRoom(curved, 'asSet'), 0);
    expect(settings.every(({ values }) => values === null)).toBe(true);
    expect(settings[0].findings[0].code).toBe('offControlCurve');
    const held = sweepPiece(curved, wholeRoom(curved, 'tubeLoad'), 0).settings;
    expect(held[0].values?.tubeLoad_mAs).toBeCloseTo(10, 9);
  });

  it('labels an investigational agent, and no other', () => {
    expect(map.investigationalAgent).toBeNull();
    const amount = { value: 10, unit: 'mg element/mL' };
    const gold = sampleCase({ ...coarse, task: { detail: { agent: { name: 'gold', amount } } } });
    expect(sweepPiece(gold.case, wholeRoom(gold.case), 0).investigationalAgent).toBe('gold');
  });

  it('holds what it was asked to hold', () => {
    for (const { values } of map.settings) {
      expect(values?.detectorAirKerma_uGy).toBeCloseTo(2.5, 9);
    }
  });
});

const paid = (setting: (typeof map.settings)[number], cost: keyof typeof costs): number =>
  (setting.values && costs[cost].of(setting.values)) ?? Number.POSITIVE_INFINITY;
