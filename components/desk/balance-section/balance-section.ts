import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { holdConstants, holdConstantWords } from '../../../physics/compare.js';
import { formatNumber, formatRatio } from '../../charts/format.js';
import { techniqueInk } from '../../charts/inks.js';
import { ratioNames } from '../../charts/quantities.js';
import { ratioBar } from '../../charts/ratio-bar.js';
import { spectrumChart } from '../../charts/spectrum-chart.js';
import { investigationalWords } from '../curve-panel/curve-data.js';
import { comparisonOf, type DeskModel, evaluationOf, sizeShown } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { ratioSheet } from '../sheets/ratio-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';

/**
 * The balance: what Proposed gains and costs under every equality, what reaches the detail, and what
 * each layer does to the beam.
 *
 * Properties: `model`. Events: none. Keyboard: tables scroll with the arrow keys. Parts: none.
 */
@customElement('balance-section')
export class BalanceSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;

  static override styles = [
    chartSheet,
    ratioSheet,
    sectionSheet,
    css`
      td .ratio {
        margin: 0;
      }
      svg.chart {
        font-size: 11px;
      }
      .edge {
        stroke: var(--ink);
        stroke-dasharray: 2 2;
      }
    `,
  ];

  private ratios() {
    const comparison = comparisonOf(this.model);
    if (this.model.right === null)
      return html`<p class="note">With one technique there is nothing to weigh.</p>`;
    if (!comparison)
      return html`<p class="note">${this.model.weighing ? 'The two techniques shown cannot both be computed at this size; the findings say why.' : 'computing …'}</p>`;
    const color = techniqueInk(this.model.right).color;
    const known = ratioNames.filter(([key]) =>
      comparison.rows.some((row) => row.ratio[key] !== null),
    );
    return html`<div class="scroll" tabindex="0" role="region" aria-label="Ratios under every equality"><table>
      <caption>${comparison.to} over ${comparison.from}, size ${comparison.size}; bars about 1, a quarter to four times, logarithmic</caption>
      <thead><tr><td></td>${holdConstants.map((hold) => html`<th scope="col">${holdConstantWords[hold]}</th>`)}</tr></thead>
      <tbody>${known.map(
        ([key, name]) =>
          html`<tr><th scope="row">${name}</th>${holdConstants.map((hold) => {
            const ratio =
              comparison.rows.find((row) => row.holdConstant === hold)?.ratio[key] ?? null;
            return html`<td>${ratioBar(ratio, color)}</td>`;
          })}</tr>`,
      )}</tbody>
    </table></div>`;
  }

  private spectrum() {
    const { draft, along, left, right } = this.model;
    const shown = [left, ...(right === null ? [] : [right])];
    const spectra = shown.flatMap((ink) => {
      const { name } = draft.case.techniques[ink];
      const beam = along.find((entry) => entry.technique === name);
      return beam ? [{ ink, name, atDetail: beam.atDetail }] : [];
    });
    if (spectra.length === 0) return nothing;
    const data = {
      spectra,
      kEdges: along[0].kEdges,
      size: sizeShown(this.model).name,
      investigational: investigationalWords(draft.case),
    };
    return html`<div><h3>Spectrum reaching the detail, per frame as set</h3>${spectrumChart(data, { width: 470, height: 250 })}</div>`;
  }

  private layers() {
    const { left, right, draft } = this.model;
    const pair = [evaluationOf(this.model, left), evaluationOf(this.model, right)].filter(
      (entry) => entry !== null,
    );
    if (pair.length === 0) return nothing;
    return html`<div><h3>Primary beam through the layers</h3><table>
      <caption>transmission of air kerma from the skin; mean energy behind the layer</caption>
      <thead><tr><th scope="col">layer</th>${pair.map((entry) => html`<th scope="col" class="number">${entry.technique}</th><th scope="col" class="number">keV</th>`)}</tr></thead>
      <tbody>${draft.case.patient.layers.map(
        (layer, i) =>
          html`<tr><th scope="row">${layer.name}</th>${pair.map((entry) => {
            const through = entry.transmission.layers[i];
            return html`<td class="number">${formatNumber(through?.cumulative)}</td><td class="number">${formatNumber(through?.meanEnergy_keV)}</td>`;
          })}</tr>`,
      )}</tbody></table></div>`;
  }

  private noise() {
    const { left, right } = this.model;
    const pair = [evaluationOf(this.model, left), evaluationOf(this.model, right)].filter(
      (entry) => entry !== null,
    );
    if (pair.length === 0) return nothing;
    const terms = [
      ['quantum', 'quantum'],
      ['electronic', 'electronic'],
      ['structure', 'structure'],
      ['background', 'background'],
      ['total', 'together'],
    ] as const;
    return html`<div><h3>Noise over the detail</h3><table>
      <caption>relative standard deviation of the signal over the detail’s area</caption>
      <thead><tr><th scope="col">term</th>${pair.map((entry) => html`<th scope="col" class="number">${entry.technique}</th>`)}<th scope="col" class="number">ratio</th></tr></thead>
      <tbody>${terms.map(
        ([
          key,
          words,
        ]) => html`<tr><th scope="row">${words}</th>${pair.map((entry) => html`<td class="number">${formatNumber(entry.noise[key])}</td>`)}
        <td class="number">${pair.length > 1 && pair[0].noise[key] > 0 ? formatRatio(pair[1].noise[key] / pair[0].noise[key]) : '–'}</td></tr>`,
      )}</tbody></table></div>`;
  }

  override render() {
    return html`<section aria-labelledby="heading" class=${this.model.stale ? 'stale' : ''}>
      <h2 id="heading">Balance</h2>
      <div class="groups">
        <div class="wide">${this.ratios()}</div>
        ${this.spectrum()} ${this.layers()} ${this.noise()}
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'balance-section': BalanceSection;
  }
}
