/**
 * How the stack is looked at. Azimuth turns the reader to the right of the cut face, elevation
 * lifts him above it. `oblique` 1 draws depth receding to the right and up while the cut face keeps
 * its true shape; it fades as the stack is turned.
 */
export interface View {
  readonly azimuth_deg: number;
  readonly elevation_deg: number;
  /** 1: as the section view is set. */
  readonly zoom: number;
  readonly oblique: number;
  /** Shift of the drawing on the page, px to the right and down. */
  readonly shift_px: readonly [number, number];
}

/** The view the desk's numbers are aligned with: the cut face in its true shape. */
export const sectionView: View = {
  azimuth_deg: 0,
  elevation_deg: 0,
  zoom: 1,
  oblique: 1,
  shift_px: [0, 0],
};

const limits = { azimuth_deg: 80, elevation_deg: [-30, 90], zoom: [0.4, 12] } as const;
/** Turned by so much, nothing is left of the oblique drawing. */
const obliqueReach_deg = 30;

const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));

/** The view turned by the given angles, the cut face staying in sight. */
export const turned = (view: View, azimuth_deg: number, elevation_deg: number): View => ({
  ...view,
  azimuth_deg: clamp(view.azimuth_deg + azimuth_deg, -limits.azimuth_deg, limits.azimuth_deg),
  elevation_deg: clamp(view.elevation_deg + elevation_deg, ...limits.elevation_deg),
});

/**
 * The view enlarged by a factor about a place on the page, given in px from the place about which
 * the drawing turns.
 */
export function zoomed(
  view: View,
  factor: number,
  about_px: readonly [number, number] = [0, 0],
): View {
  const zoom = clamp(view.zoom * factor, ...limits.zoom);
  const grown = zoom / view.zoom;
  const shift = (i: 0 | 1) => about_px[i] + (view.shift_px[i] - about_px[i]) * grown;
  return { ...view, zoom, shift_px: [shift(0), shift(1)] };
}

export const shifted = (view: View, right_px: number, down_px: number): View => ({
  ...view,
  shift_px: [view.shift_px[0] + right_px, view.shift_px[1] + down_px],
});

/** Share of the oblique drawing that is left in a turned view. */
export const obliqueShare = ({ oblique, azimuth_deg, elevation_deg }: View): number =>
  oblique * Math.max(0, 1 - Math.hypot(azimuth_deg, elevation_deg) / obliqueReach_deg);

/** True where the drawing lies as the numbers beside it expect. */
export const isSectionView = (view: View): boolean =>
  view.azimuth_deg === 0 &&
  view.elevation_deg === 0 &&
  view.zoom === 1 &&
  view.oblique === 1 &&
  view.shift_px[0] === 0 &&
  view.shift_px[1] === 0;

/** A view between two, `share` 0 to 1; zoom in equal ratios. */
export function viewBetween(from: View, to: View, share: number): View {
  const mix = (a: number, b: number) => a + (b - a) * share;
  if (share >= 1) return to;
  return {
    azimuth_deg: mix(from.azimuth_deg, to.azimuth_deg),
    elevation_deg: mix(from.elevation_deg, to.elevation_deg),
    zoom: from.zoom * (to.zoom / from.zoom) ** share,
    oblique: mix(from.oblique, to.oblique),
    shift_px: [mix(from.shift_px[0], to.shift_px[0]), mix(from.shift_px[1], to.shift_px[1])],
  };
}

/** The view in words: `from the front, oblique`, `from 30° right, 20° above, 1.4 times as large`. */
export function viewWords(view: View): string {
  const parts: string[] = [];
  const azimuth = Math.round(view.azimuth_deg);
  const elevation = Math.round(view.elevation_deg);
  if (azimuth !== 0) parts.push(`${Math.abs(azimuth)}° ${azimuth > 0 ? 'right' : 'left'}`);
  if (elevation !== 0) parts.push(`${Math.abs(elevation)}° ${elevation > 0 ? 'above' : 'below'}`);
  const from = parts.length > 0 ? `from ${parts.join(', ')}` : 'from the front';
  const drawn = parts.length === 0 && view.oblique > 0.5 ? ', oblique' : '';
  const size = Math.abs(view.zoom - 1) < 0.05 ? '' : `, ${view.zoom.toFixed(1)} times as large`;
  return `${from}${drawn}${size}`;
}
