/** Nodes of the field table: water slabs in parallel beams (see tables/LEDGER.md). */
export interface FieldAxes {
  readonly energies_keV: readonly number[];
  readonly thicknesses_cm: readonly number[];
  readonly gaps_cm: readonly number[];
  readonly halfSides_cm: readonly number[];
}

export const fieldAxes: FieldAxes = {
  energies_keV: [
    15, 17, 19, 21.5, 24, 27, 30, 34, 38, 42, 47, 52, 58, 65, 72, 80, 88, 98, 109, 121, 135, 150,
  ],
  thicknesses_cm: [1, 2, 3.5, 5, 7, 9, 11.5, 14, 17, 20, 24, 28, 33, 40],
  gaps_cm: [0, 2, 5, 10, 15, 20, 30, 45],
  halfSides_cm: [1, 2, 3.5, 5, 7.5, 10, 13, 17, 22, 30],
};

/** Air kerma is tabulated at every second energy and thickness, and at the last ones. */
const everySecond = (values: readonly number[]): number[] =>
  values.filter((_, i) => i % 2 === 0 || i === values.length - 1);

export const airKermaAxes: FieldAxes = {
  ...fieldAxes,
  energies_keV: everySecond(fieldAxes.energies_keV),
  thicknesses_cm: everySecond(fieldAxes.thicknesses_cm),
};

/** Values on a set of axes: energy-major, then thickness, gap, half side. */
export const valueCount = ({
  energies_keV,
  thicknesses_cm,
  gaps_cm,
  halfSides_cm,
}: FieldAxes): number =>
  energies_keV.length * thicknesses_cm.length * gaps_cm.length * halfSides_cm.length;
