import { html, LitElement, nothing, type PropertyValues } from 'lit';
import { customElement, property, query, state } from 'lit/decorators.js';
import type { StackInks } from '../../../scenes/inks.js';
import { pivotOnPage } from '../../../scenes/projection.js';
import { type StackAnchors, stackAnchors } from '../../../scenes/stack-anchors.js';
import { type StackLayout, stackLayout } from '../../../scenes/stack-layout.js';
import type { Shading, StackScene } from '../../../scenes/stack-scene-data.js';
import { isSectionView, sectionView, type View, viewWords } from '../../../scenes/view.js';
import { type PresetName, presetNames, presetView } from '../../../scenes/view-presets.js';
import { drawingSheet } from '../sheets/drawing-sheet.js';
import { pageInks } from './page-inks.js';
import { PictureController } from './picture-controller.js';
import { sectionFallback } from './section-fallback.js';
import { stackLegend } from './stack-legend.js';
import { stackOverlay } from './stack-overlay.js';
import { stackTable } from './stack-table.js';
import { stackViewSheet } from './stack-view-sheet.js';
import { keyWords, stackWords } from './stack-words.js';
import { ViewController } from './view-controller.js';
import { keyAnswer } from './view-keys.js';
import { followPointer } from './view-pointer.js';

/**
 * The stack in the beam in three dimensions, cut open along the axis, in true proportion.
 *
 * Shows: focal spot, filters, support, layers, detail, grid, detector; the beam split between
 * Current (left) and Proposed (right), inked by primary photons or another quantity; photon tracks.
 * Until WebGL2 is there, without it and in print, the same as a flat section.
 * Properties: `scene`; `shadings`, further quantities the ink can be chosen to show; `palette`
 * (null: the page's custom properties); `view`, one of the named views; `labels`, `all`, `turned`
 * (own labels only when turned away from the section), `none`.
 * Events: `stack-anchors` with StackAnchors, the places in the section view, whenever they change;
 * `view-turned` with true while labels beside the section do not fit the view; `choose-ink` with the
 * quantity the ink is to show. All bubble.
 * Keyboard: arrows turn, Shift and arrows shift, + and − zoom, 1–6 named views, 0 or Home resets.
 * Pointer: drag turns, Shift and drag shifts, the wheel zooms with Ctrl or once the view has focus.
 * Parts: `stage`, `label`, `legend`, `views`, `table`.
 */
@customElement('stack-view')
export class StackView extends LitElement {
  @property({ attribute: false }) scene: StackScene | null = null;
  @property({ attribute: false }) shadings: readonly Shading[] = [];
  @property({ attribute: false }) palette: StackInks | null = null;
  @property() view: PresetName = 'section';
  @property() labels: 'all' | 'turned' | 'none' = 'all';

  @state() private size: readonly [number, number] = [0, 0];
  /** Quantity the ink shows; empty for the scene's own. */
  @state() private chosen = '';
  @query('.stage') private stage!: HTMLElement;
  @query('.place') private place!: HTMLElement | null;

  static override styles = [drawingSheet, stackViewSheet];

  /** The scene with the chosen ink, and where it stands. */
  private shown: StackScene | null = null;
  private layout: StackLayout | null = null;
  private anchors: StackAnchors | null = null;
  private told = '';
  private listening = new AbortController();
  private readonly picture = new PictureController(
    this,
    () => this.place,
    () => this.palette ?? pageInks(this),
  );
  private readonly looking = new ViewController(this, (view, isSection, isNews) => {
    this.picture.look(view);
    if (isNews) this.tell('view-turned', !isSection);
  });
  // A frame later: the words below, drawn in answer, may change the stage's size once more.
  private readonly watcher = new ResizeObserver(() => requestAnimationFrame(() => this.measure()));

  /** Frames the 3D drawing has taken so far; it takes none at rest. */
  get frames(): number {
    return this.picture.frames;
  }

  override connectedCallback() {
    super.connectedCallback();
    if (this.hasUpdated) this.listen();
  }

  protected override firstUpdated() {
    this.listen();
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    this.listening.abort();
    this.watcher.disconnect();
  }

