import type { StackAnchors } from '../../../scenes/stack-anchors.js';
import type { SpineLayout } from '../../charts/spine-layout.js';

/** Where the layer view's section stands, in the terms of the spine's drawing, labels and rows. */
export const spineOfScene = (anchors: StackAnchors): SpineLayout => ({
  height: anchors.height,
  width: anchors.width,
  axis: anchors.axis,
  left: anchors.left,
  right: anchors.right,
  recede: anchors.recede,
  tube: anchors.source,
  filter: anchors.filter,
  airBreak: anchors.airBreak,
  support: anchors.support ?? { top: anchors.skin, bottom: anchors.skin },
  patient: { top: anchors.skin, bottom: anchors.exit },
  layers: anchors.layers,
  detail: anchors.detail,
  grid: anchors.grid?.top ?? anchors.detector.top - 16,
  detector: anchors.detector,
  px_per_mm: anchors.px_per_mm,
  halfWidth: anchors.halfWidthAt,
});
