import type { Size } from '../case/schema.js';

/** The size to look at first: of those with the greatest weight, the middle one. */
export const usualSize = (sizes: readonly Size[]): Size => {
  const most = Math.max(...sizes.map(({ weight }) => weight));
  const heaviest = sizes.filter(({ weight }) => weight === most);
  return heaviest[Math.floor((heaviest.length - 1) / 2)];
};
