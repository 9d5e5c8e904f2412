import type { Point } from './geometry.js';
import { recede } from './page-scale.js';
import type { StackLayout } from './stack-layout.js';
import { obliqueShare, type View } from './view.js';

/**
 * Parallel projection of the drawing: page px (x right, y down) and nearness (greater is nearer)
 * are affine in the point. Each row holds the factors of x, y, z and a constant.
 */
export interface Projection {
  readonly x: readonly [number, number, number, number];
  readonly y: readonly [number, number, number, number];
  readonly near: readonly [number, number, number, number];
}

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** The place the drawing turns about: on the axis, in the middle of the patient. */
export const pivotOf = ({ skin, exit }: StackLayout): Point => [0, -(skin + exit) / 2, 0];

/** Where the pivot stands on the page while the view is not shifted. */
export const pivotOnPage = (layout: StackLayout): readonly [number, number] => [
  layout.origin_px.x,
  layout.origin_px.y + layout.px_per_mm * ((layout.skin + layout.exit) / 2),
];

/** How a view of a layout puts points on the page. In the section view y is linear along the beam. */
export function projection(view: View, layout: StackLayout): Projection {
  const a = radians(view.azimuth_deg);
  const e = radians(view.elevation_deg);
  const share = obliqueShare(view);
  const scale = layout.px_per_mm * view.zoom;
  // Turned about the beam, then tilted; toward is the direction to the reader.
  const toward = [Math.sin(a), 0, Math.cos(a)];
  const right = [
    Math.cos(a) - share * recede.right * toward[0],
    0,
    -Math.sin(a) - share * recede.right * toward[2],
  ];
  const lift = Math.sin(e) + share * recede.up;
  const up = [-lift * toward[0], Math.cos(e), -lift * toward[2]];
  const near = [Math.cos(e) * toward[0], Math.sin(e), Math.cos(e) * toward[2]];
  const pivot = pivotOf(layout);
  const [pageX, pageY] = pivotOnPage(layout);
  const along = (row: readonly number[]) =>
    row[0] * pivot[0] + row[1] * pivot[1] + row[2] * pivot[2];
  return {
    x: [
      scale * right[0],
      scale * right[1],
      scale * right[2],
      pageX + view.shift_px[0] - scale * along(right),
    ],
    y: [
      -scale * up[0],
      -scale * up[1],
      -scale * up[2],
      pageY + view.shift_px[1] + scale * along(up),
    ],
    near: [near[0], near[1], near[2], -along(near)],
  };
}

const onRow = (row: readonly number[], [x, y, z]: Point): number =>
  row[0] * x + row[1] * y + row[2] * z + row[3];

/** Page px of a point. */
export const onPage = (p: Projection, point: Point): [number, number] => [
  onRow(p.x, point),
  onRow(p.y, point),
];

/**
 * The projection as a column-major clip matrix for a page of the given size. `reach_mm` is how far
 * from the pivot anything may lie toward or away from the reader.
 */
export function clipMatrix(
  p: Projection,
  width_px: number,
  height_px: number,
  reach_mm: number,
): number[] {
  const x = p.x.map((value, i) => (2 * value) / width_px - (i === 3 ? 1 : 0));
  const y = p.y.map((value, i) => (i === 3 ? 1 : 0) - (2 * value) / height_px);
  const z = p.near.map((value) => -value / reach_mm);
  return [x[0], y[0], z[0], 0, x[1], y[1], z[1], 0, x[2], y[2], z[2], 0, x[3], y[3], z[3], 1];
}