  private listen() {
    this.listening = new AbortController();
    this.watcher.observe(this.stage);
    followPointer(
      {
        stage: this.stage,
        view: () => this.looking.view,
        change: (view) => {
          if (this.picture.isSolid) this.looking.go(view, null);
        },
        pivot: () => (this.layout ? pivotOnPage(this.layout) : [0, 0]),
      },
      this.listening.signal,
    );
  }

  private measure() {
    const { clientWidth, clientHeight } = this.stage;
    const [width, height] = this.size;
    if (clientWidth !== width || clientHeight !== height) this.size = [clientWidth, clientHeight];
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
    this.looking.preset = name;
    if (this.layout) this.looking.go(this.named(name, this.layout), name);
  }

  private onKey(event: KeyboardEvent) {
    const answer = keyAnswer(event, this.looking.view);
    if (!answer || !this.picture.isSolid) return;
    event.preventDefault();
    if ('preset' in answer) this.go(answer.preset);
    else this.looking.go(answer.view, null);
  }

  /** True where something else has to be drawn than before. */
  private isNew = (changed: PropertyValues) =>
    ['scene', 'shadings', 'chosen', 'size'].some((name) => changed.has(name));

  protected override willUpdate(changed: PropertyValues) {
    if (changed.has('view') && this.view !== this.looking.preset) this.go(this.view);
    if (!this.isNew(changed)) return;
    const { scene } = this;
    const [width, height] = this.size;
    const shading = this.shadings.find(({ quantity }) => quantity === this.chosen);
    this.shown = scene && shading ? { ...scene, shading } : scene;
    this.layout = scene && width > 0 && height > 0 ? stackLayout(scene, width, height) : null;
    this.anchors = this.layout && stackAnchors(this.layout);
    const { preset } = this.looking;
    if (this.layout && preset) this.looking.set(this.named(preset, this.layout));
  }

  protected override updated(changed: PropertyValues) {
    if (changed.has('palette')) this.picture.ink();
    if (!this.isNew(changed) || !this.shown || !this.layout) return;
    this.picture.show(this.shown, this.layout);
    this.tellAnchors();
  }

  private overlay(scene: StackScene, layout: StackLayout) {
    // The flat section that stands in cannot be turned.
    const view = this.picture.isSolid ? this.looking.view : sectionView;
    const isTurned = !isSectionView(view);
    const hasLabels = this.labels === 'all' || (this.labels === 'turned' && isTurned);
    return html`${hasLabels ? stackOverlay(scene, layout, view) : nothing}
      ${isTurned ? html`<p class="from" aria-hidden="true">${viewWords(view)}</p>` : nothing}`;
  }

  private foot(scene: StackScene) {
    const inks = [this.scene?.shading ?? scene.primary, ...this.shadings];
    const choose = (quantity: string) => {
      this.chosen = quantity;
      this.tell('choose-ink', quantity);
    };
    return html`<div class="foot">
      ${stackLegend(scene, this.layout, inks, choose)}
      <div class="views" part="views" role="group" aria-label="Views">
        ${presetNames.map(
          (name) =>
            html`<button type="button" ?disabled=${!this.picture.isSolid} aria-pressed=${this.looking.preset === name} @click=${() => this.go(name)}>${name}</button>`,
        )}
      </div>
      <details part="table"><summary>as a table</summary><div class="sheet">${stackTable(scene)}</div></details>
    </div>`;
  }

  override render() {
    const { shown: scene, layout, anchors } = this;
    return html`<div class="stage ${this.picture.isSolid ? 'solid' : 'flat'} ${isSectionView(this.looking.view) ? '' : 'turned'}" part="stage" role="application" tabindex="0"
        aria-label=${scene ? stackWords(scene) : 'No stack to show.'} aria-describedby=${this.picture.isSolid ? 'keys' : nothing}
        aria-roledescription="layer view" @keydown=${this.onKey}>
        <div class="place"></div>
        ${scene && layout && anchors ? [sectionFallback(scene, layout, anchors), this.overlay(scene, layout)] : nothing}
      </div>
      <p class="unseen" id="keys">${keyWords}</p>
      <p class="unseen" role="status">${this.looking.announced}</p>
      ${scene ? this.foot(scene) : nothing}`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'stack-view': StackView;
  }
  interface HTMLElementEventMap {
    'view-turned': CustomEvent<boolean>;
    'stack-anchors': CustomEvent<StackAnchors>;
    'choose-ink': CustomEvent<string>;
  }
}
