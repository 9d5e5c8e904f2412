import { css, html, LitElement } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { formatRatio } from '../../charts/format.js';
import { techniqueInk } from '../../charts/inks.js';
import {
  type Quantity,
  type QuantityGroup,
  quantities,
  quantityGroups,
} from '../../charts/quantities.js';
import { addTechnique, removeTechnique } from '../../store/technique-changes.js';
import { requestEdit } from '../fields/case-edit.js';
import { type DeskModel, evaluationOf, sizeShown } from '../model/desk-model.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { acquisitionFields } from '../technique-fields/acquisition-fields.js';
import { controlFields } from '../technique-fields/control-fields.js';
import {
  filterField,
  gridField,
  potentialField,
  techniqueName,
} from '../technique-fields/setting-fields.js';
import '../figure-value/figure-value.js';

/**
 * All techniques side by side: what is set, then every computed quantity with its ratio to Current.
 *
 * Properties: `model`. Events: `case-edit`, `explain`. Keyboard: that of its fields. Parts: none.
 */
@customElement('techniques-section')
export class TechniquesSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;

  static override styles = [
    sectionSheet,
    css`
      .name {
        display: none;
      }
      .technique {
        margin: 0;
        --field-size: var(--text);
      }
      .switch,
      .forbidden {
        display: none;
      }
      td {
        --field-size: var(--text);
        --value: var(--text);
        white-space: normal;
      }
      td.set {
        max-width: 17rem;
        min-width: 12rem;
        line-height: 1.6;
      }
      .results {
        /* Wide enough for names and for a figure with its ratio per technique; narrower pages scroll. */
        --name: 12.5rem;
        --needed: calc(var(--name) + var(--techniques) * 6.8rem);
        columns: var(--needed);
        column-gap: 3rem;
        margin-block-start: 1.2rem;
      }
      .results table {
        width: 100%;
        min-width: var(--needed);
        break-inside: avoid;
        margin-block-end: 1.2rem;
      }
      .results table {
        table-layout: fixed;
      }
      .results th:first-child {
        width: var(--name);
        white-space: normal;
      }
      .results td {
        white-space: nowrap;
        padding-inline-end: 0.4rem;
      }
      .unit {
        color: var(--soft);
        white-space: nowrap;
      }
      .ratio {
        color: var(--soft);
        padding-inline-start: 0.6rem;
      }
      @media (max-width: 719px) {
        .results {
          --name: 8.5rem;
        }
      }
    `,
  ];

  private setRow(label: string, content: (model: DeskModel, technique: number) => unknown) {
    return html`<tr><th scope="row">${label}</th>${this.model.draft.case.techniques.map(
      (_, i) =>
        html`<td class="set" style="--field-ink:${techniqueInk(i).color}">${content(this.model, i)}</td>`,
    )}</tr>`;
  }

  private quantityRow(entry: Quantity) {
    const { model } = this;
    const values = model.draft.case.techniques.map((_, i) => {
      const evaluation = evaluationOf(model, i);
      return evaluation ? entry.of(evaluation) : null;
    });
    if (values.every((value) => value === null)) return null;
    const [base] = values;
    return html`<tr><th scope="row">${entry.name}${entry.per ? `, ${entry.per}` : ''} <span class="unit">${entry.unit}</span></th>${values.map(
      (
        value,
        i,
      ) => html`<td style="--field-ink:${techniqueInk(i).color}"><figure-value small unit="" quantity=${entry.id} .value=${value} ?stale=${model.stale}
          technique=${model.draft.case.techniques[i].name}></figure-value>${
            i > 0 && base && value !== null
              ? html`<span class="ratio">${formatRatio(value / base)}</span>`
              : null
          }</td>`,
    )}</tr>`;
  }

  private results(group: QuantityGroup) {
    const rows = quantities
      .filter((entry) => entry.group === group)
      .map((entry) => this.quantityRow(entry));
    if (rows.every((row) => row === null)) return null;
    return html`<table>
      <thead><tr><th scope="col">${group}</th>${this.model.draft.case.techniques.map(
        ({ name }, i) => html`<th scope="col" style="color:${techniqueInk(i).color}">${name}</th>`,
      )}</tr></thead>
      <tbody>${rows}</tbody>
    </table>`;
  }

  override render() {
    const { techniques } = this.model.draft.case;
    const ask = (change: ReturnType<typeof addTechnique>) => (event: Event) =>
      requestEdit(event.target as HTMLElement, { change });
    return html`<section aria-labelledby="heading">
      <h2 id="heading">Techniques</h2>
      <div>
        <p class="note">As set, size ${sizeShown(this.model).name}. Ratios are to ${techniques[0].name}. Click a number for how it is computed.</p>
        <div class="scroll" tabindex="0" role="region" aria-label="Techniques side by side"><table>
          <thead><tr><td></td>${techniques.map((_, i) => html`<th scope="col" style="color:${techniqueInk(i).color};--field-ink:${techniqueInk(i).color}">${techniqueName(this.model, i)}</th>`)}</tr></thead>
          <tbody>
            ${this.setRow('Potential', potentialField)} ${this.setRow('Filter, half-value layer', filterField)}
            ${this.setRow('Grid, Bucky factor', gridField)} ${this.setRow('Control holds, per frame', controlFields)}
            ${this.setRow('Acquisition', acquisitionFields)}
            <tr><td></td>${techniques.map(
              (technique, i) => html`<td>
              <button class="plain" type="button" @click=${ask(addTechnique(i))} aria-label="Copy ${technique.name} as a new technique">copy</button>
              <button class="plain" type="button" ?disabled=${techniques.length < 2} @click=${ask(removeTechnique(i))} aria-label="Remove ${technique.name}">remove</button></td>`,
            )}</tr>
          </tbody>
        </table></div>
        <div class="results scroll" style="--techniques:${techniques.length}" tabindex="0" role="region" aria-label="Quantities of every technique">${quantityGroups.map((group) => this.results(group))}</div>
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'techniques-section': TechniquesSection;
  }
}
