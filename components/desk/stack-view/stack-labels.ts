import type { Point } from '../../../scenes/geometry.js';
import { onPage, projection } from '../../../scenes/projection.js';
import type { StackLayout } from '../../../scenes/stack-layout.js';
import type { StackScene } from '../../../scenes/stack-scene-data.js';
import type { View } from '../../../scenes/view.js';
import { formatEntry } from '../../charts/format.js';
import { placeAlong } from '../../charts/place-along.js';

/** A label on the page: its words, its left edge, top and width, and the place it speaks of, in px. */
export interface PlacedLabel {
  readonly id: string;
  readonly words: string;
  readonly left: number;
  readonly top: number;
  /** As the words are set, near enough. */
  readonly width: number;
  readonly anchor: readonly [number, number];
  /** True where a line must lead from the place to the label. */
  readonly leads: boolean;
}

interface Wish {
  readonly id: string;
  readonly words: string;
  readonly at: Point;
  /** Where the label's left edge and middle want to be, from the place. */
  readonly dx: number;
  readonly dy: number;
}

export const labelHeight_px = 17;
const indent_px = 6;
/** Moved further than this, a label needs a line to what it names. */
const own_px = 9;
/** Seen from above, layers lie behind one another and are not named. */
const leastTilt = 0.3;

/** Width of words as they are set, near enough to keep them on the page. */
const width_px = (words: string): number => 6.9 * words.length;

const millimetres = (length_mm: number): string =>
  `${formatEntry(Number(length_mm.toPrecision(4)))} mm`;

/** Names down the left edge of the cut face. */
function leftWishes(scene: StackScene, layout: StackLayout, tilt: number, zoom: number): Wish[] {
  const x = -layout.body.halfWidth;
  const scale = layout.px_per_mm * zoom * tilt;
  const wish = (id: string, words: string, drawn: number, dy: number): Wish => ({
    id,
    words,
    at: [x, -drawn, 0],
    dx: indent_px,
    dy,
  });
  const supports = scene.supportEntrance.map(
    (slab) => `${slab.material} ${millimetres(slab.thickness_mm)}`,
  );
  const layers = scene.layers.map((layer, i) => {
    const { top, bottom } = layout.layers[i];
    const words = `${layer.name}, ${layer.material} ${millimetres(layer.thickness_mm)}`;
    const roomy = (bottom - top) * scale > 2.4 * labelHeight_px;
    return roomy
      ? wish(`layer-${i}`, words, top, labelHeight_px * 0.8)
      : wish(`layer-${i}`, words, (top + bottom) / 2, 0);
  });
  const gap_mm = scene.sourceToDetector_mm - layout.along.distanceAt(layout.exit);
  const gap = `air gap ${millimetres(Math.max(0, gap_mm))}`;
  const behind = scene.grid ? `${scene.grid.label}, ${gap}` : gap;
  const toDetector = `${scene.detector.label}, ${millimetres(scene.sourceToDetector_mm)} from the focal spot`;
  return [
    ...(supports.length > 0
      ? [wish('support', supports.join(', '), layout.supportEntrance[0].top, -labelHeight_px * 0.6)]
      : []),
    ...layers,
    wish('gap', behind, layout.grid?.top ?? layout.detector.top, -labelHeight_px * 0.7),
    wish('detector', toDetector, layout.detector.bottom, labelHeight_px * 0.7),
  ];
}

/** Names to the right of the axis: shortened air and the detail. */
function rightWishes(scene: StackScene, layout: StackLayout): Wish[] {
  const air = layout.shortened
    .filter(({ at }) => at < layout.skin)
    .map(
      ({ at }): Wish => ({
        id: 'air',
        words: `${millimetres(scene.sourceToSkin_mm)} to the skin`,
        at: [layout.halfField(at)[0], -at, 0],
        dx: 18,
        dy: 0,
      }),
    );
  const { detail } = scene;
  if (!detail || layout.detail === null) return air;
  const breadth = detail.form === 'cylinder' ? detail.height_mm : detail.breadth_mm;
  return [
    ...air,
    { id: 'detail', words: detail.label, at: [breadth / 2, -layout.detail, 0], dx: 26, dy: 0 },
  ];
}

const isBeside = (a: PlacedLabel, b: PlacedLabel): boolean =>
  a.left + a.width <= b.left || b.left + b.width <= a.left;

/** Moves a label down past all it would stand on. */
function clear(label: PlacedLabel, others: readonly PlacedLabel[]): PlacedLabel {
  const inTheWay = others.filter((other) => !isBeside(label, other)).sort((a, b) => a.top - b.top);
  let { top } = label;
  for (const other of inTheWay) {
    if (top < other.top + labelHeight_px && other.top < top + labelHeight_px) {
      top = other.top + labelHeight_px;
    }
  }
  return top === label.top ? label : { ...label, top, leads: true };
}

/** Left edge of a label that wants to stand `dx` right of its place: left of it where the page ends. */
function leftEdge(x: number, dx: number, width: number, page: number): number {
  const fits = x + dx + width <= page;
  return Math.max(2, fits ? x + dx : Math.min(x - dx - width, page - width));
}

/** All labels of a view, none on another; those far from what they name lead there by a line. */
export function stackLabels(scene: StackScene, layout: StackLayout, view: View): PlacedLabel[] {
  const tilt = Math.cos((view.elevation_deg * Math.PI) / 180);
  if (tilt < leastTilt) return [];
  const p = projection(view, layout);
  const onColumn = (wishes: readonly Wish[]): PlacedLabel[] => {
    const placed = wishes
      .map((wish) => ({ ...wish, anchor: onPage(p, wish.at) }))
      .filter(
        ({ anchor: [x, y] }) =>
          x > -layout.width_px / 2 && x < layout.width_px && y > 0 && y < layout.height_px,
      )
      .sort((a, b) => a.anchor[1] + a.dy - b.anchor[1] - b.dy);
    const tops = placeAlong(
      placed.map(({ anchor, dy }) => ({ anchor: anchor[1] + dy, height: labelHeight_px })),
      0,
      layout.height_px,
    );
    return placed.map(({ id, words, anchor, dx, dy }, i) => {
      const moved = Math.abs(tops[i] + labelHeight_px / 2 - anchor[1] - dy) > own_px;
      const width = width_px(words);
      const left = leftEdge(anchor[0], dx, width, layout.width_px);
      return { id, words, anchor, left, width, top: tops[i], leads: moved || id === 'detail' };
    });
  };
  const labels = onColumn(leftWishes(scene, layout, tilt, view.zoom));
  for (const label of onColumn(rightWishes(scene, layout))) labels.push(clear(label, labels));
  return labels;
}
