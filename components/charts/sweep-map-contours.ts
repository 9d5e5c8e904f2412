import { contours } from 'd3-contour';

/** Shares of the best figure of merit at which the ink gets darker. */
export const levels: readonly number[] = [0.5, 0.6, 0.7, 0.8, 0.9];

/** Ink in percent below the first level and above each: one hue, by density. */
const densities: readonly number[] = [5, 12, 20, 30, 42, 56];

/** The fill above level number `level` (0 is below all levels). */
export const levelFill = (level: number): string =>
  `color-mix(in oklab, var(--ink) ${densities[level]}%, var(--paper))`;

/** A region of one row in which the figure of merit is at least a level, as polygons in px. */
export interface LevelRegion {
  /** 1 for the first level. */
  readonly level: number;
  readonly path: string;
}

/** One filter is a line of values; drawn as a band it takes as many equal lines as contours need. */
const lines = 5;
/** Samples beside both ends, so that regions close outside what is drawn. */
const pad = 2;

/**
 * Filled contours of one filter's figure of merit along potential. Filters are discrete: nothing is
 * interpolated between them, so each band's contours run straight across it. A region may reach
 * beyond the band; the drawing clips it, and covers what has no value.
 *
 * @param shares figure of merit over the best, by potential; null where there is none: taken as its
 *   nearest neighbour's there.
 * @param x place of a potential by its index, also between two.
 * @param band top and bottom of the row.
 */
export const levelRegions = (
  shares: readonly (number | null)[],
  x: (index: number) => number,
  band: { readonly top: number; readonly bottom: number },
): LevelRegion[] => {
  const filled = withoutGaps(shares);
  if (filled.length === 0) return [];
  const ends = [filled[0], filled[filled.length - 1]];
  const line = [...Array(pad).fill(ends[0]), ...filled, ...Array(pad).fill(ends[1])];
  const values: number[] = Array.from({ length: lines }, () => line).flat();
  const perLine = (band.bottom - band.top) / (lines - 2);
  const made = contours()
    .size([line.length, lines])
    .thresholds([...levels])(values);
  return made.flatMap(({ coordinates }, i) => {
    const rings = coordinates.flat();
    if (rings.length === 0) return [];
    const path = rings
      .map((ring) => {
        const points = ring.map(
          ([cx, cy]) => `${round(x(cx - 0.5 - pad))},${round(band.top + (cy - 1) * perLine)}`,
        );
        return `M${points.join('L')}Z`;
      })
      .join('');
    return [{ level: i + 1, path }];
  });
};

/** Every gap filled with the value nearest to it, the lower one first; empty without any value. */
const withoutGaps = (shares: readonly (number | null)[]): number[] => {
  const known = shares.flatMap((share, i) => (share === null ? [] : [i]));
  if (known.length === 0) return [];
  return shares.map((share, i) => {
    const nearest = known.reduce((a, b) => (Math.abs(b - i) < Math.abs(a - i) ? b : a));
    return share ?? (shares[nearest] as number);
  });
};

const round = (value: number): number => Math.round(value * 10) / 10;
