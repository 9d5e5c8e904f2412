import { LitElement, html } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Finding } from '../../../physics/results.js';
import type { ScanPoint } from '../curve-panel/scan-point.js';
import { comparisonOf, evaluationOf, type DeskModel } from '../model/desk-model.js';
import '../beam-path/beam-path.js';
import '../caution-footer/caution-footer.js';
import '../comparison-table/comparison-table.js';
import '../curve-panel/curve-panel.js';
import '../desk-header/desk-header.js';
import '../finding-list/finding-list.js';

/**
 * The arrangement of the desk: head, beam path, margin with curve, table and findings, the working
 * paper below, cautions. Lives in the page itself, not in a shadow, so that sections have addresses.
 *
 * Properties: `model`, `scan`, `hold` and what the header shows. Events: those of what it holds.
 */
@customElement('desk-page')
export class DeskPage extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) scan: readonly ScanPoint[] | null = null;
  @property() hold = 'detectorAirKerma';

  protected override createRenderRoot() {
    return this;
  }

  private findings(): Finding[] {
    const { model } = this;
    const comparison = comparisonOf(model);
    return [
      ...(evaluationOf(model, model.left)?.findings ?? []),
      ...(evaluationOf(model, model.right)?.findings ?? []),
      ...(comparison?.rows.flatMap((row) => row.findings) ?? []),
      ...(model.weighing?.findings ?? []),
    ];
  }

  override render() {
    const { model } = this;
    return html`<desk-header .model=${model}></desk-header>
      <main>
        <beam-path .model=${model}></beam-path>
        <aside class="margin" aria-label="Balance and findings">
          <curve-panel .model=${model} .scan=${this.scan} .hold=${this.hold}></curve-panel>
          <div>
            <comparison-table .model=${model}></comparison-table>
            <finding-list .findings=${this.findings()} ?stale=${model.stale}></finding-list>
          </div>
        </aside>
        <div class="sections"></div>
      </main>
      <caution-footer></caution-footer>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'desk-page': DeskPage;
  }
}
