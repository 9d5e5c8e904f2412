import { html, LitElement, nothing } from 'lit';
import { customElement, property, query, state } from 'lit/decorators.js';
import type { Fault } from '../../../physics/case/index.js';
import type { HoldConstant } from '../../../physics/results.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import type { SweepPool } from '../../workers/sweep-pool.js';
import type { DeskCommand } from '../desk-header/desk-header.js';
import type { ExplainCard } from '../explain-card/explain-card.js';
import type { ExplainRequest } from '../figure-value/figure-value.js';
import type { DeskModel } from '../model/desk-model.js';
import type { CheckState } from '../transport-section/check-state.js';
import { findingsShown } from './findings-shown.js';
import type { Paper } from './paper.js';
import { sectionInView } from './section-in-view.js';
import { whenIdle } from './when-idle.js';
import '../balance-section/balance-section.js';
import '../beam-path/beam-path.js';
import '../caution-footer/caution-footer.js';
import '../comparison-table/comparison-table.js';
import '../curve-panel/curve-panel.js';
import '../desk-header/desk-header.js';
import '../explain-card/explain-card.js';
import '../fault-list/fault-list.js';
import '../finding-list/finding-list.js';
import '../patient-section/patient-section.js';
import '../room-section/room-section.js';
import '../sizes-section/sizes-section.js';
import '../solve-section/solve-section.js';
import '../sweep-section/sweep-section.js';
import '../task-section/task-section.js';
import '../techniques-section/techniques-section.js';
import '../transport-section/transport-section.js';

/** The sections of the working paper that are built, in their order. */
export const sections = [
  { id: 'room', name: 'Room' },
  { id: 'patient', name: 'Patient' },
  { id: 'task', name: 'Task' },
  { id: 'techniques', name: 'Techniques' },
  { id: 'balance', name: 'Balance' },
] as const;

/**
 * The arrangement of the desk: head, beam path, margin with curve, table and findings, the working
 * paper below, cautions. Lives in the page itself, not in a shadow, so that sections have addresses.
 *
 * Properties: `model` (nothing is drawn before it is set), `scan`, `curveStale`, `hold`, and what the
 * head shows: `examples`, `canUndo`, `canRedo`, `status`, `isKept`, `paper`; `refused` (a file not opened or saved and
 * why), `trouble` and `depthTrouble` (why there is
 * no answer, none along the depth); `check` and `tracksDrawn` of the check by transport; `pool`, the
 * workers of sweep, sizes and solving. Events: `case-edit`, `command`, `example`,
 * `choose-size`, `choose-hold`, `show-technique` from what it holds.
 */
@customElement('desk-page')
export class DeskPage extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) scan: readonly SweepSetting[] | null = null;
  @property({ type: Boolean }) curveStale = false;
  @property() hold: HoldConstant = 'detectorAirKerma';
  @property({ attribute: false }) examples: readonly string[] = [];
  @property({ type: Boolean }) canUndo = false;
  @property({ type: Boolean }) canRedo = false;
  @property() status = '';
  /** False while the browser does not keep the case against a crash. */
  @property({ attribute: false }) isKept = true;
  @property() paper: Paper = 'auto';
  @property({ attribute: false }) refused: { heading: string; faults: readonly Fault[] } | null =
    null;
  @property() trouble = '';
  @property() depthTrouble = '';
  @property({ attribute: false }) check: CheckState | null = null;
  @property({ type: Boolean }) tracksDrawn = false;
  @property({ attribute: false }) pool: SweepPool | null = null;
  @property() here = '';
  @query('explain-card') private card!: ExplainCard;

  /** What the sections below show: the model of a moment ago, until the page is idle. */
  @state() private sectionModel: DeskModel | null = null;

  private stopWatching: () => void = () => undefined;
  private catchUp = whenIdle(() => {
    this.sectionModel = this.model;
  });

  protected override createRenderRoot() {
    return this;
  }

  override connectedCallback() {
    super.connectedCallback();
    this.addEventListener('explain', (event: CustomEvent<ExplainRequest>) => {
      this.card.show(event.detail, event.composedPath()[0] as HTMLElement);
    });
  }

  protected override updated() {
    if (this.sectionModel !== this.model) this.catchUp();
  }

  protected override firstUpdated() {
    this.stopWatching = sectionInView(this, (id) => {
      this.here = id;
    });
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    this.stopWatching();
  }

  private head() {
    const { faults } = this.model.draft;
    const count = faults.length === 1 ? 'One fault stands' : `${faults.length} faults stand`;
    return html`<div class="head">
      <desk-header .model=${this.model} .sections=${sections} .here=${this.here} .examples=${this.examples}
        .canUndo=${this.canUndo} .canRedo=${this.canRedo} .status=${this.status} .isKept=${this.isKept} .paper=${this.paper}></desk-header>
      ${
        this.refused
          ? html`<fault-list closable .heading=${this.refused.heading} .faults=${this.refused.faults} @close=${() => {
              this.refused = null;
            }}></fault-list>`
          : nothing
      }
      <fault-list .heading="${count}; results use the last good values in their place" .faults=${faults}></fault-list>
      ${[this.trouble, this.depthTrouble].map((words) => (words ? html`<p class="trouble" role="alert">${words}</p>` : nothing))}
    </div>`;
  }

  override render() {
    const { model } = this;
    if (!model) return nothing;
    const later = this.sectionModel ?? model;
    return html`${this.head()}
      <main>
        <beam-path .model=${model}></beam-path>
        <aside class="margin" aria-label="Balance and findings">
          <curve-panel .model=${model} .scan=${this.scan} .hold=${this.hold} ?stale=${this.curveStale}></curve-panel>
          <div>
            <comparison-table .model=${model}></comparison-table>
            <finding-list .findings=${findingsShown(model)} .size=${model.sizeName} ?stale=${model.stale}></finding-list>
          </div>
        </aside>
        <div class="sections">
          <room-section id="room" .model=${later}></room-section>
          <patient-section id="patient" .model=${later}></patient-section>
          <task-section id="task" .model=${later}></task-section>
          <techniques-section id="techniques" .model=${later}></techniques-section>
          <balance-section id="balance" .model=${later}></balance-section>
          <sweep-section .model=${later} .pool=${this.pool}></sweep-section>
          <sizes-section .model=${later} .pool=${this.pool}></sizes-section>
          <solve-section .model=${later} .pool=${this.pool}></solve-section>
          <transport-section .model=${later} .check=${this.check} ?tracksDrawn=${this.tracksDrawn}></transport-section>
        </div>
      </main>
      <caution-footer></caution-footer>
      <explain-card .model=${model}></explain-card>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'desk-page': DeskPage;
  }
  interface HTMLElementEventMap {
    command: CustomEvent<DeskCommand>;
    example: CustomEvent<string>;
    'choose-size': CustomEvent<string>;
    'choose-hold': CustomEvent<HoldConstant>;
    'show-technique': CustomEvent<number>;
  }
}
