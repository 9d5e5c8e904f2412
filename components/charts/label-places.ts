/** A place on a plot to be named, and the size of its name. */
export interface Named {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** Where a name goes: its left edge and its middle height. */
export interface LabelPlace {
  readonly x: number;
  readonly y: number;
}

interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Rough breadth of words in the plot's type; a guess that errs on the wide side. */
export const wordsWidth = (words: string): number => 6.6 * words.length;

const boxAt = (place: LabelPlace, { width, height }: Named): Box => ({
  left: place.x,
  right: place.x + width,
  top: place.y - height / 2,
  bottom: place.y + height / 2,
});

const overlap = (a: Box, b: Box): number =>
  Math.max(0, Math.min(a.right, b.right) - Math.max(a.left, b.left)) *
  Math.max(0, Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top));

const holds = (box: Box, { x, y }: { x: number; y: number }): boolean =>
  x > box.left - 2 && x < box.right + 2 && y > box.top - 1 && y < box.bottom + 1;

/**
 * Puts names beside their places, one after the other, where they cover least of each other, of
 * `points` (samples of lines and marks), and of what lies outside `frame`.
 */
export function placeLabels(
  named: readonly Named[],
  points: readonly { readonly x: number; readonly y: number }[],
  frame: Box,
): LabelPlace[] {
  const taken: Box[] = [];
  return named.map((label) => {
    const { x, y, width } = label;
    const sides = [x + 9, x - 9 - width];
    const heights = [12, -12, 0, 24, -24, 36, -36];
    const candidates = heights.flatMap((dy) =>
      sides.map((left): LabelPlace => ({ x: left, y: y + dy })),
    );
    const cost = (place: LabelPlace): number => {
      const box = boxAt(place, label);
      const outside =
        Math.max(0, frame.left - box.left) +
        Math.max(0, box.right - frame.right) +
        Math.max(0, frame.top - box.top) +
        Math.max(0, box.bottom - frame.bottom);
      const covered = taken.reduce((sum, other) => sum + overlap(box, other), 0);
      const crossed = points.filter((point) => holds(box, point)).length;
      return outside * 50 + covered * 10 + crossed * 9 + Math.abs(place.y - y) * 0.8;
    };
    const best = candidates.reduce((a, b) => (cost(b) < cost(a) ? b : a));
    taken.push(boxAt(best, label));
    return best;
  });
}
