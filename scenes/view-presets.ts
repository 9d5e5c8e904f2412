import { boundsOf, type Point } from './geometry.js';
import { onPage, pivotOnPage, projection } from './projection.js';
import type { StackLayout } from './stack-layout.js';
import { sectionView, type View } from './view.js';

/** The views under the number keys, in their order. */
export const presetNames = [
  'section',
  'front',
  'right',
  'left',
  'along the beam',
  'detail',
] as const;
export type PresetName = (typeof presetNames)[number];

const angles: Record<Exclude<PresetName, 'section' | 'detail'>, readonly [number, number]> = {
  front: [0, 0],
  right: [38, 24],
  left: [-38, 24],
  'along the beam': [0, 90],
};

/** Space left round a fitted drawing, and the height of the detail's surroundings in the close view. */
const margin_px = 14;
const closeUp = 5;

/** Corners between which everything lies: source, filter, body, detector. */
function corners(layout: StackLayout): Point[] {
  const { halfWidth, depth } = layout.body;
  const [topX, topY] = layout.halfField(0);
  const [fieldX, fieldY] = layout.halfField(layout.detector.top);
  const box = (x: number, z: number, top: number, bottom: number): Point[] =>
    [-x, x].flatMap((px) => [0, -z].flatMap((pz) => [top, bottom].map((y): Point => [px, -y, pz])));
  return [
    ...box(topX, topY, 0, layout.filter.bottom),
    ...box(halfWidth, depth, layout.skin, layout.exit),
    ...box(
      Math.max(halfWidth, fieldX),
      Math.max(depth, fieldY),
      layout.detector.top,
      layout.detector.bottom,
    ),
  ];
}

/** The view from the given angles, as large as fits and in the middle of the page. */
function fitted(layout: StackLayout, azimuth_deg: number, elevation_deg: number): View {
  const plain: View = { ...sectionView, oblique: 0, azimuth_deg, elevation_deg };
  const bounds = boundsOf(corners(layout).map((point) => onPage(projection(plain, layout), point)));
  const zoom = Math.min(
    (layout.width_px - 2 * margin_px) / (bounds.right - bounds.left),
    (layout.height_px - 2 * margin_px) / (bounds.bottom - bounds.top),
    1.6,
  );
  const [pivotX, pivotY] = pivotOnPage(layout);
  const shift = (middle: number, pivot: number, page: number) =>
    page / 2 - pivot - (middle - pivot) * zoom;
  return {
    ...plain,
    zoom,
    shift_px: [
      shift((bounds.left + bounds.right) / 2, pivotX, layout.width_px),
      shift((bounds.top + bounds.bottom) / 2, pivotY, layout.height_px),
    ],
  };
}

/** The detail in the middle of the page, a few times its own size around it. */
function detailView(layout: StackLayout, size_mm: number): View {
  const zoom = Math.min(
    12,
    Math.max(2, layout.height_px / (closeUp * Math.max(size_mm, 1) * layout.px_per_mm)),
  );
  const enlarged: View = { ...sectionView, zoom };
  const [x, y] = onPage(projection(enlarged, layout), [0, -(layout.detail ?? layout.skin), 0]);
  return { ...enlarged, shift_px: [layout.width_px / 2 - x, layout.height_px / 2 - y] };
}

/** The named view of a layout; `detailSize_mm` is the greatest extent of the detail. */
export function presetView(name: PresetName, layout: StackLayout, detailSize_mm = 10): View {
  if (name === 'section') return sectionView;
  if (name === 'detail') return detailView(layout, detailSize_mm);
  return fitted(layout, ...angles[name]);
}
