import type { StackScene } from '../../../scenes/stack-scene-data.js';
import { formatNumber } from '../../charts/format.js';

/** The drawing in a sentence or two: what stands in the beam and whose half is whose. */
export function stackWords(scene: StackScene): string {
  const layers = scene.layers.map(
    (layer) => `${layer.name} (${layer.material}, ${formatNumber(layer.thickness_mm)} mm)`,
  );
  const [current, proposed] = scene.techniques;
  const halves = proposed
    ? `${current.name} in the left half of the beam, ${proposed.name} in the right`
    : `${current.name} alone`;
  const detail = scene.detail
    ? ` Detail: ${scene.detail.label}, ${formatNumber(scene.detail.centreDepth_mm)} mm deep.`
    : '';
  return `Stack in the beam, cut open along the axis, from focal spot to detector: ${layers.join(', ')}.${detail} ${halves}.`;
}

export const keyWords =
  'Arrow keys turn the stack, with Shift they shift it; plus and minus zoom; 1 to 6 choose a view, 0 or Home goes back to the section. The figures are in the table below.';
