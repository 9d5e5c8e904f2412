import { html, LitElement, nothing, type PropertyValues } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { HoldConstant } from '../../../physics/results.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import type { CostName } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { usualCosts, wholeRoom } from '../../../physics/sweep.js';
import { sweepCsv } from '../../charts/sweep-csv.js';
import { filterName } from '../../charts/sweep-map.js';
import type { SweepMapData } from '../../charts/sweep-map-layout.js';
import type { SweepPool } from '../../workers/sweep-pool.js';
import { requestEdit } from '../fields/case-edit.js';
import { saveCsv } from '../fields/save-csv.js';
import { type DeskModel, sizeShown } from '../model/desk-model.js';
import { runSheet } from '../sheets/run-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { adoptSetting, replacesControl } from './adopt.js';
import { mapData } from './map-data.js';
import { selectOf } from './select-of.js';
import { costChoices, holdChoices } from './sweep-choices.js';
import { type SweepRunner, sweepRunner } from './sweep-runner.js';
import { sweepSheet } from './sweep-sheet.js';
import {
  piecesDone,
  type SweepState,
  settingsOfSize,
  sweepBasis,
  wholeSweep,
} from './sweep-state.js';
import { progressWords } from './sweep-words.js';
import { WhenSeen } from './when-seen.js';
import './frontier-panel.js';
import './map-panel.js';
import './rules-panel.js';

/** An edit settles this long before the room is swept again. */
const settle_ms = 350;

/**
 * Every setting of the room at every size under one condition: the map of a figure of merit, what
 * the room forbids, the frontier, and rules of thumb. Computed while it is on the screen.
 *
 * Properties: `model`; `pool`, the workers that compute; `sweep`, the sweep shown.
 * Events: `case-edit` when a setting is adopted as Proposed.
 * Keyboard: that of its panels. Parts: none.
 */
