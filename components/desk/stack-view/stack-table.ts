import { html, nothing, type TemplateResult } from 'lit';
import type { Shading, StackScene } from '../../../scenes/stack-scene-data.js';
import { formatEntry, formatNumber } from '../../charts/format.js';
import { stackRows } from './stack-rows.js';
import { trackWords } from './track-words.js';

const unitOf = ({ unit }: Shading): string => (unit ? `, ${unit}` : '');

/** A length as it is written, to a tenth of a percent at most: 170, 2, −2. */
const length = (value_mm: number | null): string =>
  value_mm === null ? '–' : formatEntry(Number(value_mm.toPrecision(4))).replace('-', '−');

/** The drawing in numbers: layer, material, thickness, depth, and what reaches it. */
export function stackTable(scene: StackScene): TemplateResult {
  const { techniques, primary, shading, grid } = scene;
  const span = techniques.length;
  const settings = techniques
    .map(
      (t) =>
        `${t.name}: filter ${t.filter?.label ?? 'none'}, grid ${grid && t.isGridIn ? 'in' : 'out'}`,
    )
    .join('; ');
  return html`<table>
      <caption>
        From the focal spot down. ${settings}. Skin at ${formatNumber(scene.sourceToSkin_mm)} mm, detector
        at ${formatNumber(scene.sourceToDetector_mm)} mm from the focal spot. Depths are of the entrance
        face below the skin, of the centre for the detail. Filter, support, grid and detector are drawn thicker than they are.
      </caption>
      <thead>
        <tr>
          <th scope="col" rowspan="2">Layer</th>
          <th scope="col" rowspan="2">Material</th>
          <th scope="col" rowspan="2">Thickness, mm</th>
          <th scope="col" rowspan="2">Depth, mm</th>
          <th scope="colgroup" colspan=${span}>${primary.quantity} reaching it${unitOf(primary)}</th>
          ${shading ? html`<th scope="colgroup" colspan=${span}>${shading.quantity} in its middle${unitOf(shading)}</th>` : nothing}
        </tr>
        <tr>
          ${techniques.map((t) => html`<th scope="col">${t.name}</th>`)}
          ${shading ? techniques.map((t) => html`<th scope="col">${t.name}</th>`) : nothing}
        </tr>
      </thead>
      <tbody>
        ${stackRows(scene).map(
          (row) => html`<tr>
            <th scope="row">${row.name}</th>
            <td class="words">${row.material}</td>
            <td>${length(row.thickness_mm)}</td>
            <td>${length(row.depth_mm)}</td>
            ${[...row.primary, ...row.chosen].map((value) => html`<td>${formatNumber(value)}</td>`)}
          </tr>`,
        )}
      </tbody>
    </table>
    ${scene.tracks ? html`<p>${trackWords(scene, scene.tracks)}</p>` : nothing}`;
}
