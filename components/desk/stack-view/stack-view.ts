import { LitElement, css, html } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { type FluencePoint, fluenceAlong, inkDensity } from '../../charts/beam-shade.js';
import { type BeamHalf, sectionDrawing } from '../../charts/section-drawing.js';
import type { SpineLayout } from '../../charts/spine-layout.js';
import { evaluationOf, placed, type DeskModel } from '../model/desk-model.js';
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

  /** Photons per mm² along the page for one technique; empty before the first answer. */
  private fluence(technique: number | null): FluencePoint[] {
    const { stack } = placed(this.model);
    const evaluation = evaluationOf(this.model, technique);
    if (!stack || !evaluation) return [];
    return fluenceAlong(evaluation, this.layout, {
      sourceToSkin_mm: stack.sourceToSkin_mm,
      exitToDetector_mm: stack.exitToDetector_mm,
      layers_mm: stack.layers.map((layer) => layer.thickness_mm),
      parallel: stack.beam === 'parallel',
    });
  }

  private half(technique: number, points: readonly FluencePoint[], most: number): BeamHalf {
    const { techniques, room } = this.model.draft.case;
    const { filter, grid } = techniques[technique];
    const layers = room.filters.find((entry) => entry.name === filter)?.layers ?? [];
    const shade = points.map(({ y, fluence_per_mm2 }) => ({ y, density: inkDensity(fluence_per_mm2, most) }));
    return { index: technique, filtered: layers.length > 0, gridIn: grid === 'in', shade };
  }

  override render() {
    const { left, right, draft } = this.model;
    const { stack, detail } = placed(this.model);
    const points = [this.fluence(left), this.fluence(right)];
    const most = Math.max(0, ...points.flat().map((point) => point.fluence_per_mm2));
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
      halves: [this.half(left, points[0], most), right === null ? null : this.half(right, points[1], most)],
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
