import { massAttenuation } from '../../../materials/index.js';
import { type Estimated, scatterToPrimary } from '../../../physics/transport/index.js';
import { type ReferenceRow, readReference } from '../../reference/read-reference.js';
import { flyThrough, named, slabStack } from './slab-runs.js';

/** A computed row of scatter_spr.csv: a water or PMMA slab in contact, one energy. */
export interface ScatterRow {
  readonly item: string;
  readonly material: string;
  readonly thickness_cm: number;
  readonly field_cm: number;
  readonly energy_keV: number;
  readonly expected: number;
  readonly expectedByCount: number;
}

const pattern = /^SPR (\w+) (\d+) cm, (\d+)x\d+ cm, gap 0 cm, (\d+) keV$/;

export const scatterRows = (): ScatterRow[] =>
  readReference('scatter_spr.csv')
    .filter(({ set }) => set === 'SPR computed')
    .map(rowOf);

function rowOf({ item, value, conditions }: ReferenceRow): ScatterRow {
  const parts = pattern.exec(item);
  const byCount = /number ratio \(photon counting\) ([\d.]+)/.exec(conditions);
  if (!parts || !byCount) throw new Error(`scatter_spr.csv: ${item}: not understood`);
  return {
    item,
    material: parts[1],
    thickness_cm: Number(parts[2]),
    field_cm: Number(parts[3]),
    energy_keV: Number(parts[4]),
    expected: Number(value),
    expectedByCount: Number(byCount[1]),
  };
}

export interface FlownRow extends ScatterRow {
  readonly found: Estimated;
  readonly foundByCount: Estimated;
}

/**
 * Flies the slabs of the given rows, one run for all fields of a slab and energy; beyond four mean
 * free paths with more photons, as fewer and fewer come through.
 */
export function flyScatterRows(
  rows: readonly ScatterRow[],
  photons: number,
  seed: number,
): FlownRow[] {
  return slabGroups(rows).flatMap((group, i) => {
    const [{ material, thickness_cm, energy_keV }] = group;
    const widths_mm = group.map(({ field_cm }) => field_cm * 10);
    const slab = named(material);
    const depth = slab.density_g_per_cm3 * thickness_cm * massAttenuation(slab, energy_keV);
    const more = Math.max(1, Math.exp(1.4 * (depth - 4)));
    const run = { photons: Math.round(photons * more), seed: seed + i };
    const stack = slabStack([[slab, thickness_cm]]);
    const { input, scores } = flyThrough(stack, energy_keV, run, { fieldWidths_mm: widths_mm });
    const sorted = [...widths_mm].sort((a, b) => a - b);
    return group.map((row) => {
      const field = sorted.indexOf(row.field_cm * 10);
      return {
        ...row,
        found: scatterToPrimary(input, scores, { field }),
        foundByCount: scatterToPrimary(input, scores, { field, quantity: 'counts' }),
      };
    });
  });
}

function slabGroups(rows: readonly ScatterRow[]): ScatterRow[][] {
  const groups = new Map<string, ScatterRow[]>();
  for (const row of rows) {
    const slab = `${row.material} ${row.thickness_cm} ${row.energy_keV}`;
    groups.set(slab, [...(groups.get(slab) ?? []), row]);
  }
  return [...groups.values()];
}
