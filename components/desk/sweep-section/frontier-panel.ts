import { html, LitElement, nothing, type PropertyValues } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { guard } from 'lit/directives/guard.js';
import type { CostName } from '../../../physics/sweep/costs.js';
import { frontierOf } from '../../../physics/sweep/frontier.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { usualCosts } from '../../../physics/sweep.js';
import { type FrontierData, frontierChart } from '../../charts/frontier-chart.js';
import type { DeskModel } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { frontierAxes, frontierData, pointOf } from './frontier-data.js';
import { frontierList } from './frontier-list.js';
import { panelSheet } from './panel-sheet.js';
import { chosenCosts, costChoices, noCost } from './sweep-choices.js';
import { sweepSheet } from './sweep-sheet.js';
import { type SweepState, settingsOfSize } from './sweep-state.js';

/**
 * The settings that no other beats in two or three chosen costs and SdNR: chart and list.
 *
 * Properties: `model`, `sweep`, `size`. Events: `adopt` with the setting chosen from the list.
 * Keyboard: native selects and buttons. Parts: none.
 */
@customElement('frontier-panel')
export class FrontierPanel extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) sweep!: SweepState;
  @property() size = '';
  @state() private picked: readonly (CostName | '')[] = [...usualCosts, ''];
  @state() private read: SweepSetting | null = null;

  static override styles = [chartSheet, sectionSheet, sweepSheet, panelSheet];

  private chooser(at: number) {
    const choices = at < 2 ? costChoices : [noCost, ...costChoices];
    return html`<label class="bare"><span class="unseen">Cost ${at + 1}</span><select @change=${(
      event: Event,
    ) => {
      const cost = (event.target as HTMLSelectElement).value as CostName | '';
      this.picked = this.picked.with(at, cost);
    }}>${choices.map(
      ({ value, words }) =>
        html`<option value=${value} .selected=${value === this.picked[at]}>${words}</option>`,
    )}</select></label>`;
  }

  private get heading() {
    return html`<h3>Frontier of allowed settings, size ${this.size}</h3>
      <p class="by">least ${this.chooser(0)}, ${this.chooser(1)}, ${this.chooser(2)}, most SdNR</p>`;
  }

  /** What is drawn, found again only when the settings, the costs or the techniques changed. */
  private found: {
    readonly costs: readonly CostName[];
    readonly settings: readonly SweepSetting[];
    readonly isMember: ReadonlySet<number>;
    readonly data: FrontierData;
  } | null = null;

  protected override willUpdate(changed: PropertyValues) {
    if (changed.size === 1 && changed.has('read')) return;
    const { settings, isWhole } = settingsOfSize(this.sweep, this.size);
    if (!isWhole) {
      this.found = null;
      return;
    }
    const costs = chosenCosts(this.picked);
    const isSame = this.found?.settings === settings && this.found.costs.join() === costs.join();
    const isMember =
      isSame && this.found ? this.found.isMember : new Set(frontierOf(settings, costs));
    const { holdConstant } = this.sweep.request;
    const data = frontierData(this.model, this.size, settings, isMember, costs, holdConstant);
    this.found = { costs, settings, isMember, data };
  }

  override render() {
    if (!this.found) {
      return html`${this.heading}<p class="note">incomplete: waits for every filter at this size</p>`;
    }
    const { costs, settings, isMember, data } = this.found;
    const axes = frontierAxes(costs, this.sweep.request.holdConstant);
    const cursor = this.read && pointOf(axes, this.read.values);
    const isBeaten = data.points.some(({ onFrontier }) => !onFrontier);
    return html`${this.heading}
      ${data.points.length > 0 ? frontierChart(data, { width: 384, height: 250 }, cursor) : nothing}
      ${
        data.points.length > 1 && !isBeaten
          ? html`<p class="note">Nothing is beaten: ${data.holdConstant}, every setting trades one of these against another.</p>`
          : nothing
      }
      ${guard([this.found], () =>
        frontierList(
          settings,
          isMember,
          costs,
          (member) => this.dispatchEvent(new CustomEvent('adopt', { detail: member })),
          (member) => {
            this.read = member;
          },
        ),
      )}`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'frontier-panel': FrontierPanel;
  }
}
