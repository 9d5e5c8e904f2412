import type { Layer } from '../case/schema.js';

/** Thickness of the layers as drawn, mm. */
export const drawnThickness_mm = (layers: readonly Layer[]): number =>
  layers.reduce((sum, layer) => sum + layer.thickness_mm, 0);

/**
 * Share of a change in size that each layer takes; the shares sum to 1.
 *
 * Layers without an entered share divide what the entered ones leave in proportion to their
 * thickness, so with no share entered the whole patient scales.
 *
 * @returns null when the entered shares cannot sum to 1: more than 1, or less with no layer left to
 * take the rest.
 */
export const growthShares = (layers: readonly Layer[]): number[] | null => {
  const entered = layers.reduce((sum, layer) => sum + (layer.growthShare ?? 0), 0);
  const open_mm = layers.reduce(
    (sum, layer) => sum + (layer.growthShare === null ? layer.thickness_mm : 0),
    0,
  );
  const rest = 1 - entered;
  if (rest < -1e-6 || (rest > 1e-6 && open_mm === 0)) return null;
  return layers.map(
    (layer) => layer.growthShare ?? (Math.max(0, rest) * layer.thickness_mm) / open_mm,
  );
};

/**
 * Layer thicknesses at patient thickness T: tᵢ(T) = tᵢ + gᵢ (T − Σt), in mm, in layer order.
 * A layer may come out at or below zero where T is far below the drawing: the caller refuses it.
 */
export const grownThicknesses_mm = (
  layers: readonly Layer[],
  shares: readonly number[],
  thickness_mm: number,
): number[] => {
  const change_mm = thickness_mm - drawnThickness_mm(layers);
  return layers.map((layer, i) => layer.thickness_mm + shares[i] * change_mm);
};