@customElement('sweep-section')
export class SweepSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) pool: SweepPool | null = null;
  @property({ attribute: false }) sweep: SweepState | null = null;

  @state() private hold: HoldConstant = 'sdnr';
  /** Null follows the dose the case leads with. */
  @state() private chosenCost: CostName | null = null;
  /** Null follows the size looked at. */
  @state() private chosenSize: string | null = null;
  @state() private withControl = false;
  @state() private told = '';

  /** What the map shows: the same objects while nothing in it has changed. */
  private shown: {
    readonly settings: readonly SweepSetting[];
    readonly data: SweepMapData;
  } | null = null;
  private shownFor: readonly unknown[] = [];

  private readonly seen = new WhenSeen(this);
  private runner: SweepRunner | null = null;
  private settling: ReturnType<typeof setTimeout> | undefined;

  static override styles = [sectionSheet, runSheet, sweepSheet];

  override disconnectedCallback() {
    super.disconnectedCallback();
    clearTimeout(this.settling);
    this.runner?.cancel();
  }

  private get cost(): CostName {
    return this.chosenCost ?? this.model.draft.case.compare.primaryDose;
  }

  private get size(): string {
    const names = sizesOf(this.model.draft.case.patient).map(({ name }) => name);
    return this.chosenSize !== null && names.includes(this.chosenSize)
      ? this.chosenSize
      : sizeShown(this.model).name;
  }

  private get basis(): string {
    return sweepBasis(this.model.draft.case, this.hold);
  }

  protected override willUpdate() {
    const { sweep, model, size, cost } = this;
    if (!sweep) return;
    const { settings } = settingsOfSize(sweep, size);
    const now = [
      settings,
      sweep.request,
      model.draft.case,
      model.weighing,
      model.right,
      cost,
      size,
    ];
    if (now.every((part, i) => part === this.shownFor[i])) return;
    this.shownFor = now;
    this.shown =
      settings.length > 0 ? { settings, data: mapData(model, sweep, size, settings, cost) } : null;
  }

  /** Sweeps by itself once an edit has settled, while someone looks; a cancelled sweep stays so. */
  protected override updated(changed: PropertyValues) {
    const isDue = this.pool !== null && this.seen.isSeen && !this.model.stale;
    if (!isDue || this.sweep?.basis === this.basis) return;
    if (this.settling !== undefined && !changed.has('model') && !changed.has('hold')) return;
    clearTimeout(this.settling);
    this.settling = setTimeout(() => {
      this.settling = undefined;
      this.run();
    }, settle_ms);
  }

  private run() {
    const { pool } = this;
    if (!pool) return;
    this.runner ??= sweepRunner(
      () => pool,
      (sweep) => {
        this.sweep = sweep;
      },
    );
    const { draft } = this.model;
    void this.runner.run(draft, wholeRoom(draft.case, this.hold), this.size);
  }

  private adopt({ potential_kV, filter, values }: SweepSetting) {
    const { draft, right } = this.model;
    const holds = this.withControl || replacesControl(draft.case, right);
    const detectorAirKerma_uGy = holds ? (values?.detectorAirKerma_uGy ?? null) : null;
    const change = adoptSetting(right, { potential_kV, filter, detectorAirKerma_uGy });
    requestEdit(this, { change });
    const name = right === null ? 'Proposed' : draft.case.techniques[right].name;
    this.told = `${potential_kV} kV, ${filterName(filter)} adopted as ${name}; Undo takes it back.`;
  }

  private save(sweep: SweepState) {
    const whole = wholeSweep(sweep, usualCosts);
    if (!whole) return;
    const table = sweepCsv(whole.settings, whole.holdConstant, whole.investigationalAgent);
    void saveCsv(this, `${this.model.draft.case.title} sweep`, table);
  }

  private chooser() {
    const { draft } = this.model;
    const sizes = sizesOf(draft.case.patient).map(({ name }) => ({ value: name, words: name }));
    const isRunning = this.sweep?.phase === 'running';
    return html`<div class="setting">
      ${selectOf('held constant', holdChoices, this.hold, (hold) => {
        this.hold = hold as HoldConstant;
      })}
      ${selectOf('shade by SdNR² per', costChoices, this.cost, (cost) => {
        this.chosenCost = cost as CostName;
      })}
      ${selectOf('size', sizes, this.size, (size) => {
        this.chosenSize = size;
      })}
      <button type="button" class="plain" ?disabled=${this.pool === null} @click=${() =>
        isRunning
          ? this.runner?.cancel()
          : this.run()}>${isRunning ? 'Cancel' : 'Sweep again'}</button>
    </div>`;
  }

  private progress(sweep: SweepState, isStale: boolean) {
    return html`<div class="run">
      ${sweep.phase === 'running' ? html`<progress aria-label="pieces of the sweep done" max=${sweep.pieces.length} .value=${piecesDone(sweep)}></progress>` : nothing}
      <span class=${sweep.phase === 'done' ? 'soft' : 'incomplete'}>${progressWords(sweep)}</span>
      ${isStale ? html`<span class="incomplete">stale: the case has changed since this sweep</span>` : nothing}
    </div>`;
  }

  private panels(sweep: SweepState, isStale: boolean) {
    const { shown, size, model } = this;
    if (!shown) return nothing;
    const isForced = replacesControl(model.draft.case, model.right);
    const adopt = (event: CustomEvent<SweepSetting>) => this.adopt(event.detail);
    return html`<div class="results ${isStale ? 'stale' : ''}">
      <div>
        <map-panel .data=${shown.data} .settings=${shown.settings} .cost=${this.cost} .told=${this.told} @adopt=${adopt}>
          <p class="also">
            <label><input type="checkbox" .checked=${this.withControl || isForced} ?disabled=${isForced} @change=${(
              event: Event,
            ) => {
              this.withControl = (event.target as HTMLInputElement).checked;
            }} />adopt with the detector air kerma found here${isForced ? ', in place of the control curve' : ''}</label>
            <button type="button" class="plain" ?disabled=${sweep.phase !== 'done'} @click=${() => this.save(sweep)}>save all sizes as CSV</button>
          </p>
        </map-panel>
        <rules-panel .model=${model} .pool=${this.seen.isSeen ? this.pool : null} .size=${size}></rules-panel>
      </div>
      <frontier-panel .model=${model} .sweep=${sweep} .size=${size} @adopt=${adopt}></frontier-panel>
    </div>`;
  }

  override render() {
    const { sweep } = this;
    const isStale = sweep !== null && sweep.basis !== this.basis;
    const { name } = this.model.draft.case.techniques[0];
    return html`<section aria-labelledby="heading">
      <h2 id="heading">Sweep</h2>
      <div>
        <p class="note">${name} with every potential and filter of the room, its grid and acquisition as they are, one quantity held equal to what ${name} delivers as set; one frame.</p>
        ${this.chooser()}
        ${sweep ? [this.progress(sweep, isStale), this.panels(sweep, isStale)] : html`<p class="run soft">${this.pool ? 'begins when the desk is at rest' : ''}</p>`}
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'sweep-section': SweepSection;
  }
}
