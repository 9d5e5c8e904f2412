import { css, html, LitElement, nothing } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { Case } from '../../../physics/case/schema.js';
import { holdConstantWords } from '../../../physics/compare.js';
import type { HoldConstant } from '../../../physics/results.js';
import { costs } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { type DoseCurveData, doseCurve, pointsAt } from '../../charts/dose-curve.js';
import { doseCurveTable } from '../../charts/dose-curve-table.js';
import { formatNumber } from '../../charts/format.js';
import { type DeskModel, sizeShown } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { curveAxes, curveData } from './curve-data.js';
import '../fields/choice-field.js';

const values = [
  { value: 'sdnr', words: 'SdNR' },
  { value: 'detectedContrast', words: 'detected contrast' },
  { value: 'subjectContrast', words: 'subject contrast' },
];
const primaryDoses: readonly Case['compare']['primaryDose'][] = [
  'incidentAirKerma',
  'kermaAreaProduct',
  'entranceSurfaceAirKerma',
  'energyImparted',
  'meanAbsorbedDose',
];
const doses = primaryDoses.map((value) => ({ value, words: costs[value].words }));
/** What the scan can hold equal while potential varies. */
const holds: readonly HoldConstant[] = ['detectorAirKerma', 'sdnr', 'incidentAirKerma', 'tubeLoad'];

/**
 * The contrast-versus-dose curve: what is shown against what it costs as potential varies.
 *
 * Shows: one line per filter, both techniques, the Rose line, limits; a reading of every line at
 * one potential; the same figures as a table.
 * Properties: `model`, `scan` (null until the first answer), `stale`, `hold`, `width`, `height`.
 * Events: `case-edit` (axes), `choose-hold` with the new condition.
 * Keyboard: the slider below the plot steps potential; the pointer over the plot does the same.
 * Parts: none.
 */
@customElement('curve-panel')
export class CurvePanel extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) scan: readonly SweepSetting[] | null = null;
  @property() hold: HoldConstant = 'detectorAirKerma';
  @property({ type: Boolean }) stale = false;
  @property({ type: Number }) width = 360;
  @property({ type: Number }) height = 250;
  @state() private cursor_kV: number | null = null;

  static override styles = [
    chartSheet,
    css`
      h2 {
        margin: 0;
        font-size: var(--text);
        font-weight: 700;
        line-height: 1.5;
      }
      .condition {
        margin: 0 0 0.3rem;
        color: var(--soft);
        font-size: var(--small);
        line-height: 1.5;
      }
      .condition select {
        min-height: 24px;
      }
      .condition choice-field {
        color: var(--ink);
      }
      .reader {
        display: flex;
        align-items: center;
        gap: 0.6rem;
        font-size: var(--small);
        color: var(--soft);
      }
      input[type="range"] {
        flex: 1;
        min-width: 0;
        height: 1.25rem;
        margin: 0;
        accent-color: var(--ink);
      }
      output {
        display: block;
        min-height: 2.9em;
        font-size: var(--small);
        line-height: 1.45;
      }
    `,
  ];

  private get range(): readonly number[] {
    return [...new Set((this.scan ?? []).map((point) => point.potential_kV))].sort((a, b) => a - b);
  }

  private reading(data: DoseCurveData) {
    if (this.cursor_kV === null) return html`read every line at one potential with the slider`;
    return pointsAt(data, this.cursor_kV).map(
      ({ line, point }) =>
        html`<span>${line.filter === 'none' ? 'no filter' : line.filter}: ${formatNumber(point.dose)} ${data.doseUnit},
          ${formatNumber(point.value)}${point.forbidden ? ` (${point.forbidden})` : ''}. </span>`,
    );
  }

  override render() {
    const { model, scan } = this;
    const { draft } = model;
    const potentials = this.range;
    const from = potentials[0] ?? 0;
    const to = potentials.at(-1) ?? 0;
    const words = holdConstantWords[this.hold];
    const data = curveData(model, scan ?? [], words);
    const { value, dose } = curveAxes(draft.case);
    const choose = (chosen: Event) => {
      const detail = (chosen.target as HTMLSelectElement).value;
      this.dispatchEvent(new CustomEvent('choose-hold', { detail, bubbles: true, composed: true }));
    };
    return html`<section aria-labelledby="title">
      <h2 id="title" aria-label="${value.name} of the ${draft.case.task.detail.shape}, by ${dose.name.toLowerCase()}, at ${words}">
        <choice-field inline .draft=${draft} path="compare.leading" label="Shown" .choices=${values}></choice-field>
        of the ${draft.case.task.detail.shape}, by
        <choice-field inline .draft=${draft} path="compare.primaryDose" label="Dose" .choices=${doses}></choice-field>
      </h2>
      <p class="condition">each line: potential ${from ? `${from}–${to} kV` : ''} at
        <label class="bare"><span class="unseen">Held constant</span><select @change=${choose}>${holds.map(
          (entry) =>
            html`<option value=${entry} ?selected=${entry === this.hold}>${holdConstantWords[entry]}</option>`,
        )}</select></label>, size ${sizeShown(model).name}</p>
      ${
        scan === null
          ? html`<p class="waiting" style="height:${this.height}px">computing …</p>`
          : html`<div class=${this.stale ? 'stale' : ''}>${doseCurve(data, { width: this.width, height: this.height }, this.cursor_kV)}</div>
            <label class="reader"><span>read at</span>
              <input type="range" min=${from} max=${to} step="1" .value=${String(this.cursor_kV ?? model.draft.case.techniques[model.left].potential_kV)}
                aria-valuetext="${this.cursor_kV ?? ''} kV" @input=${(event: Event) => {
                  this.cursor_kV = Number((event.target as HTMLInputElement).value);
                }} /><span>${this.cursor_kV === null ? '' : `${this.cursor_kV} kV`}</span></label>
            <output>${this.reading(data)}</output>
            <details><summary>The same as a table</summary>${doseCurveTable(data)}</details>`
      }
      ${data.marks.length === 0 && scan !== null ? html`<p class="condition">No technique shown can be computed at this size.</p>` : nothing}
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'curve-panel': CurvePanel;
  }
}
