import { type AlongBeam, alongBeam } from './along-beam.js';
import { pageScale } from './page-scale.js';
import { faceDepths_mm, patientThickness_mm, type StackScene } from './stack-scene-data.js';

/** A stretch along the beam, in drawn mm below the focal spot. */
export interface Stretch {
  readonly top: number;
  readonly bottom: number;
}

/** Free air that is drawn shorter than it is, and where the drawing says so. */
export interface Shortened {
  readonly at: number;
  readonly length_mm: number;
  /** True length over drawn length. */
  readonly factor: number;
}

/**
 * Where everything stands. Lengths without a unit are drawn mm: true mm across the beam and in the
 * patient, shortened mm in free air, symbolic for what is too thin to see (filter, support, grid,
 * detector). Drawn mm become px by `px_per_mm`.
 */
export interface StackLayout {
  readonly width_px: number;
  readonly height_px: number;
  readonly px_per_mm: number;
  /** Place of the focal spot on the page, and x of the beam axis. */
  readonly origin_px: { readonly x: number; readonly y: number };
  readonly along: AlongBeam;
  /** Half width of the cut face; depth of the half body behind it. */
  readonly body: { readonly halfWidth: number; readonly depth: number };
  readonly filter: Stretch;
  readonly supportEntrance: readonly Stretch[];
  readonly layers: readonly Stretch[];
  readonly skin: number;
  readonly exit: number;
  readonly supportExit: readonly Stretch[];
  readonly detail: number | null;
  readonly grid: Stretch | null;
  readonly detector: Stretch;
  readonly shortened: readonly Shortened[];
  /** Half width and half height of the field at a drawn length. */
  readonly halfField: (drawn: number) => readonly [number, number];
}

/** Heights on paper, px, of what is too thin to be drawn to scale, and of the space above a grid. */
const paper = { filter: 7, support: 5, grid: 10, gridGap: 8, detector: 9 };
/** Places as shares: of the page, of the free air above, of the height left for free air. */
const shares = { source: 0.03, detector: 0.925, filter: 0.34, breakAbove: 0.62, gap: 0.42 };

/** Stacks slabs from `start` on, each at its thickness or at the least that can be seen. */
function stackUp(
  slabs: readonly { readonly thickness_mm: number }[],
  start: number,
  least: number,
): Stretch[] {
  let top = start;
  return slabs.map(({ thickness_mm }) => {
    const bottom = top + Math.max(thickness_mm, least);
    const stretch = { top, bottom };
    top = bottom;
    return stretch;
  });
}

const heightOf = (stretches: readonly Stretch[]): number =>
  stretches.length > 0 ? stretches[stretches.length - 1].bottom - stretches[0].top : 0;

const shorten = (at: number, drawn: number, length_mm: number): Shortened[] =>
  drawn < 0.98 * length_mm ? [{ at, length_mm, factor: length_mm / drawn }] : [];

/**
 * Fits the stack into a drawing of the given size: one scale for widths, patient and support, the
 * free air above and below taking what height is left.
 */
export function stackLayout(scene: StackScene, width_px: number, height_px: number): StackLayout {
  const { px_per_mm, body, widest, halfFieldAt, ...page } = pageScale(scene, width_px, height_px);
  const mm = (px: number) => px / px_per_mm;
  const thickness = patientThickness_mm(scene);
  const toSkin = scene.sourceToSkin_mm;
  const toExit = toSkin + thickness;
  const toDetector = Math.max(scene.sourceToDetector_mm, toExit);
  const sum = (slabs: StackScene['layers']) =>
    slabs.reduce((all, slab) => all + slab.thickness_mm, 0);
  const freeAbove = Math.max(0, toSkin - sum(scene.supportEntrance));
  const toFreeBelow = Math.min(toDetector, toExit + sum(scene.supportExit));
  const freeBelow = toDetector - toFreeBelow;

  const least = mm(paper.support);
  const entrance = heightOf(stackUp(scene.supportEntrance, 0, least));
  const behind = heightOf(stackUp(scene.supportExit, 0, least));
  const gridHeight = scene.grid ? mm(paper.grid + paper.gridGap) : 0;
  const spare = mm((shares.detector - shares.source) * height_px) - thickness - entrance - behind;
  const below = Math.max(gridHeight + mm(paper.gridGap), Math.min(freeBelow, shares.gap * spare));
  const above = Math.max(mm(paper.filter), Math.min(freeAbove, spare - below));

  const skin = above + entrance;
  const exit = skin + thickness;
  const detectorTop = exit + behind + below;
  const along = alongBeam([
    { distance_mm: 0, drawn_mm: 0 },
    { distance_mm: freeAbove, drawn_mm: above },
    { distance_mm: toSkin, drawn_mm: skin },
    { distance_mm: toExit, drawn_mm: exit },
    { distance_mm: toFreeBelow, drawn_mm: exit + behind },
    { distance_mm: toDetector, drawn_mm: detectorTop },
  ]);
  const gridBottom = detectorTop - mm(paper.gridGap);
  const faces = faceDepths_mm(scene).map((depth_mm) => skin + depth_mm);

  return {
    width_px,
    height_px,
    px_per_mm,
    origin_px: {
      x: (width_px - page.width_px) / 2 + widest * px_per_mm,
      y: shares.source * height_px + (px_per_mm * Math.max(0, spare - below - above)) / 2,
    },
    along,
    body,
    filter: { top: shares.filter * above, bottom: shares.filter * above + mm(paper.filter) },
    supportEntrance: stackUp(scene.supportEntrance, above, least),
    layers: scene.layers.map((_, i) => ({ top: faces[i], bottom: faces[i + 1] })),
    skin,
    exit,
    supportExit: stackUp(scene.supportExit, exit, least),
    detail: scene.detail && skin + scene.detail.centreDepth_mm,
    grid: scene.grid && { top: gridBottom - mm(paper.grid), bottom: gridBottom },
    detector: { top: detectorTop, bottom: detectorTop + mm(paper.detector) },
    shortened: [
      ...shorten(shares.breakAbove * above, above, freeAbove),
      ...shorten(exit + behind + shares.gap * (below - gridHeight), below, freeBelow),
    ],
    halfField: (drawn) => halfFieldAt(along.distanceAt(drawn)),
  };
}
