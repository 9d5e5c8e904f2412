import { html, LitElement, nothing, type PropertyValues } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { HoldConstant } from '../../../physics/results.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import type { CostName } from '../../../physics/sweep/costs.js';
import { type MappedSetting, wholeRoom } from '../../../physics/sweep.js';
import { sweepCsv } from '../../charts/sweep-csv.js';
import {
  filterName,
  type MapCursor,
  mapLegend,
  mapWords,
  sweepMap,
} from '../../charts/sweep-map.js';
import { mapLayout, placeAt, type SweepMapData } from '../../charts/sweep-map-layout.js';
import { sweepMapTable } from '../../charts/sweep-map-table.js';
import { fileNameFor } from '../../store/case-files.js';
import { saveTable } from '../../store/save-table.js';
import type { SweepPool } from '../../workers/sweep-pool.js';
import { requestEdit } from '../fields/case-edit.js';
import { type DeskModel, sizeShown } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { runSheet } from '../sheets/run-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { adoptSetting, replacesControl } from './adopt.js';
import { mapData } from './map-data.js';
import { movedCursor } from './map-keys.js';
import { OwnWidth } from './own-width.js';
import { selectOf } from './select-of.js';
import { settingWords } from './setting-words.js';
import { costChoices, holdChoices } from './sweep-choices.js';
import { type SweepRunner, sweepRunner } from './sweep-runner.js';
import { sweepSheet } from './sweep-sheet.js';
import { type SweepState, settingsOfSize, sweepBasis, wholeSweep } from './sweep-state.js';
import { progressWords } from './sweep-words.js';
import { WhenSeen } from './when-seen.js';
import './frontier-panel.js';
import './rules-panel.js';

/** An edit settles this long before the room is swept again. */
const settle_ms = 350;

