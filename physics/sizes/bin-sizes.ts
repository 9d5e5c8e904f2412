import type { Size } from '../case/schema.js';

/** A thickness as it came in, and how many patients it stands for. */
export interface Counted {
  readonly thickness_mm: number;
  readonly weight: number;
}

/** Bin widths worth offering. */
const widths_mm: readonly number[] = [5, 10, 20, 25, 50, 100, 200, 500];

/**
 * A size mix from counted thicknesses: each thickness a size of its own while there are few, else
 * bins of one width, the narrowest that leaves at most `most` of them. A bin stands at the weighted
 * mean of its patients and carries their weight; weight is conserved.
 */
export const binSizes = (
  counted: readonly Counted[],
  most = 12,
): { readonly sizes: readonly Size[]; readonly width_mm: number | null } => {
  const alone = gathered(counted, (mm) => mm);
  if (alone.length <= most) return { sizes: alone, width_mm: null };
  for (const width_mm of widths_mm) {
    const sizes = gathered(counted, (mm) => Math.floor(mm / width_mm));
    if (sizes.length <= most) return { sizes, width_mm };
  }
  return { sizes: gathered(counted, () => 0), width_mm: null };
};

/** Thicknesses with the same key made one size, ascending, each named by its thickness. */
const gathered = (counted: readonly Counted[], keyOf: (mm: number) => number): Size[] => {
  const bins = new Map<number, { weight: number; moment: number }>();
  for (const { thickness_mm, weight } of counted) {
    if (!(weight > 0)) continue;
    const bin = bins.get(keyOf(thickness_mm)) ?? { weight: 0, moment: 0 };
    bin.weight += weight;
    bin.moment += weight * thickness_mm;
    bins.set(keyOf(thickness_mm), bin);
  }
  return [...bins.values()]
    .map(({ weight, moment }) => {
      const thickness_mm = Number((moment / weight).toFixed(1));
      return { name: `${thickness_mm} mm`, thickness_mm, weight };
    })
    .sort((a, b) => a.thickness_mm - b.thickness_mm);
};
