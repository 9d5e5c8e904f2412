import type { MaterialFamily } from '../../materials/material.js';
import type { Point } from '../geometry.js';
import type { InkName } from '../inks.js';

/** A flat opaque convex face. Hatches lie in the plane of x and y: only cut faces carry one. */
export interface Face {
  readonly corners: readonly Point[];
  readonly fill: InkName;
  readonly hatch?: MaterialFamily;
  readonly hatchInk?: InkName;
  /** Drawn whatever stands in front of it. */
  readonly over?: boolean;
}

/** A flat convex face inked by the quantity shown, at the height where it lies. */
export interface Wash {
  readonly corners: readonly Point[];
  readonly technique: 0 | 1;
  /** Factor on the ink density. */
  readonly strength: number;
  /** False where the beam is not interrupted by break marks. */
  readonly breaks: boolean;
}

/** How a line is drawn. */
export interface Pen {
  readonly ink: InkName;
  readonly width_px: number;
  readonly opacity: number;
  /** Drawn and left out in px; a solid line without. */
  readonly dash?: readonly [number, number];
  /** Drawn whatever stands in front of it. */
  readonly over?: boolean;
}

/** A straight line; of no length: a disc of the pen's width. */
export interface Stroke {
  readonly from: Point;
  readonly to: Point;
  readonly pen: Pen;
}

/** What is to be seen, without a word about how it gets onto a screen. */
export interface Drawing {
  readonly faces: readonly Face[];
  readonly washes: readonly Wash[];
  readonly strokes: readonly Stroke[];
}

export const drawing = (parts: Partial<Drawing>): Drawing => ({
  faces: parts.faces ?? [],
  washes: parts.washes ?? [],
  strokes: parts.strokes ?? [],
});

export const joined = (drawings: readonly Drawing[]): Drawing => ({
  faces: drawings.flatMap((part) => part.faces),
  washes: drawings.flatMap((part) => part.washes),
  strokes: drawings.flatMap((part) => part.strokes),
});

/** The strokes without those that another already draws, from either end. */
export function withoutRepeats(strokes: readonly Stroke[]): Stroke[] {
  const seen = new Set<string>();
  return strokes.filter(({ from, to }) => {
    const ends = [from.join(), to.join()].sort().join(' ');
    return seen.size < seen.add(ends).size;
  });
}

/** Strokes through points in their order. */
export const polyline = (points: readonly Point[], pen: Pen): Stroke[] =>
  points.slice(1).map((to, i) => ({ from: points[i], to, pen }));
