import { LitElement, css, html, nothing } from 'lit';
import { customElement, property, query, state } from 'lit/decorators.js';
import { stackLayout } from '../../../scenes/stack-layout.js';
import type { StackPicture } from '../../../scenes/stack-picture.js';
import { isSectionView, sectionView, type View, viewWords, zoomed } from '../../../scenes/view.js';
import { drawnAt, inkDensity, mostPhotons } from '../../charts/beam-shade.js';
import { type BeamHalf, sectionDrawing } from '../../charts/section-drawing.js';
import type { SpineLayout } from '../../charts/spine-layout.js';
import { placed, type DeskModel } from '../model/desk-model.js';
import { drawingSheet } from '../sheets/drawing-sheet.js';
import { onPaperChange, pageInks } from './page-inks.js';
import { stackSceneOf } from './stack-scene.js';
import { viewForDrag, viewForKey } from './view-hand.js';

/**
 * The stack in the beam in true proportion, split down the middle between the two techniques shown,
 * inked by primary photons per mm².
 *
 * Shows: the 3D picture; where there is no WebGL2, and in print, a section drawing of the same.
 * Properties: `model`, `layout` (where things stand in the section view).
 * Events: `view-turned` with true while the labels beside the section do not fit the view.
 * Keyboard: arrows turn, Shift+arrows shift, + and − enlarge, 1–6 named views, 0 back.
 * Parts: none.
 */
