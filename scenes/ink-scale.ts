import type { DepthProfile, Shading } from './stack-scene-data.js';

/** Ink of the greatest value, and the least that still shows as a tint. */
const darkest = 0.62;
const lightest = 0.05;
/** The greatest value in the patient is not full ink: the air above it goes on darkening. */
const headroom = 2;
const mostDecades = 8;

/**
 * What ink means in a drawing. Ink density is linear in the value, or in its logarithm, between
 * `least` and `most`; beyond them it stays.
 */
export interface InkScale {
  readonly scale: 'log' | 'linear';
  readonly least: number;
  readonly most: number;
  readonly density: (value: number) => number;
}

/** Value of a profile at a depth; null outside it. Between points in equal ratios where both are positive. */
export function valueAt({ depths_mm, values }: DepthProfile, depth_mm: number): number | null {
  const last = depths_mm.length - 1;
  if (last < 0 || !(depth_mm >= depths_mm[0] && depth_mm <= depths_mm[last])) return null;
  let i = 1;
  while (i < last && depth_mm > depths_mm[i]) i += 1;
  if (last === 0) return values[0];
  const run = depths_mm[i] - depths_mm[i - 1];
  const share = run > 0 ? (depth_mm - depths_mm[i - 1]) / run : 1;
  const [a, b] = [values[i - 1], values[i]];
  return a > 0 && b > 0 ? a * (b / a) ** share : a + (b - a) * share;
}

/** Values of all techniques from the skin on; those above it only darken further. */
function valuesBelowSkin({ perTechnique }: Shading): number[] {
  return perTechnique.flatMap((profile) => {
    if (!profile) return [];
    const all = Array.from(profile.values).filter(
      (value, i) => profile.depths_mm[i] >= 0 && Number.isFinite(value),
    );
    const atSkin = valueAt(profile, 0);
    return atSkin === null ? all : [atSkin, ...all];
  });
}

/** The scale that shows all values from skin to detector, the same for every technique. */
export function inkScale(shading: Shading): InkScale {
  const values = valuesBelowSkin(shading);
  if (shading.scale === 'linear') {
    const most = Math.max(0, ...values);
    const density = (value: number) =>
      most > 0 && value > 0 ? lightest + (darkest - lightest) * Math.min(1, value / most) : 0;
    return { scale: 'linear', least: 0, most, density };
  }
  const positive = values.filter((value) => value > 0);
  if (positive.length === 0) return { scale: 'log', least: 0, most: 0, density: () => 0 };
  const most = headroom * Math.max(...positive);
  const least = Math.max(Math.min(...positive), most * 10 ** -mostDecades);
  const decades = Math.log10(most / least);
  const density = (value: number) => {
    if (!(value > 0)) return 0;
    const share = 1 + Math.log10(value / most) / decades;
    return lightest + (darkest - lightest) * Math.min(1, Math.max(0, share));
  };
  return { scale: 'log', least, most, density };
}

/** Values to mark on a legend: powers of ten, or quarters of a linear scale. */
export function inkTicks({ scale, least, most }: InkScale): number[] {
  if (!(most > 0)) return [];
  if (scale === 'linear') return [0, most / 2, most];
  const first = Math.ceil(Math.log10(least) - 1e-9);
  const last = Math.floor(Math.log10(most) + 1e-9);
  const step = Math.max(1, Math.ceil((last - first) / 4));
  const ticks: number[] = [];
  for (let power = last; power >= first; power -= step) ticks.unshift(10 ** power);
  return ticks;
}
