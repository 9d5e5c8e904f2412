import { html, nothing, type TemplateResult } from 'lit';
import { formatEntry, formatNumber } from '../../charts/format.js';
import { placed, sizeShown, type DeskModel } from '../model/desk-model.js';

/** The stack and the beam in it as a table: what the drawing shows, for whoever cannot see it. */
export function beamTable(model: DeskModel): TemplateResult | typeof nothing {
  const { stack } = placed(model);
  if (!stack) return nothing;
  const beams = model.along;
  const photonsAt = (i: number, distance_mm: number): number | null => {
    const { distances_mm, primaryFluence_per_mm2 } = beams[i];
    const nearest = distances_mm.reduce(
      (best, distance, k) => (Math.abs(distance - distance_mm) < Math.abs(distances_mm[best] - distance_mm) ? k : best),
      0,
    );
    return primaryFluence_per_mm2[nearest] ?? null;
  };
  let depth_mm = 0;
  const rows = stack.layers.map(({ name, material, thickness_mm }) => {
    depth_mm += thickness_mm;
    const distance_mm = stack.sourceToSkin_mm + depth_mm;
    return html`<tr><th scope="row">${name}</th><td>${material.name}</td><td class="number">${formatEntry(Number(thickness_mm.toFixed(1)))}</td>${beams.map(
      (_, i) => html`<td class="number">${formatNumber(photonsAt(i, distance_mm))}</td>`,
    )}</tr>`;
  });
  return html`<details class="table"><summary>The drawing as a table</summary>
    <table><caption>Layers at size ${sizeShown(model).name}; primary photons per mm² and frame behind each</caption>
      <thead><tr><th scope="col">layer</th><th scope="col">material</th><th scope="col" class="number">mm</th>${beams.map(
        ({ technique }) => html`<th scope="col" class="number">${technique}</th>`,
      )}</tr></thead>
      <tbody>
        <tr><th scope="row">skin</th><td>–</td><td class="number">–</td>${beams.map((_, i) => html`<td class="number">${formatNumber(photonsAt(i, stack.sourceToSkin_mm))}</td>`)}</tr>
        ${rows}
        <tr><th scope="row">detector, before the grid</th><td>–</td><td class="number">–</td>${beams.map((_, i) => html`<td class="number">${formatNumber(photonsAt(i, stack.sourceToDetector_mm))}</td>`)}</tr>
      </tbody></table></details>`;
}
