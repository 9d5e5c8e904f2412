import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Finding, Severity } from '../../../physics/results.js';

const words: Record<Severity, string> = { limit: 'Limit', caution: 'Caution', note: 'Note' };
const order: readonly Severity[] = ['limit', 'caution', 'note'];

/**
 * Findings as sentences in the margin, limits first; severity is a word and a mark.
 *
 * Properties: `findings` (repeated sentences are shown once), `stale`. Events: none.
 * Keyboard: none. Parts: none.
 */
@customElement('finding-list')
export class FindingList extends LitElement {
  @property({ attribute: false }) findings: readonly Finding[] = [];
  @property({ type: Boolean, reflect: true }) stale = false;

  static override styles = css`
    :host {
      display: block;
      font-size: var(--small);
      line-height: 1.45;
    }
    :host([stale]) {
      color: var(--soft);
    }
    ul {
      list-style: none;
      margin: 0.75rem 0 0;
      padding: 0;
    }
    li {
      border-block-start: 1px solid var(--rule);
      padding: 0.45rem 0 0.45rem 1.1rem;
      position: relative;
      overflow-wrap: anywhere;
    }
    li::before {
      position: absolute;
      inset-inline-start: 0;
      content: "–";
      color: var(--soft);
    }
    .limit::before {
      content: "■";
      color: var(--ink);
    }
    .caution::before {
      content: "△";
      color: var(--ink);
    }
    b {
      font-weight: 700;
    }
  `;

  override render() {
    const once = this.findings.filter(
      (finding, i, all) => all.findIndex((other) => other.message === finding.message) === i,
    );
    if (once.length === 0) return nothing;
    const sorted = [...once].sort((a, b) => order.indexOf(a.severity) - order.indexOf(b.severity));
    return html`<ul aria-label="Findings">
      ${sorted.map((finding) => html`<li class=${finding.severity}><b>${words[finding.severity]}.</b> ${finding.message}</li>`)}
    </ul>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'finding-list': FindingList;
  }
}
