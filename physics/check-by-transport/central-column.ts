import { fieldArea_cm2 } from '../dose/field-area.js';
import type { Stack } from '../stack/stack.js';
import { layoutOf } from '../transport/batch.js';
import {
  type Estimated,
  estimated,
  type TallyBox,
  type TransportInput,
  type TransportScores,
} from '../transport/index.js';

/** The column has this share of the field's width and height all the way. */
const share = 1 / 4;
/** Boxes have straight sides: thin ones follow the beam as it widens. */
const thickest_mm = 30;

/** The middle of the field in every layer. */
export interface CentralColumn {
  readonly boxes: readonly TallyBox[];
  readonly layers: readonly ColumnPart[];
}

/** The part of the column in one layer: its boxes, from one to before another, and its mass. */
export interface ColumnPart {
  readonly from: number;
  readonly to: number;
  readonly mass_g: number;
}

/**
 * The middle of the field in every layer, a sixteenth of its area: what it receives is less than
 * the infinite-width average, which counts what scatters out of the field.
 */
export const centralColumn = (stack: Stack): CentralColumn => {
  const boxes: TallyBox[] = [];
  let depth_mm = 0;
  const layers = stack.layers.map(({ name, material, thickness_mm }): ColumnPart => {
    const from = boxes.length;
    const count = Math.max(1, Math.ceil(thickness_mm / thickest_mm));
    const height_mm = thickness_mm / count;
    let mass_g = 0;
    for (let piece = 0; piece < count; piece++, depth_mm += height_mm) {
      const middle_mm = depth_mm + height_mm / 2;
      const area_cm2 = share * share * fieldArea_cm2(stack, stack.sourceToSkin_mm + middle_mm);
      const aspect = Math.sqrt(stack.field_mm[0] / stack.field_mm[1]);
      const half_cm = Math.sqrt(area_cm2) / 2;
      boxes.push({
        name,
        centre_cm: [0, 0, middle_mm / 10],
        half_cm: [half_cm * aspect, half_cm / aspect, height_mm / 20],
      });
      mass_g += (material.density_g_per_cm3 * height_mm * area_cm2) / 10;
    }
    return { from, to: boxes.length, mass_g };
  });
  return { boxes, layers };
};

/** Energy absorbed in a part of the column per emitted photon, keV. */
export const columnEnergy_keV = (
  input: TransportInput,
  scores: TransportScores,
  { from, to }: ColumnPart,
): Estimated => {
  const { boxes } = layoutOf(input);
  return estimated(scores, (batch) =>
    batch.subarray(boxes + from, boxes + to).reduce((sum, energy) => sum + energy, 0),
  );
};
