import { html, LitElement, nothing } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { cautions } from '../../../physics/cautions.js';
import { isCurve } from '../../../physics/control.js';
import { mixOutcomes, outcomeSentence } from '../../../physics/sizes.js';
import { techniqueCsv, techniqueTable } from '../../charts/technique-table.js';
import { thicknessChart } from '../../charts/thickness-chart.js';
import { controlOfKind } from '../../store/technique-changes.js';
import type { SweepPool } from '../../workers/sweep-pool.js';
import { requestEdit } from '../fields/case-edit.js';
import { saveCsv } from '../fields/save-csv.js';
import { type DeskModel, evaluationOf } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { ratioSheet } from '../sheets/ratio-sheet.js';
import { runSheet } from '../sheets/run-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { OwnWidth } from '../sweep-section/own-width.js';
import { WhenSeen } from '../sweep-section/when-seen.js';
import { curveColumns, readCurve } from './curve-import.js';
import { mixOf } from './mix-of.js';
import { outcomeTable } from './outcome-table.js';
import { percentileTable } from './percentile-table.js';
import { printSheet } from './print-table.js';
import { askSizes, type SizesAnswer, sizesBasis } from './sizes-ask.js';
import { readSizes, sizeColumns } from './sizes-import.js';
import { sizesSheet } from './sizes-sheet.js';
import { fileButton } from './table-import.js';
import { thicknessData } from './thickness-data.js';

/**
 * The size mix: what Proposed means for all patients, at P5, P50 and P95 and along thickness, and
 * the technique table the room would need. Sizes and control curves are read from CSV.
 *
 * Properties: `model`; `pool`, the workers that compute; `answer`, percentiles and what lies between
 * the sizes. Events: `case-edit`, `fault-report` for rows that cannot be read.
 * Keyboard: native buttons. Parts: none.
 */
