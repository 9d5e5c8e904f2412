import { html, type TemplateResult } from 'lit';
import type { Evaluation } from '../../../physics/results.js';
import type { PercentileResult } from '../../../physics/sizes.js';
import { formatNumber, formatRatio } from '../../charts/format.js';
import { techniqueInk } from '../../charts/inks.js';
import { forbiddenBy } from '../sweep-section/map-data.js';

/** P5, P50 and P95 of the mix, each at its own thickness: Current beside the Proposed shown. */
export function percentileTable(
  results: readonly PercentileResult[],
  techniques: readonly string[],
  right: number | null,
): TemplateResult {
  const shown = [0, ...(right === null ? [] : [right])];
  const of = ({ evaluations }: PercentileResult, ink: number): Evaluation | undefined =>
    evaluations.find(({ technique }) => technique === techniques[ink]);
  const ratioAt = (result: PercentileResult, hold: 'asSet' | 'sdnr') =>
    result.comparisons
      .find(({ to }) => right !== null && to === techniques[right])
      ?.rows.find(({ holdConstant }) => holdConstant === hold)?.ratio.incidentAirKerma;
  const pair = (name: string) =>
    shown.map(
      (ink) =>
        html`<th scope="col" class="number" style="color:${techniqueInk(ink).color}">${name}<br />${techniques[ink]}</th>`,
    );
  return html`<table>
    <caption>one frame, as set, in patients of the thickness below which that share of the mix lies</caption>
    <thead><tr><th scope="col">patient</th>
      ${pair('SdNR')}${pair('incident mGy')}
      ${right === null ? null : html`<th scope="col" class="number">kerma ratio<br />as set</th><th scope="col" class="number">kerma ratio<br />equal SdNR</th>`}
      ${pair('power kW')}<th scope="col">forbidden</th></tr></thead>
    <tbody>${results.map((result) => {
      const own = shown.map((ink) => of(result, ink));
      const cells = (value: (evaluation: Evaluation) => number | null) =>
        own.map((one) => html`<td class="number">${formatNumber(one && value(one))}</td>`);
      const forbidden = own.flatMap((one) => {
        const limit = one && forbiddenBy(one.findings);
        return limit ? [`${one.technique}: ${limit}`] : [];
      });
      const impossible = result.findings.map(({ message }) => message);
      return html`<tr><th scope="row">P${result.percentile}, ${formatNumber(result.thickness_mm)} mm</th>
        ${cells(({ sdnr }) => sdnr)}${cells(({ dose }) => dose.incidentAirKerma_mGy)}
        ${right === null ? null : html`<td class="number">${formatRatio(ratioAt(result, 'asSet'))}</td><td class="number">${formatRatio(ratioAt(result, 'sdnr'))}</td>`}
        ${cells(({ exposure }) => exposure.power_kW)}
        <td>${[...forbidden, ...impossible].join('; ')}</td></tr>`;
    })}</tbody></table>`;
}
