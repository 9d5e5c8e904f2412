import { LitElement, css, html } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Stack } from '../../../physics/stack/stack.js';
import { drawnAt, inkDensity, mostPhotons } from '../../charts/beam-shade.js';
import { type BeamHalf, sectionDrawing } from '../../charts/section-drawing.js';
import type { SpineLayout } from '../../charts/spine-layout.js';
import { placed, type DeskModel } from '../model/desk-model.js';
import { drawingSheet } from '../sheets/drawing-sheet.js';

/**
 * The stack in the beam, split down the middle between the two techniques shown.
 *
 * Shows: a section drawing, hatched by material family, inked by primary photons per mm².
 * Properties: `model`, `layout`. Events: none. Keyboard: none. Parts: none.
 */
@customElement('stack-view')
export class StackView extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) layout!: SpineLayout;

  static override styles = [
    drawingSheet,
    css`
      :host {
        display: block;
      }
      svg {
        display: block;
        width: 100%;
        height: 100%;
        overflow: visible;
      }
    `,
  ];

  private half(technique: number, stack: Stack | null): BeamHalf {
    const { draft, along } = this.model;
    const { name, filter, grid } = draft.case.techniques[technique];
    const layers = draft.case.room.filters.find((entry) => entry.name === filter)?.layers ?? [];
    const beam = along.find((entry) => entry.technique === name);
    const most = mostPhotons(along);
    const shade =
      stack && beam
        ? beam.distances_mm.map((distance_mm, i) => ({
            y: drawnAt(distance_mm, this.layout, stack),
            density: inkDensity(beam.primaryFluence_per_mm2[i], most),
          }))
        : [];
    return { index: technique, filtered: layers.length > 0, gridIn: grid === 'in', shade };
  }

  override render() {
    const { left, right, draft } = this.model;
    const { stack, detail } = placed(this.model);
    const { width, height } = this.layout;
    const names = draft.case.patient.layers.map((layer, i) => ({
      name: layer.name,
      family: stack?.layers[i]?.material.family ?? ('soft tissue' as const),
    }));
    const drawing = sectionDrawing({
      layout: this.layout,
      layers: names,
      support: draft.case.room.support.some((slab) => slab.side === 'entrance'),
      grid: draft.case.room.grid !== null,
      detail: detail && {
        breadth_mm: draft.case.task.detail.length_mm,
        height_mm: detail.central.displaced_mm,
        round: detail.shape === 'vessel',
      },
      halves: [this.half(left, stack), right === null ? null : this.half(right, stack)],
      idPrefix: 'stack',
    });
    const words = `Section through the beam: ${names.map((layer) => layer.name).join(', ')}. Thicknesses are in the fields beside it.`;
    return html`<svg class="drawing" viewBox="0 0 ${width} ${height}" role="img" aria-label=${words}>${drawing}</svg>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'stack-view': StackView;
  }
}