@customElement('stack-view')
export class StackView extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) layout!: SpineLayout;
  @state() private view: View = sectionView;
  @state() private flat = true;
  @query('canvas') private canvas!: HTMLCanvasElement;

  private picture: StackPicture | null = null;
  private shown: unknown[] = [];
  private stopPaper: () => void = () => undefined;
  private dragFrom: { x: number; y: number; view: View } | null = null;

  static override styles = [
    drawingSheet,
    css`
      :host {
        display: block;
      }
      canvas,
      svg {
        position: absolute;
        inset: 0;
        width: 100%;
        height: 100%;
        overflow: visible;
      }
      canvas {
        touch-action: pan-y;
        cursor: grab;
      }
      canvas:active {
        cursor: grabbing;
      }
      .flat canvas,
      .solid svg {
        visibility: hidden;
      }
      :focus-visible {
        outline: 2px solid var(--ink);
        outline-offset: 2px;
      }
      button {
        position: absolute;
        inset-block-start: 0.6rem;
        inset-inline-end: 0;
        font: inherit;
        font-size: var(--small);
        color: var(--ink);
        background: var(--paper);
        border: 0;
        border-block-end: 1px dotted var(--entry-rule);
        padding: 0;
        cursor: pointer;
      }
      @media print {
        canvas {
          display: none;
        }
        .solid svg {
          visibility: visible;
        }
      }
    `,
  ];

  override connectedCallback() {
    super.connectedCallback();
    this.stopPaper = onPaperChange(() => this.picture?.ink(pageInks(this)));
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    this.stopPaper();
    this.letGo();
  }

  private letGo() {
    this.picture?.dispose();
    this.picture = null;
    this.shown = [];
    this.flat = true;
  }

  protected override async firstUpdated() {
    const { stackPicture } = await import('../../../scenes/stack-picture.js');
    const begin = () => {
      if (!this.isConnected) return;
      this.picture = stackPicture(this.canvas, pageInks(this));
      this.flat = this.picture === null;
      this.draw();
    };
    this.canvas.addEventListener('webglcontextlost', (event) => {
      event.preventDefault();
      this.letGo();
    });
    this.canvas.addEventListener('webglcontextrestored', begin);
    begin();
  }

  protected override updated() {
    this.draw();
  }

  /** Hands the picture what it has not drawn yet; at rest nothing is drawn. */
  private draw() {
    const { width, height } = this.layout;
    const { draft, along, left, right, sizeName } = this.model;
    const wanted = [draft.case, along, left, right, sizeName, width, height];
    if (!this.picture || wanted.every((value, i) => value === this.shown[i])) return;
    const scene = stackSceneOf(this.model);
    if (!scene) return;
    this.shown = wanted;
    this.picture.show(scene, stackLayout(scene, width, height));
    this.picture.look(this.view);
  }

  private look(view: View) {
    this.view = view;
    this.picture?.look(view);
    this.dispatchEvent(new CustomEvent('view-turned', { detail: !isSectionView(view), bubbles: true, composed: true }));
  }

  private onKey(event: KeyboardEvent) {
    const scene = stackSceneOf(this.model);
    if (!scene || !this.picture) return;
    const layout = stackLayout(scene, this.layout.width, this.layout.height);
    const view = viewForKey(event, this.view, layout, scene.detail?.height_mm ?? 10);
    if (!view) return;
    event.preventDefault();
    this.look(view);
  }

  private onPointer(event: PointerEvent) {
    if (event.type === 'pointerdown' && event.button === 0) {
      this.canvas.setPointerCapture(event.pointerId);
      this.dragFrom = { x: event.clientX, y: event.clientY, view: this.view };
    } else if (event.type === 'pointermove' && this.dragFrom) {
      const { x, y, view } = this.dragFrom;
      this.look(viewForDrag(view, event.clientX - x, event.clientY - y, event.shiftKey));
    } else if (event.type !== 'pointermove') {
      this.dragFrom = null;
    }
  }

  private onWheel(event: WheelEvent) {
    // Scrolling the page over the drawing stays scrolling; Ctrl (a pinch) enlarges.
    if (!event.ctrlKey) return;
    event.preventDefault();
    this.look(zoomed(this.view, Math.exp(-event.deltaY / 300)));
  }

  private half(technique: number): BeamHalf {
    const { draft, along } = this.model;
    const { stack } = placed(this.model);
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

  private drawing() {
    const { left, right, draft } = this.model;
    const { stack, detail } = placed(this.model);
    const families = draft.case.patient.layers.map((layer, i) => ({
      name: layer.name,
      family: stack?.layers[i]?.material.family ?? ('soft tissue' as const),
    }));
    return sectionDrawing({
      layout: this.layout,
      layers: families,
      support: draft.case.room.support.some((slab) => slab.side === 'entrance'),
      grid: draft.case.room.grid !== null,
      detail: detail && {
        breadth_mm: detail.shape === 'vessel' ? detail.central.displaced_mm : draft.case.task.detail.length_mm,
        height_mm: detail.central.displaced_mm,
        round: detail.shape === 'vessel',
      },
      halves: [this.half(left), right === null ? null : this.half(right)],
      idPrefix: 'stack',
    });
  }

  override render() {
    const { width, height } = this.layout;
    const names = this.model.draft.case.patient.layers.map(({ name }) => name).join(', ');
    const words = `The stack in the beam: ${names}. Seen ${viewWords(this.view)}. Its figures are in the table below it.`;
    return html`<div class=${this.flat ? 'flat' : 'solid'}>
      <svg class="drawing" viewBox="0 0 ${width} ${height}" role="img" aria-label=${words} aria-hidden=${this.flat ? 'false' : 'true'}>${this.drawing()}</svg>
      <canvas role="img" aria-label=${words} aria-hidden=${this.flat ? 'true' : 'false'} tabindex=${this.flat ? -1 : 0}
        @keydown=${this.onKey} @wheel=${{ handleEvent: (event: WheelEvent) => this.onWheel(event), passive: false }}
        @pointerdown=${this.onPointer} @pointermove=${this.onPointer} @pointerup=${this.onPointer} @pointercancel=${this.onPointer}></canvas>
      ${isSectionView(this.view) ? nothing : html`<button type="button" @click=${() => this.look(sectionView)}>back to the section</button>`}
    </div>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'stack-view': StackView;
  }
  interface HTMLElementEventMap {
    'view-turned': CustomEvent<boolean>;
  }
}
