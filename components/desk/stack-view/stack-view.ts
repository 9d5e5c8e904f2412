import { html, LitElement, nothing, type PropertyValues, svg } from 'lit';
import { customElement, property, query, state } from 'lit/decorators.js';
import type { StackInks } from '../../../scenes/inks.js';
import { pivotOnPage } from '../../../scenes/projection.js';
import { type StackAnchors, stackAnchors } from '../../../scenes/stack-anchors.js';
import { type StackLayout, stackLayout } from '../../../scenes/stack-layout.js';
import type { StackScene } from '../../../scenes/stack-scene-data.js';
import {
  isSectionView,
  sectionView,
  type View,
  viewBetween,
  viewWords,
} from '../../../scenes/view.js';
import { type PresetName, presetNames, presetView } from '../../../scenes/view-presets.js';
import { drawingSheet } from '../sheets/drawing-sheet.js';
import { onPaperChange, pageInks } from './page-inks.js';
import { type HostedPicture, hostPicture } from './picture-host.js';
import { sectionFallback } from './section-fallback.js';
import { type PlacedLabel, stackLabels } from './stack-labels.js';
import { stackLegend } from './stack-legend.js';
import { stackTable } from './stack-table.js';
import { stackViewSheet } from './stack-view-sheet.js';
import { keyWords, stackWords } from './stack-words.js';
import { keyAnswer } from './view-keys.js';
import { followPointer } from './view-pointer.js';

const moves_ms = 260;
const announced_ms = 350;

/**
 * The stack in the beam in three dimensions, cut open along the axis, in true proportion.
 *
 * Shows: focal spot, filters, support, layers, detail, grid, detector; the beam split between
 * Current (left) and Proposed (right), inked by primary photons or by the scene's `shading`; photon
 * tracks. Until WebGL2 is there, without it and in print, the same as a flat section.
 * Properties: `scene`; `palette` (null: the page's custom properties); `view`, one of the named
 * views; `labels`, `all`, `turned` (own labels only when turned away from the section), `none`.
 * Events: `stack-anchors` with StackAnchors, the places in the section view, whenever they change;
 * `view-turned` with true while labels beside the section do not fit the view. Both bubble.
 * Keyboard: arrows turn, Shift and arrows shift, + and − zoom, 1–6 named views, 0 or Home resets.
 * Pointer: drag turns, Shift and drag shifts, the wheel zooms with Ctrl or once the view has focus.
 * Parts: `stage`, `label`, `legend`, `views`, `table`.
 */
@customElement('stack-view')
export class StackView extends LitElement {
  @property({ attribute: false }) scene: StackScene | null = null;
  @property({ attribute: false }) palette: StackInks | null = null;
  @property() view: PresetName = 'section';
  @property() labels: 'all' | 'turned' | 'none' = 'all';

  @state() private looking: View = sectionView;
  @state() private size: readonly [number, number] = [0, 0];
  @state() private isSolid = false;
  @state() private announced = '';
  @query('.stage') private stage!: HTMLElement;
  @query('.place') private place!: HTMLElement;

  static override styles = [drawingSheet, stackViewSheet];

  private layout: StackLayout | null = null;
  private anchors: StackAnchors | null = null;
  private told = '';
  /** The named view looked from; null once it has been turned by hand. */
  private preset: PresetName | null = 'section';
  private hosted: HostedPicture | null = null;
  private listening = new AbortController();
  private move = 0;
  private pause = 0;
  // A frame later: the words below, drawn in answer, may change the stage's size once more.
  private readonly watcher = new ResizeObserver(() => requestAnimationFrame(() => this.measure()));

  /** Frames the 3D drawing has taken so far; it takes none at rest. */
  get frames(): number {
    return this.hosted?.picture.frames() ?? 0;
  }

  override connectedCallback() {
    super.connectedCallback();
    if (this.hasUpdated) this.start();
  }

  protected override firstUpdated() {
    this.start();
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    this.listening.abort();
    this.watcher.disconnect();
    cancelAnimationFrame(this.move);
    clearTimeout(this.pause);
    this.release();
  }

  private start() {
    this.listening = new AbortController();
    const { signal } = this.listening;
    this.watcher.observe(this.stage);
    followPointer(
      {
        stage: this.stage,
        view: () => this.looking,
        change: (view) => this.turn(view, null),
        pivot: () => (this.layout ? pivotOnPage(this.layout) : [0, 0]),
      },
      signal,
    );
    signal.addEventListener(
      'abort',
      onPaperChange(() => this.requestUpdate('palette')),
    );
    void this.solidify(signal);
  }

  /** Exchanges the flat section for the 3D drawing as soon as that can be had. */
  private async solidify(signal: AbortSignal) {
    const hosted = await hostPicture(this.place, this.inks(), (happened) => {
      if (happened === 'lost') this.isSolid = false;
      else {
        this.release();
        void this.solidify(signal);
      }
    });
    if (signal.aborted) hosted?.remove();
    else if (hosted) {
      this.hosted = hosted;
      this.isSolid = true;
      if (this.scene && this.layout) hosted.picture.show(this.scene, this.layout);
      hosted.picture.look(this.looking);
    }
  }

  private release() {
    this.hosted?.remove();
    this.hosted = null;
    this.isSolid = false;
  }

  private inks = (): StackInks => this.palette ?? pageInks(this);

  private measure() {
    const { clientWidth, clientHeight } = this.stage;
    if (clientWidth !== this.size[0] || clientHeight !== this.size[1]) {
      this.size = [clientWidth, clientHeight];
    }
  }

