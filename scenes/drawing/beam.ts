import type { Point } from '../geometry.js';
import { techniqueInkName } from '../inks.js';
import type { StackLayout } from '../stack-layout.js';
import type { Shading, StackScene } from '../stack-scene-data.js';
import { type Drawing, drawing, type Pen, type Stroke, type Wash } from './drawing.js';

/** Off the faces they lie on, so that washes are not lost in them. */
export const lift_mm = 0.05;
/** Ink of the sides and back of the beam, seen through its cut face. */
const behind = 0.22;
const footprint = 0.7;
/** Photon paths are to be read against a lighter beam. */
const underTracks = 0.45;

export const halves = [
  { side: -1, technique: 0 },
  { side: 1, technique: 1 },
] as const;

/** The technique that owns a half: both halves are the first's when it stands alone. */
export const ownerOf = (scene: StackScene, technique: 0 | 1): 0 | 1 =>
  scene.techniques.length > 1 ? technique : 0;

const ray = (technique: 0 | 1, opacity: number): Pen => ({
  ink: techniqueInkName(technique),
  width_px: 1,
  opacity,
  dash: technique === 0 ? undefined : [7, 4],
});

/** Lengths at which the drawn beam bends, from focal spot to detector. */
const bends = ({ along, detector }: StackLayout): number[] => [
  ...along.knots.map((knot) => knot.drawn_mm).filter((drawn) => drawn < detector.top),
  detector.top,
];

/** The sides of one half of the beam between two lengths: back, outer side, cut face. */
function sidesOf(
  layout: StackLayout,
  side: -1 | 1,
  technique: 0 | 1,
  top: number,
  bottom: number,
): Wash[] {
  const [x0, z0] = layout.halfField(top);
  const [x1, z1] = layout.halfField(bottom);
  const at = (x: number, drawn: number, z: number): Point => [side * x, -drawn, z];
  const wash = (strength: number, ...corners: Point[]): Wash => ({
    corners,
    technique,
    strength,
    breaks: true,
  });
  return [
    wash(behind, at(0, top, -z0), at(x0, top, -z0), at(x1, bottom, -z1), at(0, bottom, -z1)),
    wash(behind, at(x0, top, 0), at(x0, top, -z0), at(x1, bottom, -z1), at(x1, bottom, 0)),
    wash(
      1,
      at(0, top, lift_mm),
      at(x0, top, lift_mm),
      at(x1, bottom, lift_mm),
      at(0, bottom, lift_mm),
    ),
  ];
}

/** Where one half of the field falls on a face that lies across the beam. */
function footprintOn(layout: StackLayout, side: -1 | 1, technique: 0 | 1, drawn: number): Wash {
  const [x, z] = layout.halfField(drawn);
  const y = -drawn + lift_mm;
  return {
    corners: [
      [0, y, 0],
      [side * x, y, 0],
      [side * x, y, -z],
      [0, y, -z],
    ],
    technique,
    strength: footprint,
    breaks: false,
  };
}

/** Outer edges of one half: the rays that bound it, in its technique's line. */
function raysOf(
  layout: StackLayout,
  side: -1 | 1,
  technique: 0 | 1,
  lengths: readonly number[],
): Stroke[] {
  return lengths.slice(1).flatMap((bottom, i) => {
    const top = lengths[i];
    const [x0, z0] = layout.halfField(top);
    const [x1, z1] = layout.halfField(bottom);
    const stroke = (za: number, zb: number, pen: Pen): Stroke => ({
      from: [side * x0, -top, za],
      to: [side * x1, -bottom, zb],
      pen,
    });
    return [stroke(lift_mm, lift_mm, ray(technique, 0.75)), stroke(-z0, -z1, ray(technique, 0.3))];
  });
}

/** The whole cut face of the patient on one side of the axis. */
function cutHalf(layout: StackLayout, side: -1 | 1, technique: 0 | 1): Wash {
  const x = side * layout.body.halfWidth;
  return {
    corners: [
      [0, -layout.skin, lift_mm],
      [x, -layout.skin, lift_mm],
      [x, -layout.exit, lift_mm],
      [0, -layout.exit, lift_mm],
    ],
    technique,
    strength: 1,
    breaks: false,
  };
}

/**
 * The beam from focal spot to detector, split down the middle, inked by the quantity shown; where
 * that fills the patient's cut face the beam itself stays an outline.
 */
export function beamDrawing(scene: StackScene, layout: StackLayout, shading: Shading): Drawing {
  const lengths = bends(layout);
  const entrance = layout.supportEntrance[0]?.top ?? layout.skin;
  const shade = scene.tracks ? underTracks : 1;
  const washes = halves.flatMap(({ side, technique }): Wash[] => {
    const owner = ownerOf(scene, technique);
    if (shading.extent === 'body') return [cutHalf(layout, side, owner)];
    return [
      ...lengths.slice(1).flatMap((bottom, i) => sidesOf(layout, side, owner, lengths[i], bottom)),
      footprintOn(layout, side, owner, entrance),
      footprintOn(layout, side, owner, layout.detector.top),
    ];
  });
  const axis: Stroke = {
    from: [0, 0, 2 * lift_mm],
    to: [0, -layout.detector.top, 2 * lift_mm],
    pen: { ink: 'paper', width_px: 1.4, opacity: 0.9 },
  };
  return drawing({
    washes: washes.map((wash) => ({ ...wash, strength: wash.strength * shade })),
    strokes: [
      axis,
      ...halves.flatMap(({ side, technique }) =>
        raysOf(layout, side, ownerOf(scene, technique), lengths),
      ),
    ],
  });
}
