import type { StackAnchors } from '../../../scenes/stack-anchors.js';
import type { SpineLayout } from '../../charts/spine-layout.js';

/** The places of the 3D drawing in the words of the section drawing, so that both lie alike. */
export const spineOf = (at: StackAnchors): SpineLayout => ({
  height: at.height,
  width: at.width,
  axis: at.axis,
  left: at.left,
  right: at.right,
  recede: at.recede,
  tube: at.source,
  filter: at.filter,
  airBreak: at.airBreak ?? (at.source + at.skin) / 2,
  support: at.support ?? { top: at.skin, bottom: at.skin },
  patient: { top: at.skin, bottom: at.exit },
  layers: at.layers,
  detail: at.detail,
  grid: at.grid?.top ?? at.detector.top,
  detector: at.detector,
  px_per_mm: at.px_per_mm,
  halfWidth: at.halfWidthAt,
});
