import type { Stack, StackLayer } from './stack/stack.js';

/** A stack whose layers are cut into thinner ones of the same matter. */
export interface CutStack {
  readonly stack: Stack;
  /** Depth of every face below the skin, from 0; one more than the pieces. */
  readonly faces_mm: readonly number[];
  /** Layer of the whole stack each piece belongs to. */
  readonly layerOf: readonly number[];
}

/** Cuts the patient into about `pieces` pieces of like thickness, one a layer at least. */
export const cutStack = (stack: Stack, pieces: number): CutStack => {
  const step_mm = stack.thickness_mm / pieces;
  const layerOf: number[] = [];
  const faces_mm = [0];
  const layers = stack.layers.flatMap((layer, index): StackLayer[] => {
    const count = Math.max(1, Math.round(layer.thickness_mm / step_mm));
    const piece: StackLayer = { ...layer, thickness_mm: layer.thickness_mm / count };
    for (let k = 0; k < count; k++) {
      layerOf.push(index);
      faces_mm.push(faces_mm[faces_mm.length - 1] + piece.thickness_mm);
    }
    return Array.from({ length: count }, () => piece);
  });
  return { stack: { ...stack, layers }, faces_mm, layerOf };
};
