/** Finds the interval of an ascending grid that holds an energy, in constant time. */
export interface Locator {
  readonly grid: Float64Array;
  readonly first: Int32Array;
}

const bins_per_keV = 10;

const made = new WeakMap<Float64Array, Locator>();

/** The locator of a grid, made once per grid. */
export function locatorOf(grid: Float64Array): Locator {
  let locator = made.get(grid);
  if (locator) return locator;
  const count = Math.ceil((grid[grid.length - 1] - grid[0]) * bins_per_keV) + 1;
  const first = new Int32Array(count);
  for (let bin = 0, i = 0; bin < count; bin++) {
    const energy = grid[0] + bin / bins_per_keV;
    while (i < grid.length - 2 && grid[i + 1] <= energy) i++;
    first[bin] = i;
  }
  locator = { grid, first };
  made.set(grid, locator);
  return locator;
}

/** Index i with grid[i] ≤ energy < grid[i + 1]; the first or last interval outside the grid. */
export function locate({ grid, first }: Locator, energy_keV: number): number {
  const bin = ((energy_keV - grid[0]) * bins_per_keV) | 0;
  let i = first[bin < 0 ? 0 : bin >= first.length ? first.length - 1 : bin];
  while (i < grid.length - 2 && grid[i + 1] <= energy_keV) i++;
  return i;
}
