import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { holdConstantWords } from '../../../physics/compare.js';
import type { ComparisonRow, HoldConstant, Ratios } from '../../../physics/results.js';
import { formatRatio } from '../../charts/format.js';
import { ratioNames } from '../../charts/quantities.js';
import { comparisonOf, type DeskModel } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { marginHolds } from './margin-holds.js';

/** What the margin has room for, besides the dose the case leads with; Balance shows all. */
const inMargin: readonly (keyof Ratios)[] = [
  'incidentAirKerma',
  'energyImparted',
  'tubeLoad',
  'power',
  'detectedContrast',
  'sdnr',
];

/**
 * Proposed over Current under every equality, one column each.
 *
 * Shows: a ratio or a dash where it cannot be reached; quantities no column has are left out.
 * Properties: `model`. Events: none. Keyboard: none. Parts: none.
 */
@customElement('comparison-table')
export class ComparisonTable extends LitElement {
  @property({ attribute: false }) model!: DeskModel;

  static override styles = [
    chartSheet,
    css`
      table {
        margin-block-start: 0.5rem;
      }
      tbody th {
        color: var(--soft);
      }
      tbody th {
        white-space: nowrap;
      }
      thead th:not(:first-child) {
        width: 4.5rem;
      }
      thead th:nth-child(2),
      thead th:nth-child(3) {
        width: 2.9rem;
      }
      th,
      td {
        padding-inline-start: 0.4rem;
      }
    `,
  ];

  override render() {
    const comparison = comparisonOf(this.model);
    if (!comparison) return nothing;
    const rowOf = (hold: HoldConstant): ComparisonRow | undefined =>
      comparison.rows.find((row) => row.holdConstant === hold);
    const { primaryDose } = this.model.draft.case.compare;
    const known = ratioNames.filter(
      ([key]) =>
        (inMargin.includes(key) || key === primaryDose) &&
        comparison.rows.some((row) => row.ratio[key] !== null),
    );
    return html`<table class=${this.model.stale ? 'stale' : ''}>
      <caption class="unseen">Ratios of ${comparison.to} to ${comparison.from}, size ${comparison.size}</caption>
      <thead><tr><th scope="col">${comparison.to} over ${comparison.from}</th>${marginHolds.map((hold) => html`<th scope="col">${holdConstantWords[hold]}</th>`)}</tr></thead>
      <tbody>${known.map(
        ([key, name]) =>
          html`<tr><th scope="row">${name}</th>${marginHolds.map(
            (hold) => html`<td>${formatRatio(rowOf(hold)?.ratio[key]).replace('×', '')}</td>`,
          )}</tr>`,
      )}</tbody>
    </table>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'comparison-table': ComparisonTable;
  }
}
