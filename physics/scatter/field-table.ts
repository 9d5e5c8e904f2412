import { unpackDecimals } from '../../materials/packed-decimals.js';
import { airKermaAxes, type FieldAxes, fieldAxes, valueCount } from './field-axes.js';
import { fieldTable } from './tables/field-table.js';

/** Nodes of one axis in the variable it is interpolated in, and how to get there. */
interface Axis {
  readonly nodes: Float64Array;
  readonly from: (value: number) => number;
}

/** Logarithms of a table's values and the axes they stand on. */
interface LogTable {
  readonly values: Float64Array;
  readonly axes: readonly Axis[];
}

/**
 * Scatter seems to come from about 4 cm inside the slab: with this offset the table is nearly straight in
 * the logarithm of the gap. Taken over with the table's axes (2026-12-01), not fitted to any stack; it
 * changes values between the table's gaps only.
 */
const gapOffset_cm = 4;

const axis = (values: readonly number[], offset = 0): Axis => {
  const from = (value: number) => Math.log(value + offset);
  return { nodes: Float64Array.from(values, from), from };
};

const fieldTableAxes = (axes: FieldAxes): Axis[] => [
  axis(axes.energies_keV),
  axis(axes.thicknesses_cm),
  axis(axes.gaps_cm, gapOffset_cm),
  axis(axes.halfSides_cm),
];

interface FieldTables {
  readonly energy: LogTable;
  readonly airKerma: LogTable;
  readonly backscatter: LogTable;
}

let tables: FieldTables | null = null;

function fieldTables(): FieldTables {
  if (tables) return tables;
  const energyCount = valueCount(fieldAxes);
  const kermaCount = valueCount(airKermaAxes);
  const backscatterCount = fieldAxes.energies_keV.length * fieldAxes.halfSides_cm.length;
  const logs = (from: number, count: number) =>
    unpackDecimals(fieldTable, from, count).map(Math.log);
  tables = {
    energy: { values: logs(0, energyCount), axes: fieldTableAxes(fieldAxes) },
    airKerma: { values: logs(energyCount, kermaCount), axes: fieldTableAxes(airKermaAxes) },
    backscatter: {
      values: logs(energyCount + kermaCount, backscatterCount),
      axes: [axis(fieldAxes.energies_keV), axis(fieldAxes.halfSides_cm)],
    },
  };
  return tables;
}

/** A water slab, a gap behind it, and the half side of a square field at the detector. */
export interface WaterField {
  readonly thickness_cm: number;
  readonly gap_cm: number;
  readonly halfSide_cm: number;
}

/**
 * What a square field keeps of the multiple scatter of an infinite one, over what it keeps of
 * first-order Compton scatter, by energy or by air kerma: water slab, parallel beam. Linear in ln E,
 * ln t, ln(gap + 4 cm), ln a; end values held. tables/LEDGER.md says where it comes from.
 */
export const multipleFieldFactor = (
  quantity: 'energy' | 'airKerma',
  energy_keV: number,
  { thickness_cm, gap_cm, halfSide_cm }: WaterField,
): number => read(fieldTables()[quantity], [energy_keV, thickness_cm, gap_cm, halfSide_cm]);

/** What a square field on thick water keeps of the backscattered air kerma of an infinite one. */
export const backscatterFieldShare = (energy_keV: number, halfSide_cm: number): number =>
  read(fieldTables().backscatter, [energy_keV, halfSide_cm]);

const read = ({ values, axes }: LogTable, at: readonly number[]): number =>
  Math.exp(interpolate(values, axes, at));

function interpolate(
  values: Float64Array,
  axes: readonly Axis[],
  at: readonly number[],
  depth = 0,
  offset = 0,
): number {
  if (depth === axes.length) return values[offset];
  const { nodes, from } = axes[depth];
  const { low, share } = placeOn(nodes, from(at[depth]));
  const base = offset * nodes.length + low;
  const below = interpolate(values, axes, at, depth + 1, base);
  if (share === 0) return below;
  return below + share * (interpolate(values, axes, at, depth + 1, base + 1) - below);
}

function placeOn(nodes: Float64Array, value: number): { low: number; share: number } {
  const last = nodes.length - 1;
  if (!(value > nodes[0])) return { low: 0, share: 0 };
  if (value >= nodes[last]) return { low: last, share: 0 };
  let low = 0;
  while (nodes[low + 1] <= value) low++;
  return { low, share: (value - nodes[low]) / (nodes[low + 1] - nodes[low]) };
}
