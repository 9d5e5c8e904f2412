import { html, LitElement, nothing } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { CheckReport, CheckRequest } from '../../../physics/check-by-transport/index.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { convergenceChart } from '../../charts/transport-convergence.js';
import { type DeskModel, sizeShown } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { runSheet } from '../sheets/run-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { type CheckState, checkBasis, isRunning } from './check-state.js';
import { balanceTable, fateTable, layerTable, quantityTable } from './check-tables.js';
import { announcement, countText, progressWords } from './check-words.js';
import { convergenceData } from './convergence-data.js';
import { transportSheet } from './transport-sheet.js';
import '../finding-list/finding-list.js';

const photonChoices = [100_000, 300_000, 1_000_000, 3_000_000, 10_000_000];
const usualPhotons = 1_000_000;

/**
 * The check by transport: photons are flown through the stack of one technique at one size, and what
 * they score is set beside the estimate the desk shows, quantity by quantity, while the standard
 * errors fall.
 *
 * Properties: `model`; `check`, the run under way or last flown (null before the first);
 * `tracksDrawn`, whether the paths of its photons are drawn in the stack.
 * Events: `run-check` (a CheckRequest), `cancel-check`, `draw-tracks` (boolean).
 * Keyboard: native fields and buttons; the focus stays on the button that began or cancelled.
 * Parts: none.
 */
