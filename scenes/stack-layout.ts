import { type AlongBeam, alongBeam } from './along-beam.js';
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

/** How far a mm of depth recedes to the right and up in the oblique view. */
export const recede = { right: 0.38, up: 0.17 } as const;

/** Sizes on paper, px: margins, and what is too thin to be drawn to scale. */
const paper = {
  side: 12,
  detectorReach: 4,
  filter: 7,
  support: 5,
  grid: 10,
  gridGap: 8,
  detector: 9,
};
const shares = { source: 0.03, detector: 0.925, patient: 0.54, gap: 0.42, filter: 0.34, air: 0.62 };
/** How much wider than the field an unbounded body is drawn. */
const beyondField = 1.18;
const widestBody = 1.6;

/** Half extents of the body across the beam: its own where it is bounded, else by the field. */
function bodyHalves(scene: StackScene, atExit: readonly [number, number]): [number, number] {
  const half = (i: 0 | 1) => {
    const own = scene.lateral_mm?.[i];
    return own === undefined ? atExit[i] * beyondField : Math.min(own / 2, atExit[i] * widestBody);
  };
  return [half(0), half(1)];
}

/** Stacks slabs from `start` on, each at its thickness or at the least that can be seen. */
function stackUp(
  slabs: readonly { thickness_mm: number }[],
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

/**
 * Fits the stack into a drawing of the given size: one scale for widths and for the patient's
 * thickness, the free air taking what height is left.
 */
export function stackLayout(scene: StackScene, width_px: number, height_px: number): StackLayout {
  const thickness = patientThickness_mm(scene);
  const toSkin = scene.sourceToSkin_mm;
  const toDetector = Math.max(scene.sourceToDetector_mm, toSkin + thickness);
  const spread = (distance_mm: number) =>
    scene.beam === 'parallel' ? 1 : distance_mm / toDetector;
  const halfFieldAt = (distance_mm: number): [number, number] => [
    (scene.field_mm[0] / 2) * spread(distance_mm),
    (scene.field_mm[1] / 2) * spread(distance_mm),
  ];
  const [halfWidth, depth] = bodyHalves(scene, halfFieldAt(toSkin + thickness));
  const widest = Math.max(halfWidth, scene.field_mm[0] / 2);
  const deepest = Math.max(depth, scene.field_mm[1] / 2);

  const across_px = Math.max(40, width_px - 2 * (paper.side + paper.detectorReach));
  const px_per_mm = Math.min(
    across_px / (2 * widest + recede.right * deepest),
    (shares.patient * height_px) / thickness,
  );
  const mm = (px: number) => px / px_per_mm;

  const path = mm((shares.detector - shares.source) * height_px);
  const spare = path - thickness;
  const gap_mm = toDetector - toSkin - thickness;
  const exitLeast = scene.supportExit.length * mm(paper.support);
  const gapLeast =
    exitLeast + (scene.grid ? mm(2 * paper.grid + paper.gridGap) : mm(paper.gridGap));
  const gap = Math.max(gapLeast, Math.min(gap_mm, shares.gap * spare));
  const air = Math.max(mm(paper.filter), Math.min(toSkin, spare - gap));

  const skin = air;
  const exit = skin + thickness;
  const detectorTop = exit + gap;
  const along = alongBeam([
    { distance_mm: 0, drawn_mm: 0 },
    { distance_mm: toSkin, drawn_mm: skin },
    { distance_mm: toSkin + thickness, drawn_mm: exit },
    { distance_mm: Math.max(toDetector, toSkin + thickness + 1e-6), drawn_mm: detectorTop },
  ]);
  const supports = stackUp(scene.supportEntrance, 0, mm(paper.support));
  const supportHeight = supports.at(-1)?.bottom ?? 0;
  const entranceOffset = skin - supportHeight;
  const gridBottom = detectorTop - mm(paper.gridGap);
  const faces = faceDepths_mm(scene).map((depth_mm) => skin + depth_mm);
  const drawnWidth_px = (2 * widest + recede.right * deepest) * px_per_mm;
  const shorten = (at: number, drawn: number, length_mm: number): Shortened[] =>
    drawn < 0.98 * length_mm ? [{ at, length_mm, factor: length_mm / drawn }] : [];

  return {
    width_px,
    height_px,
    px_per_mm,
    origin_px: {
      x: (width_px - drawnWidth_px) / 2 + widest * px_per_mm,
      y: shares.source * height_px + (px_per_mm * (spare - gap - air)) / 2,
    },
    along,
    body: { halfWidth, depth },
    filter: { top: shares.filter * air, bottom: shares.filter * air + mm(paper.filter) },
    supportEntrance: supports.map(({ top, bottom }) => ({
      top: top + entranceOffset,
      bottom: bottom + entranceOffset,
    })),
    layers: scene.layers.map((_, i) => ({ top: faces[i], bottom: faces[i + 1] })),
    skin,
    exit,
    supportExit: stackUp(scene.supportExit, exit, mm(paper.support)),
    detail: scene.detail && skin + scene.detail.centreDepth_mm,
    grid: scene.grid && { top: gridBottom - mm(paper.grid), bottom: gridBottom },
    detector: { top: detectorTop, bottom: detectorTop + mm(paper.detector) },
    shortened: [
      ...shorten(shares.air * air, air, toSkin),
      ...shorten(
        exit + 0.42 * (gap - (scene.grid ? mm(paper.grid + paper.gridGap) : 0)),
        gap,
        gap_mm,
      ),
    ],
    halfField: (drawn) => halfFieldAt(along.distanceAt(drawn)),
  };
}
