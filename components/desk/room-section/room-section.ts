import { html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { formatNumber } from '../../charts/format.js';
import { requestEdit } from '../fields/case-edit.js';
import { fieldOf, textSpec } from '../fields/field-specs.js';
import { pairFields } from '../fields/pair-fields.js';
import type { DeskModel } from '../model/desk-model.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { filtersTable } from './filters-table.js';
import { ratingTable } from './rating-table.js';
import { readingsTable } from './readings-table.js';
import {
  detectorGroup,
  type FieldGroup,
  geometryGroup,
  gridGroup,
  measuredGrid,
  tubeGroup,
} from './room-specs.js';
import { rulesTable } from './rules-table.js';
import { slabsTable } from './slabs-table.js';
import { sourceFields } from './source-fields.js';

/**
 * The room: tube and its rating chart, readings, filters, support, geometry, grid, detector, rules, all editable.
 *
 * Shows: assumed values in italics, residuals of the calibration beside the readings.
 * Properties: `model`. Events: `case-edit`. Keyboard: that of its fields. Parts: none.
 */
@customElement('room-section')
export class RoomSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;

  static override styles = sectionSheet;

  private group({ heading, fields }: FieldGroup) {
    return html`<div>
      <h3>${heading}</h3>
      <div class="fields">${fields.map((spec) => fieldOf(this.model.draft, spec))}</div>
    </div>`;
  }

  private gridGroup() {
    const { draft } = this.model;
    const setGrid = (value: null | { ratio: number; strips_per_cm: number }) => (event: Event) =>
      requestEdit(event.target as HTMLElement, { path: 'room.grid', value });
    if (!draft.case.room.grid) {
      return html`<div><h3>Grid</h3><p class="note">No grid is fitted.</p>
        <button class="plain" type="button" @click=${setGrid({ ratio: 10, strips_per_cm: 40 })}>fit a grid</button></div>`;
    }
    return html`<div>
      <h3>Grid</h3>
      <div class="fields">${gridGroup.fields.map((spec) => fieldOf(draft, spec))} ${pairFields(draft, measuredGrid)}</div>
      <h3 class="next">Grid cover</h3>${slabsTable(draft, 'room.grid.cover', 'Grid cover')}
      <p class="after"><button class="plain" type="button" @click=${setGrid(null)}>take the grid out of the room</button></p>
    </div>`;
  }

  private calibration() {
    const calibration = this.model.weighing?.calibration;
    if (!calibration) return nothing;
    return html`<p class="note">The readings give output factor ${formatNumber(calibration.outputFactor)} and inherent filter
      ${formatNumber(calibration.inherentFilter_mmAl)} mm Al, which replace the tube values entered.</p>`;
  }

  override render() {
    const { draft } = this.model;
    return html`<section aria-labelledby="name">
      <h2 id="name">Room</h2>
      <div class="groups">
        <div class="wide fields">
          ${fieldOf(draft, textSpec('room.name', 'Name'))} ${sourceFields(draft)}
        </div>
        ${this.group(tubeGroup)} ${this.group(geometryGroup)}
        <div>
          <h3>Inherent filter</h3>${slabsTable(draft, 'room.tube.inherentFilter', 'Inherent filter')}
          <h3 class="next">Support</h3>${slabsTable(draft, 'room.support', 'Support', true)}
        </div>
        <div><h3>Added filters</h3>${filtersTable(draft)}</div>
        <div><h3>Tube rating chart</h3>${ratingTable(draft)}</div>
        <div class="two"><h3>Readings</h3>${this.calibration()}${readingsTable(this.model)}</div>
        ${this.group(detectorGroup)} ${this.gridGroup()}
        <div class="wide"><h3>Rules</h3>${rulesTable(draft)}</div>
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'room-section': RoomSection;
  }
}