@customElement('transport-section')
export class TransportSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) check: CheckState | null = null;
  @property({ type: Boolean }) tracksDrawn = false;

  /** Chosen for the next run; null follows the desk. */
  @state() private technique: string | null = null;
  @state() private size: string | null = null;
  @state() private photons = usualPhotons;
  @state() private seed = 1;
  /** Row of the report the chart shows; null the one that matters most. */
  @state() private charted: number | null = null;

  static override styles = [chartSheet, sectionSheet, runSheet, transportSheet];

  private tell(name: string, detail: unknown) {
    this.dispatchEvent(new CustomEvent(name, { detail, bubbles: true, composed: true }));
  }

  private get request(): CheckRequest {
    const { case: c } = this.model.draft;
    const known = (names: readonly string[], name: string | null, otherwise: string) =>
      name !== null && names.includes(name) ? name : otherwise;
    return {
      technique: known(
        c.techniques.map(({ name }) => name),
        this.technique,
        c.techniques[this.model.left].name,
      ),
      size: known(
        sizesOf(c.patient).map(({ name }) => name),
        this.size,
        sizeShown(this.model).name,
      ),
      photons: this.photons,
      seed: this.seed,
    };
  }

  private choice(
    label: string,
    names: readonly string[],
    chosen: string,
    choose: (name: string) => void,
  ) {
    const isBusy = this.check !== null && isRunning(this.check);
    return html`<label><span>${label}</span><select ?disabled=${isBusy} @change=${(event: Event) =>
      choose((event.target as HTMLSelectElement).value)}>${names.map(
      (name) => html`<option value=${name} .selected=${name === chosen}>${name}</option>`,
    )}</select></label>`;
  }

  private setting(request: CheckRequest) {
    const { case: c } = this.model.draft;
    const isBusy = this.check !== null && isRunning(this.check);
    return html`<div class="setting">
      ${this.choice(
        'technique',
        c.techniques.map(({ name }) => name),
        request.technique,
        (name) => {
          this.technique = name;
        },
      )}
      ${this.choice(
        'size',
        sizesOf(c.patient).map(({ name }) => name),
        request.size,
        (name) => {
          this.size = name;
        },
      )}
      ${this.choice('photons', photonChoices.map(countText), countText(request.photons), (name) => {
        this.photons = photonChoices.find((count) => countText(count) === name) ?? usualPhotons;
      })}
      <label><span>seed</span><input type="text" inputmode="numeric" autocomplete="off" .value=${String(request.seed)} ?disabled=${isBusy}
        @change=${(event: Event) => this.takeSeed(event.target as HTMLInputElement)} /></label>
      <button type="button" class="plain" @click=${() =>
        isBusy
          ? this.tell('cancel-check', null)
          : this.tell('run-check', request)}>${isBusy ? 'Cancel' : 'Run the check'}</button>
    </div>`;
  }

  /** A seed is a whole number from 0; anything else is put back. */
  private takeSeed(input: HTMLInputElement) {
    if (/^\d{1,9}$/.test(input.value.trim())) this.seed = Number(input.value);
    input.value = String(this.seed);
  }

  private progress(check: CheckState, isStale: boolean) {
    const { report, request, phase } = check;
    const isWhole = phase === 'done';
    return html`<div class="run">
      ${isRunning(check) ? html`<progress aria-label="photons flown" max=${request.photons} .value=${report?.photons ?? 0}></progress>` : nothing}
      <span class=${isWhole ? '' : 'incomplete'}>${progressWords(check)}</span>
      <span class="soft">${request.technique}${report ? `, ${report.setting}` : ''}, size ${request.size}, seed ${request.seed}</span>
      ${isStale ? html`<span class="incomplete">stale: the case has changed since this run</span>` : nothing}
    </div>`;
  }

  private chart(check: CheckState, report: CheckReport, ink: number) {
    const usual = report.rows.findIndex(({ quantity }) => quantity === 'sprBehindGrid');
    const charted = this.charted ?? Math.max(0, usual);
    const data = convergenceData(check, report, charted, ink);
    const choose = (event: Event) => {
      this.charted = Number((event.target as HTMLSelectElement).value);
    };
    return html`<div>
      <h3><label><span class="unseen">Quantity charted</span><select @change=${choose}>${report.rows.map(
        (row, i) =>
          html`<option value=${i} .selected=${i === charted}>${[row.name, row.layer].filter(Boolean).join(', ')}</option>`,
      )}</select></label></h3>
      <p class="note">${data.unit ? `${data.unit} per frame as set; ` : ''}line: estimate and its stated band; sign: transport with one and two standard errors</p>
      ${convergenceChart(data, { width: 360, height: 232 })}
    </div>`;
  }

  private paths({ fates, tracks }: CheckState, isStale: boolean) {
    if (!fates || tracks.length === 0) return nothing;
    const draw = (event: Event) =>
      this.tell('draw-tracks', (event.target as HTMLInputElement).checked);
    return html`<div>
      <label class="check"><input type="checkbox" .checked=${this.tracksDrawn} ?disabled=${isStale} @change=${draw} />draw the paths of these photons in the stack above</label>
      ${fateTable(fates)}
    </div>`;
  }

  private results(check: CheckState, isStale: boolean) {
    const { report, request } = check;
    if (!report) return nothing;
    const { techniques } = this.model.draft.case;
    const ink = Math.max(
      0,
      techniques.findIndex(({ name }) => name === request.technique),
    );
    return html`<div class="results ${isStale ? 'stale' : ''}">
      <div class="tables">
        <div class="scroll" tabindex="0" role="region" aria-label="Estimate against transport">${quantityTable(report, ink)}</div>
        <div class="scroll" tabindex="0" role="region" aria-label="Absorbed dose by layer">${layerTable(report, ink)}</div>
        <finding-list .findings=${report.findings} ?stale=${isStale}></finding-list>
      </div>
      <div class="beside">
        ${this.chart(check, report, ink)} ${balanceTable(report)} ${this.paths(check, isStale)}
      </div>
    </div>`;
  }

  override render() {
    const { model, check } = this;
    const isStale =
      check !== null && check.basis !== checkBasis(model.draft.case, check.request.technique);
    return html`<section aria-labelledby="heading">
      <h2 id="heading">Check by transport</h2>
      <div>
        <p class="note">Photons are flown one by one through the stack, without the detail, in the beam, field, gap, grid and detector of one technique at one size. What they score is set beside the estimate the desk shows.</p>
        ${this.setting(this.request)}
        ${check ? [this.progress(check, isStale), this.results(check, isStale)] : nothing}
        <p class="unseen" role="status">${announcement(check)}</p>
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'transport-section': TransportSection;
  }
  interface HTMLElementEventMap {
    'run-check': CustomEvent<CheckRequest>;
    'cancel-check': CustomEvent<null>;
    'draw-tracks': CustomEvent<boolean>;
  }
}
