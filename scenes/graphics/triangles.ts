import type { Point } from '../geometry.js';

/** Triangles of convex faces as a fan from each first corner: positions, and the face of each vertex. */
export function triangles(faces: readonly { readonly corners: readonly Point[] }[]): {
  readonly positions: Float32Array;
  readonly faceOf: Uint16Array;
} {
  const positions: number[] = [];
  const faceOf: number[] = [];
  faces.forEach(({ corners }, face) => {
    for (let i = 2; i < corners.length; i += 1) {
      positions.push(...corners[0], ...corners[i - 1], ...corners[i]);
      faceOf.push(face, face, face);
    }
  });
  return { positions: Float32Array.from(positions), faceOf: Uint16Array.from(faceOf) };
}
