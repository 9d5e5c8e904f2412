import { html, LitElement, nothing } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { RuleDeparture } from '../../../physics/rules-of-thumb.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { rulesChart, rulesTable } from '../../charts/rules-chart.js';
import { filterName } from '../../charts/sweep-map.js';
import type { SweepPool } from '../../workers/sweep-pool.js';
import type { DeskModel } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { OwnWidth } from './own-width.js';
import { panelSheet } from './panel-sheet.js';
import { sweepSheet } from './sweep-sheet.js';
import { sweepBasis } from './sweep-state.js';

/**
 * Where rules of thumb part from the model by more than a fifth, with Current's filter at one size.
 *
 * Properties: `model`; `pool`, null while nobody looks; `size`; `departures`, the answer shown.
 * Events: none. Keyboard: none. Parts: none.
 */
@customElement('rules-panel')
export class RulesPanel extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) pool: SweepPool | null = null;
  @property() size = '';
  @state() departures: readonly RuleDeparture[] | null = null;
  private asked = '';
  private readonly measured = new OwnWidth(this, '.departures', 560);

  static override styles = [chartSheet, sectionSheet, sweepSheet, panelSheet];

  protected override updated() {
    const { pool, model } = this;
    if (!pool || model.stale) return;
    const { draft } = model;
    const size = sizesOf(draft.case.patient).find(({ name }) => name === this.size);
    const basis = `${this.size} ${sweepBasis(draft.case, 'tubeLoad')}`;
    if (!size || basis === this.asked) return;
    this.asked = basis;
    pool.run(draft, [{ kind: 'rules', size }]).then(
      ([departures]) => {
        if (this.asked === basis) this.departures = departures;
      },
      () => {
        if (this.asked === basis) this.departures = null;
      },
    );
  }

  override render() {
    if (!this.departures || this.departures.length === 0) return nothing;
    const { filter } = this.model.draft.case.techniques[0];
    const data = { departures: this.departures, size: this.size, filter: filterName(filter) };
    return html`<h3 class="next">Rules of thumb against the model, ${data.filter}, size ${this.size}</h3>
      <p class="note">Detector air kerma per mAs: 15 % more potential doubles it, 10 kV more doubles it, 3 cm more patient halves it (common practice, no source). Marked where a rule is more than a fifth off.</p>
      <div class="departures">${rulesChart(data, { width: Math.min(560, this.measured.width), height: 220 })}</div>
      <details><summary>The same as a table</summary>${rulesTable(data)}</details>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'rules-panel': RulesPanel;
  }
}
