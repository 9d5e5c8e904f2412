import { html, nothing, type TemplateResult } from 'lit';
import { settingLabel } from '../../../physics/setting.js';
import { type CostName, costs } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { formatNumber } from '../../charts/format.js';

/** More rows than this no one reads; the CSV holds all. */
const most = 60;

/**
 * The members of a frontier, cheapest by the first cost first, each to be adopted.
 *
 * @param read told of the member the pointer or focus is on, null when it leaves.
 */
export function frontierList(
  settings: readonly SweepSetting[],
  isMember: ReadonlySet<number>,
  chosen: readonly CostName[],
  adopt: (member: SweepSetting) => void,
  read: (member: SweepSetting | null) => void,
): TemplateResult {
  const [first] = chosen;
  const paid = ({ values }: SweepSetting, cost: CostName): number | null =>
    values && costs[cost].of(values);
  const members = settings
    .filter((_, i) => isMember.has(i))
    .sort((a, b) => (paid(a, first) ?? 0) - (paid(b, first) ?? 0));
  if (members.length === 0) return html`<p class="note">No setting is allowed at this size.</p>`;
  return html`<div class="scroll members" tabindex="0" role="region" aria-label="Members of the frontier"><table>
    <caption>${members.length} settings that no other beats${members.length > most ? `, the first ${most} listed; the CSV holds all` : ''}</caption>
    <thead><tr><th scope="col">setting</th>${chosen.map((cost) => html`<th scope="col">${costs[cost].words}${costs[cost].unit ? `, ${costs[cost].unit}` : nothing}</th>`)}<th scope="col">SdNR</th><td></td></tr></thead>
    <tbody>${members.slice(0, most).map(
      (
        member,
      ) => html`<tr @pointerenter=${() => read(member)} @pointerleave=${() => read(null)} @focusin=${() => read(member)} @focusout=${() => read(null)}>
        <th scope="row">${settingLabel(member)}</th>${chosen.map((cost) => html`<td>${formatNumber(paid(member, cost))}</td>`)}
        <td>${formatNumber(member.values?.sdnr)}</td>
        <td><button class="plain" type="button" aria-label="Adopt ${settingLabel(member)} as Proposed" @click=${() => adopt(member)}>adopt</button></td></tr>`,
    )}</tbody></table></div>`;
}
