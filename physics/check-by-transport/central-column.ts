import { fieldArea_cm2 } from '../dose/field-area.js';
import type { Stack } from '../stack/stack.js';
import type { TallyBox } from '../transport/index.js';

/** The column has this share of the field's width and height at each layer's mid-depth. */
const share = 1 / 4;

/** Boxes round the axis, one a layer, and the mass in each. */
export interface CentralColumn {
  readonly boxes: readonly TallyBox[];
  readonly masses_g: readonly number[];
}

/**
 * The middle of the field in every layer, a sixteenth of its area: what it receives is less than
 * the infinite-width average, which counts what scatters out of the field.
 */
export const centralColumn = (stack: Stack): CentralColumn => {
  const boxes: TallyBox[] = [];
  const masses_g: number[] = [];
  let depth_mm = 0;
  for (const { name, material, thickness_mm } of stack.layers) {
    const middle_mm = depth_mm + thickness_mm / 2;
    const spread =
      stack.beam === 'parallel'
        ? 1
        : (stack.sourceToSkin_mm + middle_mm) / stack.sourceToDetector_mm;
    const half_cm = (side_mm: number): number => (side_mm * spread * share) / 20;
    boxes.push({
      name,
      centre_cm: [0, 0, middle_mm / 10],
      half_cm: [half_cm(stack.field_mm[0]), half_cm(stack.field_mm[1]), thickness_mm / 20],
    });
    const area_cm2 = share * share * fieldArea_cm2(stack, stack.sourceToSkin_mm + middle_mm);
    masses_g.push((material.density_g_per_cm3 * thickness_mm * area_cm2) / 10);
    depth_mm += thickness_mm;
  }
  return { boxes, masses_g };
};
