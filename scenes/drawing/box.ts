import type { MaterialFamily } from '../../materials/material.js';
import type { Point } from '../geometry.js';
import type { InkName } from '../inks.js';
import { type Drawing, drawing, type Face, type Pen, type Stroke } from './drawing.js';

/** A block: x from left to right, drawn length from top to bottom, from the cut face z = 0 back. */
export interface Block {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly depth: number;
}

export interface BlockStyle {
  readonly front: InkName;
  readonly hatch?: MaterialFamily;
  readonly hatchInk?: InkName;
  readonly side: InkName;
  readonly above: InkName;
  /** Edges of the cut face, and the others. */
  readonly frontPen: Pen;
  readonly backPen: Pen;
}

/** The eight corners: front then back, each left top, right top, right bottom, left bottom. */
export function blockCorners({ left, right, top, bottom, depth }: Block): Point[] {
  return [0, -depth].flatMap((z): Point[] => [
    [left, -top, z],
    [right, -top, z],
    [right, -bottom, z],
    [left, -bottom, z],
  ]);
}

/** A block cut open at the front: the cut face hatched, the others plain, all edges drawn. */
export function blockDrawing(block: Block, style: BlockStyle): Drawing {
  const c = blockCorners(block);
  const plain = (fill: InkName, ...corners: number[]): Face => ({
    corners: corners.map((i) => c[i]),
    fill,
  });
  const edge = (pen: Pen, from: number, to: number): Stroke => ({ from: c[from], to: c[to], pen });
  return drawing({
    faces: [
      { ...plain(style.front, 0, 1, 2, 3), hatch: style.hatch, hatchInk: style.hatchInk },
      plain(style.side, 4, 5, 6, 7),
      plain(style.side, 1, 5, 6, 2),
      plain(style.side, 0, 4, 7, 3),
      plain(style.above, 0, 1, 5, 4),
      plain(style.side, 3, 2, 6, 7),
    ],
    strokes: [
      ...[0, 1, 2, 3].map((i) => edge(style.frontPen, i, (i + 1) % 4)),
      ...[0, 1, 2, 3].map((i) => edge(style.backPen, 4 + i, 4 + ((i + 1) % 4))),
      ...[0, 1, 2, 3].map((i) => edge(style.backPen, i, 4 + i)),
    ],
  });
}
