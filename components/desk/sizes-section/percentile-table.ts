import { html, type TemplateResult } from 'lit';
import type { Evaluation } from '../../../physics/results.js';
import type { PercentileResult } from '../../../physics/sizes.js';
import { formatNumber, formatRatio } from '../../charts/format.js';
import { techniqueInk } from '../../charts/inks.js';
import { forbiddenBy } from '../sweep-section/map-data.js';

/** What stands against the techniques shown at a percentile, a sentence where there is anything. */
const forbiddenAt = (result: PercentileResult, shown: readonly string[]): string[] => {
  const limits = result.evaluations.flatMap(({ technique, findings }) => {
    const limit = shown.includes(technique) ? forbiddenBy(findings) : null;
    return limit ? [`${technique} ${limit}`] : [];
  });
  const all = [...limits, ...result.findings.map(({ message }) => message)];
  return all.length > 0 ? [`P${result.percentile}: ${all.join('; ')}.`] : [];
};

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
      ${pair('power kW')}</tr></thead>
    <tbody>${results.map((result) => {
      const own = shown.map((ink) => of(result, ink));
      const cells = (value: (evaluation: Evaluation) => number | null) =>
        own.map((one) => html`<td class="number">${formatNumber(one && value(one))}</td>`);
      return html`<tr><th scope="row">P${result.percentile}, ${formatNumber(result.thickness_mm)} mm</th>
        ${cells(({ sdnr }) => sdnr)}${cells(({ dose }) => dose.incidentAirKerma_mGy)}
        ${right === null ? null : html`<td class="number">${formatRatio(ratioAt(result, 'asSet'))}</td><td class="number">${formatRatio(ratioAt(result, 'sdnr'))}</td>`}
        ${cells(({ exposure }) => exposure.power_kW)}</tr>`;
    })}</tbody></table>
    ${results
      .flatMap((result) =>
        forbiddenAt(
          result,
          shown.map((ink) => techniques[ink]),
        ),
      )
      .map((words) => html`<p class="note forbids">${words}</p>`)}`;
}