@customElement('sizes-section')
export class SizesSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) pool: SweepPool | null = null;
  @property({ attribute: false }) answer: SizesAnswer | null = null;
  @state() private answeredBasis = '';
  @state() private told = '';

  private readonly seen = new WhenSeen(this);
  private readonly measured = new OwnWidth(this, '.along', 480);
  private asked = '';
  private stop = new AbortController();

  static override styles = [chartSheet, sectionSheet, ratioSheet, runSheet, sizesSheet];

  override disconnectedCallback() {
    super.disconnectedCallback();
    this.stop.abort();
  }

  /** Asks once the desk is at rest, while someone looks. */
  protected override updated() {
    const { pool, model } = this;
    if (!pool || !this.seen.isSeen || model.stale) return;
    const basis = sizesBasis(model.draft.case);
    if (basis === this.asked) return;
    this.asked = basis;
    this.stop.abort();
    this.stop = new AbortController();
    const { signal } = this.stop;
    askSizes(pool, model.draft, signal).then(
      (answer) => {
        this.answer = answer;
        this.answeredBasis = basis;
      },
      () => undefined,
    );
  }

  private get sheetTitle(): string {
    return `${this.model.draft.case.title} techniques`;
  }

  private handIn() {
    const { case: c } = this.model.draft;
    const done = (telling: Promise<string>) =>
      telling.then((told) => {
        this.told = told;
      });
    return html`<p class="actions">
      ${fileButton('read the size mix from a CSV file', sizeColumns, (file, from) => done(readSizes(file, from)))}
      ${c.techniques.map(({ name, control }, i) =>
        isCurve(control)
          ? html`<button type="button" class="plain" @click=${() => this.leaveCurve(i)}>take ${name} off its control curve</button>`
          : fileButton(`read a control curve for ${name} from CSV`, curveColumns, (file, from) =>
              done(readCurve(file, from, c, i)),
            ),
      )}
      <span role="status" class="soft">${this.told}</span></p>`;
  }

  /** Without its curve a technique holds the detector air kerma it has at the size looked at. */
  private leaveCurve(technique: number) {
    const kerma_uGy = evaluationOf(this.model, technique)?.detector.airKerma_uGy ?? 1;
    const held = Number(kerma_uGy.toPrecision(3));
    const value = controlOfKind('detectorAirKerma_uGy', held, '');
    requestEdit(this, { path: `techniques[${technique}].control`, value });
  }

  private caution() {
    const open = this.model.draft.case.techniques.filter(({ control }) => !isCurve(control));
    if (open.length === 0) return nothing;
    return html`<p class="note caution"><b>Caution.</b> The room’s exposure control is not modelled for ${open.map(({ name }) => name).join(' and ')}: every size is taken at one potential and filter. Read a control curve to see where a filter is withdrawn.</p>`;
  }

  private outcomes(isStale: boolean) {
    const { case: c } = this.model.draft;
    const mix = mixOf(this.model);
    const { outcomes } = mixOutcomes(c, mix.evaluations, mix.comparisons);
    const isWhole = mix.weighed >= mix.sizes;
    const results = this.answer?.percentiles ?? [];
    return html`<div>
      ${isWhole ? outcomes.map((outcome) => html`<p class="lead">${outcomeSentence(outcome)}</p>`) : html`<p class="incomplete">${mix.weighed} of ${mix.sizes} sizes weighed: incomplete</p>`}
      ${isWhole && outcomes.length > 0 ? html`<h3 class="next">Averaged over the mix</h3><div class="scroll" tabindex="0" role="region" aria-label="Averages over the mix">${outcomeTable(outcomes, c.techniques[0].name)}</div>` : nothing}
      ${
        results.length > 0
          ? html`<h3 class="next">Thin, middle and thick patients</h3><div class="scroll ${isStale ? 'stale' : ''}" tabindex="0" role="region" aria-label="Percentiles of the mix">${percentileTable(
              results,
              c.techniques.map(({ name }) => name),
              this.model.right,
            )}</div>`
          : nothing
      }
    </div>`;
  }

  private table() {
    const { case: c } = this.model.draft;
    const mix = mixOf(this.model);
    const { table } = mixOutcomes(c, mix.evaluations, mix.comparisons);
    if (table.length === 0) return nothing;
    const names = c.techniques.map(({ name }) => name);
    const save = () => saveCsv(this, this.sheetTitle, techniqueCsv(table));
    const print = () =>
      printSheet(
        this.sheetTitle,
        html`<h1>${c.title || 'Untitled case'}: techniques by patient size</h1>
          <p>${c.room.name}</p>${techniqueTable(table, names)}
          <footer>${cautions.join(' ')}</footer>`,
      );
    return html`<h3 class="next">Technique table by size</h3>
      <div class="scroll technique-table" tabindex="0" role="region" aria-label="Technique table by size">${techniqueTable(table, names)}</div>
      <p class="actions"><button type="button" class="plain" @click=${save}>save as CSV</button>
        <button type="button" class="plain" @click=${print}>print</button></p>`;
  }

  override render() {
    const { model } = this;
    const isStale = model.stale || this.answeredBasis !== sizesBasis(model.draft.case);
    const data = thicknessData(model, this.answer);
    const hasLine = data.lines.some(({ points }) => points.length > 1);
    return html`<section aria-labelledby="heading">
      <h2 id="heading">Sizes</h2>
      <div>
        ${this.handIn()} ${this.caution()}
        <div class="halves ${model.stale ? 'stale' : ''}">
          ${this.outcomes(isStale)}
          <div class="along">${
            hasLine
              ? html`<h3>Along patient thickness, each as its own control has it</h3>
                <p class="note">cross: a limit forbids it there</p>${thicknessChart(data, this.measured.width)}`
              : html`<p class="note">One size: there is nothing to draw along thickness.</p>`
          }</div>
        </div>
        ${this.table()}
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'sizes-section': SizesSection;
  }
}
