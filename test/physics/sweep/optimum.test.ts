/**
 * Optimum potential for iodine and what copper does, in our own numbers: committed in
 * `sweep-optimum-iodine.csv` and `sweep-copper-70kV.csv`, with the shapes that the literature gives
 * (an optimum that rises with thickness and falls with copper, flat; a saving at the entrance that
 * saturates near 0.3 mm of copper while tube load climbs).
 */
import { describe, expect, it } from 'vitest';
import { readReference } from '../../reference/read-reference.js';
import {
  type CopperRow,
  copperTable,
  type Optimum,
  optimumTable,
  tableCosts,
  tableFilters,
  thicknesses_cm,
} from './optimum.js';

const optima = optimumTable();
const optimum = (cm: number, filter: string, cost: string): Optimum => {
  const found = optima.find(
    (row) => row.thickness_cm === cm && row.filter === filter && row.cost === cost,
  );
  if (!found) throw new Error(`${cm} cm, ${filter}, ${cost}: not in the table`);
  return found;
};

describe('the optimum potential for iodine behind water', () => {
  it('is the committed table, to the step of 1 kV that a flat maximum leaves open', () => {
    const committed = readReference('sweep-optimum-iodine.csv');
    expect(committed).toHaveLength(optima.length);
    for (const row of committed) {
      const own = optimum(Number(row.thickness_cm), row.filter, row.cost);
      for (const key of ['best_kV', 'from_kV', 'to_kV'] as const) {
        expect(
          Math.abs(own[key] - Number(row[key])),
          `${row.thickness_cm} cm, ${row.filter}`,
        ).toBeLessThanOrEqual(1);
      }
    }
  });

  it.each(tableFilters)('rises with thickness, filter %s', (filter) => {
    for (const cost of tableCosts) {
      const best = thicknesses_cm.map((cm) => optimum(cm, filter, cost).best_kV);
      expect(best).toEqual([...best].sort((a, b) => a - b));
      expect(best[best.length - 1]).toBeGreaterThan(best[0]);
    }
  });

  it.each(thicknesses_cm)('falls as copper is added, %d cm', (cm) => {
    for (const cost of tableCosts) {
      const best = tableFilters.map((filter) => optimum(cm, filter, cost).best_kV);
      expect(best).toEqual([...best].sort((a, b) => b - a));
      expect(best[0] - best[best.length - 1]).toBeGreaterThanOrEqual(7);
    }
  });

  it('is lower by energy imparted than by incident air kerma: which dose decides', () => {
    for (const cm of thicknesses_cm) {
      for (const filter of tableFilters) {
        expect(optimum(cm, filter, 'energyImparted').best_kV).toBeLessThan(
          optimum(cm, filter, 'incidentAirKerma').best_kV,
        );
      }
    }
  });

  it('is flat: without copper 90 % of it is kept over some 20 kV', () => {
    for (const cm of thicknesses_cm) {
      const widths = tableCosts.map((cost) => {
        const { from_kV, to_kV } = optimum(cm, 'none', cost);
        return to_kV - from_kV;
      });
      for (const width_kV of widths) {
        expect(width_kV).toBeGreaterThanOrEqual(14);
        expect(width_kV).toBeLessThanOrEqual(36);
      }
    }
    const { from_kV, to_kV } = optimum(10, 'none', 'incidentAirKerma');
    expect(Math.abs(to_kV - from_kV - 20)).toBeLessThanOrEqual(5);
  });
});

describe('copper at 70 kV behind 20 cm of water', () => {
  const rows = copperTable();
  const at = (copper_mm: number, hold: CopperRow['holdConstant']): CopperRow => {
    const found = rows.find((row) => row.copper_mm === copper_mm && row.holdConstant === hold);
    if (!found) throw new Error(`${copper_mm} mm, ${hold}: not in the table`);
    return found;
  };
  const equalSdnr = rows.filter(({ holdConstant }) => holdConstant === 'sdnr');

  it('is the committed table within 0.5 %', () => {
    for (const row of readReference('sweep-copper-70kV.csv')) {
      const own = at(Number(row.copper_mm), row.holdConstant as CopperRow['holdConstant']);
      for (const key of ['incidentAirKerma', 'energyImparted', 'tubeLoad', 'sdnr'] as const) {
        expect(
          Math.abs(own[key] / Number(row[key]) - 1),
          `${row.copper_mm} mm, ${key}`,
        ).toBeLessThan(0.005);
      }
    }
  });

  it('halves incident air kerma at 0.2 mm and equal SdNR (Martin 2007, read as abstract: about -50 %)', () => {
    expect(Math.abs(at(0.2, 'sdnr').incidentAirKerma - 0.5)).toBeLessThan(0.05);
  });

  it('saves less and less at equal SdNR: nine tenths of all it can by 0.3 mm', () => {
    const savings = equalSdnr.map(({ incidentAirKerma }) => 1 - incidentAirKerma);
    const most = Math.max(...savings);
    expect(1 - at(0.3, 'sdnr').incidentAirKerma).toBeGreaterThan(0.9 * most);
    expect(1 - at(0.2, 'sdnr').incidentAirKerma).toBeLessThan(0.9 * most);
    // From 0.3 to 0.9 mm: a few hundredths of kerma for several times the load.
    expect(at(0.3, 'sdnr').incidentAirKerma - at(0.9, 'sdnr').incidentAirKerma).toBeLessThan(0.05);
    expect(at(0.9, 'sdnr').tubeLoad / at(0.3, 'sdnr').tubeLoad).toBeGreaterThan(4);
  });

  it('makes tube load climb with every tenth of a millimetre', () => {
    for (const hold of ['sdnr', 'detectorAirKerma'] as const) {
      const loads = rows.filter(({ holdConstant }) => holdConstant === hold).map((r) => r.tubeLoad);
      expect(loads).toEqual([...loads].sort((a, b) => a - b));
    }
  });

  it('saves least energy imparted: never so much as incident air kerma, and less again beyond 0.3 mm', () => {
    for (const { energyImparted, incidentAirKerma } of equalSdnr) {
      expect(energyImparted).toBeGreaterThan(incidentAirKerma);
    }
    const least = Math.min(...equalSdnr.map(({ energyImparted }) => energyImparted));
    expect(at(0.3, 'sdnr').energyImparted).toBe(least);
  });

  it('hides a loss of SdNR at equal detector air kerma: 10 to 26 % from 0.3 to 0.9 mm', () => {
    expect(1 - at(0.3, 'detectorAirKerma').sdnr).toBeGreaterThan(0.1);
    expect(1 - at(0.9, 'detectorAirKerma').sdnr).toBeLessThan(0.26);
    for (const { copper_mm, incidentAirKerma } of equalSdnr) {
      expect(at(copper_mm, 'detectorAirKerma').incidentAirKerma).toBeLessThan(incidentAirKerma);
    }
  });
});
