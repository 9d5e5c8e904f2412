import { html, nothing, type TemplateResult } from 'lit';
import type { MixOutcome } from '../../../physics/sizes.js';
import { formatPercent } from '../../charts/format.js';
import { techniqueInk } from '../../charts/inks.js';
import { ratioBar } from '../../charts/ratio-bar.js';

/** Who they are, where there are any. */
const sizesSaid = (names: readonly string[]): TemplateResult | typeof nothing =>
  names.length > 0 ? html` <span class="soft">${names.join(', ')}</span>` : nothing;

/** What every Proposed technique means for the mix: averages over patients, and who pays. */
export function outcomeTable(outcomes: readonly MixOutcome[], current: string): TemplateResult {
  const row = (name: string, cell: (outcome: MixOutcome, color: string) => unknown) =>
    html`<tr><th scope="row">${name}</th>${outcomes.map((outcome, i) => html`<td>${cell(outcome, techniqueInk(i + 1).color)}</td>`)}</tr>`;
  const ratio =
    (key: 'incidentAirKermaRatio' | 'kermaAreaProductRatio' | 'energyImpartedRatio') =>
    (outcome: MixOutcome, color: string) =>
      ratioBar(outcome[key], color);
  const isPartial = outcomes.some(({ comparedShare }) => comparedShare < 1 - 1e-9);
  return html`<table>
    <caption>over ${current}, per run as set, averaged over patients: Σ share × Proposed / Σ share × ${current}</caption>
    <thead><tr><td></td>${outcomes.map(({ technique }, i) => html`<th scope="col" style="color:${techniqueInk(i + 1).color}">${technique}</th>`)}</tr></thead>
    <tbody>
      ${row('incident air kerma', ratio('incidentAirKermaRatio'))}
      ${row('kerma–area product', ratio('kermaAreaProductRatio'))}
      ${row('energy imparted', ratio('energyImpartedRatio'))}
      ${row('patients worse off', (outcome) => html`${formatPercent(outcome.worseOffShare)}${sizesSaid(outcome.worseOffSizes)}`)}
      ${row('patients at sizes the room forbids', (outcome) => html`${formatPercent(outcome.infeasibleShare)}${sizesSaid(outcome.infeasibleSizes)}`)}
      ${isPartial ? row('patients the averages speak for', (outcome) => formatPercent(outcome.comparedShare)) : nothing}
    </tbody></table>`;
}