/**
 * Every setting of the room at every size under one condition: the map of a figure of merit, what
 * the room forbids, the frontier, and rules of thumb. Computed while it is on the screen.
 *
 * Properties: `model`; `pool`, the workers that compute; `sweep`, the sweep shown.
 * Events: `case-edit` when a setting is adopted as Proposed.
 * Keyboard: on the map arrows read the neighbouring setting, Page Up/Down ten potentials on, Home
 * and End the ends; Enter or Space adopts. Parts: none.
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
  @state() private cursor: MapCursor | null = null;
  @state() private withControl = false;
  @state() private told = '';

  private readonly seen = new WhenSeen(this);
  private readonly measured = new OwnWidth(this, '.map-box', 788);
  private runner: SweepRunner | null = null;
  private settling: ReturnType<typeof setTimeout> | undefined;

  static override styles = [chartSheet, sectionSheet, runSheet, sweepSheet];

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

  /** Sweeps by itself once an edit has settled, while someone looks; a cancelled sweep stays so. */
  protected override updated(changed: PropertyValues) {
    const isDue =
      this.pool !== null &&
      this.seen.isSeen &&
      !this.model.stale &&
      this.sweep?.basis !== this.basis;
    if (!isDue) return;
    if (this.settling === undefined || changed.has('model') || changed.has('hold')) {
      clearTimeout(this.settling);
      this.settling = setTimeout(() => {
        this.settling = undefined;
        this.run();
      }, settle_ms);
    }
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

  private adopt({ potential_kV, filter, values }: MappedSetting) {
    const { draft, right } = this.model;
    const holds = this.withControl || replacesControl(draft.case, right);
    const detectorAirKerma_uGy = holds ? (values?.detectorAirKerma_uGy ?? null) : null;
    const change = adoptSetting(right, { potential_kV, filter, detectorAirKerma_uGy });
    requestEdit(this, { change });
    const name = right === null ? 'Proposed' : draft.case.techniques[right].name;
    this.told = `${potential_kV} kV, ${filterName(filter)} adopted as ${name}; Undo takes it back.`;
  }

  private settingAt(data: SweepMapData, settings: readonly MappedSetting[], at: MapCursor | null) {
    return at === null
      ? undefined
      : settings.find(
          ({ potential_kV, filter }) =>
            potential_kV === data.potentials_kV[at.column] && filter === data.rows[at.row]?.filter,
        );
  }

  private pointed(event: PointerEvent | MouseEvent, data: SweepMapData): MapCursor | null {
    const box = (event.currentTarget as Element).getBoundingClientRect();
    return placeAt(mapLayout(data, this.measured.width), data, {
      x: event.clientX - box.left,
      y: event.clientY - box.top,
    });
  }

  private onKey(event: KeyboardEvent, data: SweepMapData, settings: readonly MappedSetting[]) {
    if (event.key === 'Enter' || event.key === ' ') {
      const setting = this.settingAt(data, settings, this.cursor);
      if (setting) this.adopt(setting);
      event.preventDefault();
      return;
    }
    const moved = movedCursor(data, this.cursor, event.key);
    if (!moved) return;
    event.preventDefault();
    this.cursor = moved;
    this.told = '';
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
    const total = sweep.pieces.length;
    const done = sweep.pieces.filter(Boolean).length;
    return html`<div class="run">
      ${sweep.phase === 'running' ? html`<progress aria-label="pieces of the sweep done" max=${total} .value=${done}></progress>` : nothing}
      <span class=${sweep.phase === 'done' ? 'soft' : 'incomplete'}>${progressWords(sweep)}</span>
      ${isStale ? html`<span class="incomplete">stale: the case has changed since this sweep</span>` : nothing}
    </div>`;
  }

  private reading(setting: MappedSetting | undefined, best: number | null) {
    if (this.told) return html`${this.told}`;
    if (!setting)
      return html`Read a setting with the pointer, or with the arrow keys once the map has the focus. A click or Enter adopts it as Proposed.`;
    const { name, values, limits } = settingWords(setting, this.cost, best);
    return html`<b>${name}</b> ${values} ${limits ? html`<b>Forbidden.</b> ${limits}` : nothing}`;
  }

  private map(data: SweepMapData, settings: readonly MappedSetting[]) {
    const setting = this.settingAt(data, settings, this.cursor);
    return html`<h3>${data.meritName} of every setting, ${data.holdConstant}, size ${data.size}</h3>
      <div class="map-box" tabindex="0" role="application" aria-roledescription="map of settings" aria-label=${mapWords(data)} aria-describedby="reading"
        @keydown=${(event: KeyboardEvent) => this.onKey(event, data, settings)}
        @pointermove=${(event: PointerEvent) => {
          const at = this.pointed(event, data);
          if (at === null) return;
          if (at.column !== this.cursor?.column || at.row !== this.cursor.row) this.told = '';
          this.cursor = at;
        }}
        @click=${(event: MouseEvent) => {
          const clicked = this.settingAt(data, settings, this.pointed(event, data));
          if (clicked) this.adopt(clicked);
        }}>${sweepMap(data, this.measured.width, this.cursor)}</div>
      ${mapLegend(data)}
      <output id="reading" aria-live="polite">${this.reading(setting, data.best?.merit ?? null)}</output>`;
  }

  private below(data: SweepMapData, sweep: SweepState) {
    const { draft, right } = this.model;
    const whole = wholeSweep(sweep, [this.cost]);
    const isForced = replacesControl(draft.case, right);
    const save = () =>
      whole &&
      saveTable(
        sweepCsv(whole.settings, whole.holdConstant, whole.investigationalAgent),
        fileNameFor(`${draft.case.title} sweep`).replace('.case.json', '.csv'),
      );
    return html`<p class="also">
        <label><input type="checkbox" .checked=${this.withControl || isForced} ?disabled=${isForced} @change=${(
          event: Event,
        ) => {
          this.withControl = (event.target as HTMLInputElement).checked;
        }} />adopt with the detector air kerma found here${isForced ? ', in place of the control curve' : ''}</label>
        <button type="button" class="plain" ?disabled=${whole === null} @click=${save}>save all sizes as CSV</button>
      </p>
      <details><summary>The map as a table</summary>${sweepMapTable(data)}</details>`;
  }

  override render() {
    const { sweep, size } = this;
    const isStale = sweep !== null && sweep.basis !== this.basis;
    const known = sweep && settingsOfSize(sweep, size, [this.cost]);
    const data = sweep && known && mapData(this.model, sweep, size, known.settings, this.cost);
    const { name } = this.model.draft.case.techniques[0];
    return html`<section aria-labelledby="heading">
      <h2 id="heading">Sweep</h2>
      <div>
        <p class="note">${name} with every potential and filter of the room, its grid and acquisition as they are, one quantity held equal to what ${name} delivers as set; one frame.</p>
        ${this.chooser()}
        ${sweep ? this.progress(sweep, isStale) : html`<p class="run soft">${this.pool ? 'begins when the desk is at rest' : ''}</p>`}
        ${
          data && sweep && known && known.settings.length > 0
            ? html`<div class="results ${isStale ? 'stale' : ''}">
              <div>${this.map(data, known.settings)} ${this.below(data, sweep)}
                <rules-panel .model=${this.model} .pool=${this.seen.isSeen ? this.pool : null} .size=${size}></rules-panel></div>
              <frontier-panel .model=${this.model} .sweep=${sweep} .size=${size} @adopt=${(
                event: CustomEvent<MappedSetting>,
              ) => this.adopt(event.detail)}></frontier-panel>
            </div>`
            : nothing
        }
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'sweep-section': SweepSection;
  }
}
