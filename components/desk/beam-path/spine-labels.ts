import { html, nothing, type TemplateResult } from 'lit';
import type { Stack } from '../../../physics/stack/stack.js';
import { formatEntry } from '../../charts/format.js';
import { placeAlong } from '../../charts/place-along.js';
import type { SpineLayout } from '../../charts/spine-layout.js';
import type { DeskModel } from '../model/desk-model.js';
import '../layer-label/layer-label.js';
import '../detail-label/detail-label.js';

const labelHeight = 26;

/** Lengths to a tenth of a millimetre, without needless zeros. */
const length = (value_mm: number): string => formatEntry(Number(value_mm.toFixed(1)));

const at = (x: number, y: number): string => `left:${x.toFixed(0)}px; top:${y.toFixed(0)}px`;

/** Tube, air, support, grid and detector, named where they stand. */
function fixtures(model: DeskModel, layout: SpineLayout, stack: Stack | null): TemplateResult {
  const { room } = model.draft.case;
  const { tube, support, grid, detector, geometry } = room;
  const target = room.source
    ? `${room.source.kind} source`
    : `tungsten, ${formatEntry(tube.anodeAngle_deg)}°`;
  const slabs = support
    .map((slab) => `${slab.material} ${formatEntry(slab.thickness_mm)} mm`)
    .join(', ');
  const gap = stack ? `, ${length(stack.exitToDetector_mm)} mm behind the patient` : '';
  const air = layout.airBreak ?? (layout.tube + layout.patient.top) / 2;
  const gridWords = grid
    ? `grid ${formatEntry(grid.ratio)}:1, ${formatEntry(grid.strips_per_cm)} per cm${gap}`
    : `no grid${gap}`;
  return html`
    <span class="label soft" style=${at(layout.axis + 12, layout.tube - 8)}>${target}</span>
    ${
      stack
        ? html`<span class="label soft" style="right:2px; top:${(air - 9).toFixed(0)}px">${length(stack.sourceToSkin_mm)} mm to the skin</span>`
        : nothing
    }
    ${slabs ? html`<span class="label soft" style=${at(layout.left, layout.support.top - 19)}>${slabs}</span>` : nothing}
    <span class="label soft wash" style=${at(layout.left, layout.grid - 19)}>${gridWords}</span>
    <span class="label soft foot" style=${at(layout.left, layout.detector.bottom + 4)}
      >${detector.material}, ${length(geometry.sourceToDetector_mm)} mm from the focal spot</span>`;
}

/** Words on the spine: fixtures, every layer with its material and thickness, and the detail. */
export function spineLabels(
  model: DeskModel,
  layout: SpineLayout,
  stack: Stack | null,
): TemplateResult {
  const { layers } = model.draft.case.patient;
  const tops = placeAlong(
    layout.layers.map((band) => ({
      anchor: Math.min((band.top + band.bottom) / 2, band.top + labelHeight),
      height: labelHeight,
    })),
    layout.patient.top,
    layout.patient.bottom,
  );
  return html`${fixtures(model, layout, stack)}
    ${layers.map(
      (
        layer,
        i,
      ) => html`<layer-label class="label" style=${at(layout.left + 5, tops[i])} .model=${model} .index=${i}
        .thickness_mm=${stack?.layers[i]?.thickness_mm ?? layer.thickness_mm}></layer-label>`,
    )}
    ${
      layout.detail === null
        ? nothing
        : html`<detail-label class="label" style=${at(layout.axis + 26, layout.detail - labelHeight)} .model=${model}></detail-label>`
    }`;
}
