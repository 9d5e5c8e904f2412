import { html, LitElement, nothing } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { type StackAnchors, stackAnchors } from '../../../scenes/stack-anchors.js';
import { stackLayout } from '../../../scenes/stack-layout.js';
import type { StackScene } from '../../../scenes/stack-scene-data.js';
import { placeAlong } from '../../charts/place-along.js';
import { type SpineLayout, spineLayout } from '../../charts/spine-layout.js';
import { type DeskModel, placed, sizeShown } from '../model/desk-model.js';
import { spineOfScene } from '../stack-view/spine-of-scene.js';
import { stackShadingsOf } from '../stack-view/stack-shadings.js';
import { drawnSceneOf } from '../transport-section/drawn-scene.js';
import { beamPathSheet } from './beam-path-sheet.js';
import { leaderPath } from './leader-path.js';
import { spineLabels } from './spine-labels.js';
import { stations } from './stations.js';
import '../figure-value/figure-value.js';
import '../fields/choice-field.js';
import '../fields/number-field.js';
import '../fields/text-field.js';
import '../stack-view/stack-view.js';

/** Narrowest spine drawn, in px. */
const leastWidth = 200;

/**
 * The beam from focal spot to detector, with what is set and read on the left (Current) and right
 * (Proposed) at the height where it acts, and the shared things on the spine.
 *
 * Properties: `model`. Events: `case-edit`, `explain`, `show-technique` from what it holds.
 * Keyboard: every field in reading order, left side, spine, right side.
 * Parts: none; narrower than 720 px the rows stack beside one another under the spine.
 */
@customElement('beam-path')
export class BeamPath extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @state() private spine = { width: 440, height: 700 };
  @state() private turned = false;
  /** Where the layer view has drawn things. */
  @state() private anchors: StackAnchors | null = null;

  static override styles = beamPathSheet;

  /** Made anew only when what it shows has changed, so that the drawing rests. */
  private scene: StackScene | null = null;
  private sceneParts: readonly unknown[] = [];
  private waiting = 0;
  private readonly watcher = new ResizeObserver(() => {
    // Arranging changes what is observed, so it waits for the next frame, and is done once in it.
    cancelAnimationFrame(this.waiting);
    this.waiting = requestAnimationFrame(() => this.measure());
  });

  override connectedCallback() {
    super.connectedCallback();
    this.watcher.observe(this);
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    this.watcher.disconnect();
    cancelAnimationFrame(this.waiting);
  }

  protected override updated() {
    for (const row of this.renderRoot.querySelectorAll('.row')) this.watcher.observe(row);
    this.arrange();
  }

  protected override willUpdate() {
    const { draft, along, left, right, sizeName, tracks } = this.model;
    const parts = [draft.case, along, left, right, sizeName, tracks];
    if (parts.every((part, i) => part === this.sceneParts[i])) return;
    this.sceneParts = parts;
    this.scene = drawnSceneOf(this.model);
  }

  /** Where things stand now; what the layer view told last gives only the size of its drawing. */
  private layout(): SpineLayout {
    const { width, height } = this.anchors ?? this.spine;
    if (this.scene) return spineOfScene(stackAnchors(stackLayout(this.scene, width, height)));
    const { layers } = this.model.draft.case.patient;
    const layers_mm = layers.map((layer) => layer.thickness_mm);
    return spineLayout({ width, height, layers_mm, detailDepth_mm: null });
  }

  /** Takes the size the page gives the spine; drawing and rows follow. */
  private measure() {
    const spine = this.renderRoot.querySelector<HTMLElement>('.spine');
    if (!spine) return;
    const { offsetWidth: width, offsetHeight: height } = spine;
    // Before the page's own style sheet has come there is no width worth drawing for.
    if (width < leastWidth || height === 0) return;
    if (width !== this.spine.width || height !== this.spine.height) this.spine = { width, height };
    else this.arrange();
  }

  /** Puts the rows of both sides at the same heights, near where they act, and draws the leaders. */
  private arrange() {
    const root = this.renderRoot;
    const spine = root.querySelector<HTMLElement>('.spine');
    if (!spine) return;
    const layout = this.layout();
    const rowsOf = (id: string) => [
      ...root.querySelectorAll<HTMLElement>(`.row[data-station="${id}"]`),
    ];
    const used = stations.filter(({ id }) => rowsOf(id).some((row) => row.offsetHeight > 8));
    const isFlowing =
      used.length > 0 && getComputedStyle(rowsOf(used[0].id)[0]).position === 'static';
    for (const { id } of used) for (const row of rowsOf(id)) row.style.minHeight = '';
    const heights = used.map(({ id }) => Math.max(...rowsOf(id).map((row) => row.offsetHeight)));
    const tops = placeAlong(
      used.map((station, i) => ({ anchor: station.anchor(layout), height: heights[i] })),
      0,
      spine.offsetHeight,
    );
    const paths: string[] = [];
    used.forEach((station, i) => {
      for (const row of rowsOf(station.id)) {
        row.style.top = `${tops[i]}px`;
        // Where rows stand in the flow (on a phone) the two sides keep step by their heights.
        row.style.minHeight = isFlowing ? `${heights[i]}px` : '';
        row.classList.add('placed');
        if (station.leader) paths.push(leaderPath(row, spine, layout, station.anchor(layout)));
      }
    });
    root.querySelector('.leaders path')?.setAttribute('d', paths.join(''));
    const needed = heights.reduce((sum, rowHeight) => sum + rowHeight, 0);
    this.style.setProperty('--path-least', `${needed}px`);
  }

  private side(technique: number | null, side: 'left' | 'right') {
    if (technique === null) return html`<div class="side ${side}"></div>`;
    const name = this.model.draft.case.techniques[technique].name;
    return html`<section class="side ${side}" aria-label=${name}>
      ${stations.map(({ id, content }) => html`<div class="row" data-station=${id}>${content(this.model, technique)}</div>`)}
    </section>`;
  }

  override render() {
    const { model } = this;
    const { stack } = placed(model);
    const layout = this.layout();
    return html`<div class="columns">
        <svg class="leaders" aria-hidden="true"><path /></svg>
        ${this.side(model.left, 'left')}
        <section class="spine" aria-label="Beam path">
          <stack-view .scene=${this.scene} .shadings=${stackShadingsOf(model)} labels="turned" @stack-anchors=${(
            event: CustomEvent<StackAnchors>,
          ) => {
            this.anchors = event.detail;
          }} @view-turned=${(event: CustomEvent<boolean>) => {
            this.turned = event.detail;
          }}></stack-view>
          ${stack ? nothing : html`<p class="unplaced">The patient has no place in this room at size ${sizeShown(model).name}: see the findings.</p>`}
          <div class="labels" ?inert=${this.turned}>${spineLabels(model, layout, stack)}</div>
        </section>
        ${this.side(model.right, 'right')}
      </div>
      <p class="caption">ratios are as set, size ${sizeShown(model).name}; click a number for how it is computed</p>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'beam-path': BeamPath;
  }
}
