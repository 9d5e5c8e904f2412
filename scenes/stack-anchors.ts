import { recede } from './page-scale.js';
import type { StackLayout, Stretch } from './stack-layout.js';

/**
 * Where things stand on the page in the section view, px from the drawing's top and left: what a
 * page needs to set numbers at the heights where they act.
 */
export interface StackAnchors {
  readonly width: number;
  readonly height: number;
  /** Of widths, and of lengths along the beam inside the patient. */
  readonly px_per_mm: number;
  /** x of the beam axis and of the sides of the cut face. */
  readonly axis: number;
  readonly left: number;
  readonly right: number;
  /** How far the body recedes to the right and up. */
  readonly recede: { readonly x: number; readonly y: number };
  readonly source: number;
  readonly filter: number;
  /** Where the free air above the patient is shortened; null where it is not. */
  readonly airBreak: number | null;
  readonly support: Stretch | null;
  readonly skin: number;
  readonly layers: readonly (Stretch & { readonly centre: number })[];
  readonly detail: number | null;
  readonly exit: number;
  readonly grid: Stretch | null;
  readonly detector: Stretch;
  /** Half width of the drawn beam at a height. */
  readonly halfWidthAt: (y: number) => number;
}

export function stackAnchors(layout: StackLayout): StackAnchors {
  const { px_per_mm, origin_px, body } = layout;
  const y = (drawn: number) => origin_px.y + drawn * px_per_mm;
  const band = ({ top, bottom }: Stretch): Stretch => ({ top: y(top), bottom: y(bottom) });
  const above = layout.shortened.find(({ at }) => at < layout.skin);
  const supports = layout.supportEntrance;
  return {
    width: layout.width_px,
    height: layout.height_px,
    px_per_mm,
    axis: origin_px.x,
    left: origin_px.x - body.halfWidth * px_per_mm,
    right: origin_px.x + body.halfWidth * px_per_mm,
    recede: {
      x: recede.right * body.depth * px_per_mm,
      y: recede.up * body.depth * px_per_mm,
    },
    source: y(0),
    filter: y((layout.filter.top + layout.filter.bottom) / 2),
    airBreak: above ? y(above.at) : null,
    support: supports.length > 0 ? band({ top: supports[0].top, bottom: layout.skin }) : null,
    skin: y(layout.skin),
    layers: layout.layers.map((layer) => ({
      ...band(layer),
      centre: y((layer.top + layer.bottom) / 2),
    })),
    detail: layout.detail === null ? null : y(layout.detail),
    exit: y(layout.exit),
    grid: layout.grid && band(layout.grid),
    detector: band(layout.detector),
    halfWidthAt: (height_px) =>
      layout.halfField((height_px - origin_px.y) / px_per_mm)[0] * px_per_mm,
  };
}
