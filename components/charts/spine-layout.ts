/**
 * Where along the page each thing in the beam stands. Depths in the patient are to scale; the air
 * from tube to support and from exit face to grid is drawn shortened. The same positions serve the
 * section drawing, the 3D view's first camera, and the numbers set beside the beam.
 */
export interface SpineInput {
  /** Height and width of the drawing in px. */
  readonly height: number;
  readonly width: number;
  /** Layers from entrance to exit, at the size shown. */
  readonly layers_mm: readonly number[];
  /** Depth of the detail's centre below the skin; null when it lies in no layer. */
  readonly detailDepth_mm: number | null;
}

export interface Band {
  readonly top: number;
  readonly bottom: number;
}

export interface SpineLayout {
  readonly height: number;
  readonly width: number;
  /** x of the beam axis, and of the patient's left and right edge. */
  readonly axis: number;
  readonly left: number;
  readonly right: number;
  /** How far the oblique top and side recede. */
  readonly recede: { readonly x: number; readonly y: number };
  readonly tube: number;
  readonly filter: number;
  /** Where the air is drawn shortened; null where it is not. */
  readonly airBreak: number | null;
  readonly support: Band;
  readonly patient: Band;
  readonly layers: readonly Band[];
  readonly detail: number | null;
  readonly grid: number;
  readonly detector: Band;
  readonly px_per_mm: number;
  /** Half-width of the drawn beam at a height y. */
  readonly halfWidth: (y: number) => number;
}

/** Shares of the drawing's height, from the focal spot down. */
const at = {
  tube: 0.03,
  filter: 0.12,
  airBreak: 0.19,
  support: 0.255,
  skin: 0.285,
  exit: 0.8,
  grid: 0.885,
  detector: 0.925,
};

export function spineLayout({ height, width, layers_mm, detailDepth_mm }: SpineInput): SpineLayout {
  const recede = { x: Math.round(width * 0.11), y: Math.round(width * 0.05) };
  const left = 12;
  const right = width - 12 - recede.x;
  const axis = (left + right) / 2;
  const y = (share: number) => Math.round(share * height);
  const patient = { top: y(at.skin), bottom: y(at.exit) };
  const total_mm = layers_mm.reduce((sum, thickness) => sum + thickness, 0);
  const px_per_mm = total_mm > 0 ? (patient.bottom - patient.top) / total_mm : 0;
  let depth = 0;
  const layers = layers_mm.map((thickness) => {
    const top = patient.top + depth * px_per_mm;
    depth += thickness;
    return { top, bottom: patient.top + depth * px_per_mm };
  });
  const tube = y(at.tube);
  const detectorTop = y(at.detector);
  const spread = ((right - left) / 2 - 8) / (detectorTop - tube);
  return {
    height,
    width,
    axis,
    left,
    right,
    recede,
    tube,
    filter: y(at.filter),
    airBreak: y(at.airBreak),
    support: { top: y(at.support), bottom: y(at.support) + 6 },
    patient,
    layers,
    detail: detailDepth_mm === null ? null : patient.top + detailDepth_mm * px_per_mm,
    grid: y(at.grid),
    detector: { top: detectorTop, bottom: detectorTop + 9 },
    px_per_mm,
    halfWidth: (height_px) => Math.max(0, (height_px - tube) * spread),
  };
}