  /** Looks at the stack from somewhere else; named views are gone to in a short movement. */
  private turn(view: View, preset: PresetName | null) {
    cancelAnimationFrame(this.move);
    this.preset = preset;
    const isCalm = matchMedia('(prefers-reduced-motion: reduce)').matches;
    if (preset === null || isCalm || !this.isSolid) this.look(view);
    else this.moveTo(view);
    clearTimeout(this.pause);
    this.pause = window.setTimeout(() => {
      this.announced = `Seen ${viewWords(view)}.`;
    }, announced_ms);
  }

  private moveTo(view: View) {
    const from = this.looking;
    let begun = 0;
    const step = (now: number) => {
      begun ||= now;
      const share = Math.min(1, (now - begun) / moves_ms);
      this.look(viewBetween(from, view, share * share * (3 - 2 * share)));
      if (share < 1) this.move = requestAnimationFrame(step);
    };
    this.move = requestAnimationFrame(step);
  }

  private look(view: View) {
    const before = isSectionView(this.looking);
    this.looking = view;
    const isSection = isSectionView(view);
    if (isSection !== before) this.tell('view-turned', !isSection);
  }

  private tell(name: string, detail: unknown) {
    this.dispatchEvent(new CustomEvent(name, { detail, bubbles: true, composed: true }));
  }

  /** Tells where things stand, when that is news. */
  private tellAnchors() {
    const places = JSON.stringify(this.anchors);
    if (places === this.told) return;
    this.told = places;
    this.tell('stack-anchors', this.anchors);
  }

  private named(name: PresetName, layout: StackLayout): View {
    const detail = this.scene?.detail;
    return presetView(name, layout, detail ? Math.max(detail.height_mm, detail.breadth_mm) : 10);
  }

  private go(name: PresetName) {
    this.view = name;
    this.preset = name;
    if (this.layout) this.turn(this.named(name, this.layout), name);
  }

  private onKey(event: KeyboardEvent) {
    const answer = keyAnswer(event, this.looking);
    if (!answer) return;
    event.preventDefault();
    if ('preset' in answer) this.go(answer.preset);
    else this.turn(answer.view, null);
  }

  protected override willUpdate(changed: PropertyValues) {
    if (changed.has('view') && this.view !== this.preset) this.go(this.view);
    if (!changed.has('scene') && !changed.has('size')) return;
    const [width, height] = this.size;
    const { scene } = this;
    this.layout = scene && width > 0 && height > 0 ? stackLayout(scene, width, height) : null;
    this.anchors = this.layout && stackAnchors(this.layout);
    if (this.layout && this.preset) this.looking = this.named(this.preset, this.layout);
  }

  protected override updated(changed: PropertyValues) {
    const picture = this.hosted?.picture;
    if (changed.has('palette')) picture?.ink(this.inks());
    if ((changed.has('scene') || changed.has('size')) && this.scene && this.layout) {
      picture?.show(this.scene, this.layout);
      this.tellAnchors();
    }
    if (changed.has('looking')) picture?.look(this.looking);
  }

  private label = ({ id, words, left, top }: PlacedLabel) =>
    html`<span class="label ${id.startsWith('layer') || id === 'detail' ? '' : 'soft'}" part="label"
      style="left:${left.toFixed(1)}px;top:${top.toFixed(1)}px">${words}</span>`;

  private overlay(scene: StackScene, layout: StackLayout) {
    const isTurned = !isSectionView(this.looking);
    if (this.labels === 'none' || (this.labels === 'turned' && !isTurned)) return nothing;
    const labels = stackLabels(scene, layout, this.looking);
    const leaders = labels.filter(({ leads }) => leads);
    return html`<svg class="leaders" aria-hidden="true">
        ${leaders.map(({ anchor: [x, y], left, top }) => svg`<path d="M${x},${y} L${left - 1},${top + 8.5}" />`)}
      </svg>
      ${labels.map(this.label)}`;
  }

  private foot(scene: StackScene, layout: StackLayout | null) {
    return html`<div class="foot">
      ${stackLegend(scene, layout)}
      <div class="views" part="views" role="group" aria-label="Views">
        ${presetNames.map(
          (name) =>
            html`<button type="button" aria-pressed=${this.preset === name} @click=${() => this.go(name)}>${name}</button>`,
        )}
      </div>
      <details part="table"><summary>as a table</summary><div class="sheet">${stackTable(scene)}</div></details>
    </div>`;
  }

  override render() {
    const { scene, layout, anchors, looking } = this;
    return html`<div class="stage ${this.isSolid ? 'solid' : 'flat'}" part="stage" role="application" tabindex="0"
        aria-label=${scene ? stackWords(scene) : 'No stack to show.'} aria-describedby="keys"
        aria-roledescription="layer view" @keydown=${this.onKey}>
        <div class="place"></div>
        ${scene && layout && anchors ? sectionFallback(scene, layout, anchors) : nothing}
        ${scene && layout ? this.overlay(scene, layout) : nothing}
        ${isSectionView(looking) ? nothing : html`<p class="from" aria-hidden="true">${viewWords(looking)}</p>`}
      </div>
      <p class="unseen" id="keys">${keyWords}</p>
      <p class="unseen" role="status">${this.announced}</p>
      ${scene ? this.foot(scene, layout) : nothing}`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'stack-view': StackView;
  }
  interface HTMLElementEventMap {
    'view-turned': CustomEvent<boolean>;
    'stack-anchors': CustomEvent<StackAnchors>;
  }
}
