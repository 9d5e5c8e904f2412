import { escapeCount } from './kernel.js';
import { quantityCount } from './response-table.js';

/** Scatter by what the photon went through: one Compton, one Rayleigh, anything else. */
export const components = ['firstCompton', 'firstRayleigh', 'multiple'] as const;
export const componentCount = components.length;

/**
 * Where the scores of a batch stand in its one array: scatter by gap, field, component, quantity;
 * scattered air kerma at the skin by field; absorbed energy by region; escaped energy; emitted energy; boxes.
 * Fields are nested; the last one is infinite.
 */
export interface ScoreLayout {
  readonly gaps: number;
  readonly fields: number;
  readonly backscatter: number;
  readonly absorbed: number;
  readonly escaped: number;
  readonly emitted: number;
  readonly boxes: number;
  readonly length: number;
}

export function scoreLayout(counts: {
  gaps: number;
  fields: number;
  regions: number;
  boxes: number;
}): ScoreLayout {
  const { gaps, fields, regions, boxes } = counts;
  const backscatter = gaps * fields * componentCount * quantityCount;
  const absorbed = backscatter + fields;
  const escaped = absorbed + regions;
  const emitted = escaped + escapeCount;
  const boxesAt = emitted + 1;
  return {
    gaps,
    fields,
    backscatter,
    absorbed,
    escaped,
    emitted,
    boxes: boxesAt,
    length: boxesAt + boxes,
  };
}

/** Place of one scatter score. */
export const scatterAt = (
  layout: ScoreLayout,
  gap: number,
  field: number,
  component: number,
  quantity: number,
): number =>
  ((gap * layout.fields + field) * componentCount + component) * quantityCount + quantity;
