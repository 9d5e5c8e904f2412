import { html, nothing, type TemplateResult } from 'lit';
import {
  type CheckReport,
  type CheckRow,
  type Fate,
  fates,
  fateWords,
  statedBalance_fraction,
} from '../../../physics/check-by-transport/index.js';
import type { Estimated } from '../../../physics/transport/index.js';
import { formatNumber } from '../../charts/format.js';
import { differenceBar } from '../../charts/transport-difference.js';
import { verdictSign, verdictWords } from './check-words.js';

const headings = html`<th scope="col" class="number">estimate</th>
  <th scope="col" class="number">transport</th>
  <th scope="col" class="number">± s.e.</th>
  <th scope="col" class="number">difference</th>
  <th scope="col" class="number">z</th>`;

const signed = (value: number, digits: number): string =>
  `${value > 0 ? '+' : ''}${value.toFixed(digits).replace('-', '−')}`;

/** A standard error in percent of its value. */
const relative = ({ value, standardError }: Estimated): string =>
  value === 0 || standardError === null
    ? '–'
    : `${formatNumber((100 * standardError) / Math.abs(value), 2)} %`;

/** Estimate, transport and how they lie to each other. */
function cells(row: CheckRow, ink: number): TemplateResult {
  const { estimate, transport, difference_percent, tolerance_percent, z } = row;
  const { value, standardError } = transport;
  const isKnown =
    difference_percent !== null && tolerance_percent !== null && standardError !== null;
  return html`<td class="number">${formatNumber(estimate)}</td>
    <td class="number">${formatNumber(value)}</td>
    <td class="number soft">${relative(transport)}</td>
    <td class="number">${
      isKnown
        ? html`${differenceBar(
            {
              difference_percent,
              standardError_percent: (100 * standardError) / Math.abs(value),
              tolerance_percent,
            },
            ink,
          )}<span class="against">${signed(difference_percent, 1)} %</span>`
        : nothing
    }</td>
    <td class="number">${z === null ? '–' : signed(z, 1)}</td>`;
}

const verdictCell = (row: CheckRow): TemplateResult =>
  html`<td class="verdict ${row.verdict ?? ''}"><span aria-hidden="true">${verdictSign(row)}</span> ${verdictWords(row)}</td>`;

/** Scatter, backscatter and energy imparted. */
export function quantityTable({ rows }: CheckReport, ink: number): TemplateResult {
  return html`<table>
    <caption>detector signal at the field centre, energy per frame as set; difference of the estimate from transport within its stated band, with one and two standard errors; z: difference in standard errors</caption>
    <thead><tr><th scope="col">quantity</th>${headings}<th scope="col">verdict</th></tr></thead>
    <tbody>${rows
      .filter(({ layer }) => layer === null)
      .map(
        (row) =>
          html`<tr><th scope="row">${row.name}${row.unit ? `, ${row.unit}` : ''}</th>${cells(row, ink)}${verdictCell(row)}</tr>`,
      )}</tbody>
  </table>`;
}

/** Absorbed dose of every layer: infinite-width average compared, central column beside it. */
export function layerTable({ rows }: CheckReport, ink: number): TemplateResult {
  const columns = rows.filter(({ quantity }) => quantity === 'columnAbsorbedDose');
  return html`<table>
    <caption>absorbed dose, mGy per frame as set: infinite-width average of each layer${
      columns.length > 0 ? '; central column: the middle quarter of the field, transport alone' : ''
    }</caption>
    <thead><tr><th scope="col">layer</th>${headings}<th scope="col">verdict</th>${
      columns.length > 0
        ? html`<th scope="col" class="number">central column</th><th scope="col" class="number">± s.e.</th>`
        : nothing
    }</tr></thead>
    <tbody>${rows
      .filter(({ quantity }) => quantity === 'layerAbsorbedDose')
      .map((row, k) => {
        const column = columns[k]?.transport;
        return html`<tr><th scope="row">${row.layer}</th>${cells(row, ink)}${verdictCell(row)}${
          column
            ? html`<td class="number">${formatNumber(column.value)}</td><td class="number soft">${relative(column)}</td>`
            : nothing
        }</tr>`;
      })}</tbody>
  </table>`;
}

const shares = [
  ['absorbed', 'absorbed'],
  ['escapedEntrance', 'left at the entrance'],
  ['escapedSide', 'left by the sides'],
  ['transmittedPrimary', 'at the detector, primary'],
  ['transmittedScatter', 'at the detector, scatter'],
] as const;

/** Where the energy of the beam went. */
export function balanceTable({ energyBalance, isBalanced }: CheckReport): TemplateResult {
  const percent = (share: number): string =>
    share === 0 ? '0' : `${(100 * share).toFixed(share < 0.01 ? 3 : 2)} %`;
  const within = `${100 * statedBalance_fraction} %`;
  return html`<table class="balance">
    <caption>where the energy of the beam went</caption>
    <thead class="unseen"><tr><th scope="col">share</th><th scope="col">%</th></tr></thead>
    <tbody>${shares.map(
      ([
        key,
        words,
      ]) => html`<tr><th scope="row">${words}</th><td class="number">${percent(energyBalance[key])}</td>
        <td><span class="share" style="width:${(4 * energyBalance[key]).toFixed(3)}rem"></span></td></tr>`,
    )}
    <tr><th scope="row">found again</th><td class="number">${percent(energyBalance.sum)}</td>
      <td class="words">${isBalanced ? `closes within ${within}` : `does not close within ${within}`}</td></tr></tbody>
  </table>`;
}

/** How the photons drawn in the stack ended: the drawing in numbers. */
export function fateTable(counts: Readonly<Record<Fate, number>>): TemplateResult {
  const told = fates.filter((fate) => counts[fate] > 0);
  const total = fates.reduce((sum, fate) => sum + counts[fate], 0);
  return html`<table class="fates">
    <caption>the first ${total} photons of the run, by how they ended</caption>
    <thead class="unseen"><tr><th scope="col">end</th><th scope="col">photons</th></tr></thead>
    <tbody>${told.map(
      (fate) =>
        html`<tr><th scope="row">${fateWords[fate]}</th><td class="number">${counts[fate]}</td></tr>`,
    )}</tbody>
  </table>`;
}
