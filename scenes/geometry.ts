/** A place in the drawing: x to the right, y up (the focal spot at 0), z toward the reader, drawn mm. */
export type Point = readonly [x: number, y: number, z: number];

/** Bounds of points along each axis. */
export function boundsOf(points: readonly (readonly [number, number])[]): {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
} {
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  return {
    left: Math.min(...xs),
    right: Math.max(...xs),
    top: Math.min(...ys),
    bottom: Math.max(...ys),
  };
}
