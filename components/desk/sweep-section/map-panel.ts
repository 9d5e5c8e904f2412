import { html, LitElement, nothing, type PropertyValues } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { guard } from 'lit/directives/guard.js';
import type { CostName } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { type MapCursor, mapLegend, mapWords, sweepMap } from '../../charts/sweep-map.js';
import { mapLayout, placeAt, type SweepMapData } from '../../charts/sweep-map-layout.js';
import { sweepMapTable } from '../../charts/sweep-map-table.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { movedCursor } from './map-keys.js';
import { OwnWidth } from './own-width.js';
import { panelSheet } from './panel-sheet.js';
import { settingWords } from './setting-words.js';
import { sweepSheet } from './sweep-sheet.js';

/**
 * The map of one size with the setting read off it, and the same as a table.
 *
 * Properties: `data`; `settings` of the size; `cost` the map is shaded by; `told`, words that take
 * the place of the reading until another setting is read.
 * Events: `adopt` with the setting clicked, or read when Enter or Space is pressed.
 * Keyboard: arrows read the neighbouring setting, Page Up and Down ten potentials on, Home and End
 * the ends of the row; Enter or Space adopts. Parts: none.
 */
@customElement('map-panel')
export class MapPanel extends LitElement {
  @property({ attribute: false }) data!: SweepMapData;
  @property({ attribute: false }) settings: readonly SweepSetting[] = [];
  @property() cost: CostName = 'incidentAirKerma';
  @property() told = '';
  @state() private cursor: MapCursor | null = null;
  /** A closed table is not made: it holds every setting. */
  @state() private isTableOpen = false;

  private readonly measured = new OwnWidth(this, '.map-box', 788);

  static override styles = [chartSheet, sectionSheet, sweepSheet, panelSheet];

  protected override willUpdate(changed: PropertyValues) {
    if (changed.has('cursor')) this.told = '';
  }

  private settingAt(at: MapCursor | null): SweepSetting | undefined {
    const { potentials_kV, rows } = this.data;
    if (at === null) return undefined;
    return this.settings.find(
      ({ potential_kV, filter }) =>
        potential_kV === potentials_kV[at.column] && filter === rows[at.row]?.filter,
    );
  }

  private adopt(at: MapCursor | null) {
    const detail = this.settingAt(at);
    if (detail) this.dispatchEvent(new CustomEvent('adopt', { detail }));
  }

  private pointed(event: MouseEvent): MapCursor | null {
    const box = (event.currentTarget as Element).getBoundingClientRect();
    return placeAt(mapLayout(this.data, this.measured.width), this.data, {
      x: event.clientX - box.left,
      y: event.clientY - box.top,
    });
  }

  private onMove(event: PointerEvent) {
    const at = this.pointed(event);
    const { cursor } = this;
    if (at && (at.column !== cursor?.column || at.row !== cursor.row)) this.cursor = at;
  }

  private onKey(event: KeyboardEvent) {
    if (event.key === 'Enter' || event.key === ' ') {
      event.preventDefault();
      this.adopt(this.cursor);
      return;
    }
    const moved = movedCursor(this.data, this.cursor, event.key);
    if (!moved) return;
    event.preventDefault();
    this.cursor = moved;
  }

  private reading() {
    if (this.told) return html`${this.told}`;
    const setting = this.settingAt(this.cursor);
    if (!setting)
      return html`Read a setting with the pointer, or with the arrow keys once the map has the focus. A click or Enter adopts it as Proposed.`;
    const { name, values, limits } = settingWords(
      setting,
      this.cost,
      this.data.best?.merit ?? null,
    );
    return html`<b>${name}</b> ${values} ${limits ? html`<b>Forbidden.</b> ${limits}` : nothing}`;
  }

  override render() {
    const { data } = this;
    return html`<h3>${data.meritName} of every setting, ${data.holdConstant}, size ${data.size}</h3>
      <div class="map-box" tabindex="0" role="application" aria-roledescription="map of settings" aria-label=${mapWords(data)} aria-describedby="reading"
        @keydown=${this.onKey} @pointermove=${this.onMove} @click=${(event: MouseEvent) =>
          this.adopt(this.pointed(event))}>${sweepMap(data, this.measured.width, this.cursor)}</div>
      ${mapLegend(data)}
      <output id="reading" aria-live="polite">${this.reading()}</output>
      <slot></slot>
      <details @toggle=${(event: Event) => {
        this.isTableOpen = (event.target as HTMLDetailsElement).open;
      }}><summary>The map as a table</summary>${this.isTableOpen ? guard([data], () => sweepMapTable(data)) : nothing}</details>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'map-panel': MapPanel;
  }
}
