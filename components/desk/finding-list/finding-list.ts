import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Finding, Severity } from '../../../physics/results.js';
import { mergedFindings } from '../../charts/merged-findings.js';

const words: Record<Severity, string> = { limit: 'Limit', caution: 'Caution', note: 'Note' };
const order: readonly Severity[] = ['limit', 'caution'];
/** With more findings than this, notes are folded away. */
const foldedFrom = 3;

/**
 * Findings as sentences in the margin, limits first, notes folded where they are many; severity is a
 * word and a mark.
 *
 * Properties: `findings` (said once each), `size` (the size looked at, which no sentence names), `stale`. Events: none.
 * Keyboard: none. Parts: none.
 */
@customElement('finding-list')
export class FindingList extends LitElement {
  @property({ attribute: false }) findings: readonly Finding[] = [];
  @property() size = '';
  @property({ type: Boolean, reflect: true }) stale = false;

  static override styles = css`
    :host {
      display: block;
      font-size: var(--small);
      line-height: 1.45;
    }
    :host([stale]) {
      color: var(--soft);
      transition: color 0s 0.12s;
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
    details {
      border-block-start: 1px solid var(--rule);
      padding-block-start: 0.45rem;
    }
    summary {
      cursor: pointer;
      color: var(--soft);
    }
    details ul {
      margin-block-start: 0.4rem;
    }
    :focus-visible {
      outline: 2px solid var(--ink);
      outline-offset: 2px;
    }
  `;

  private item = ({ severity, message }: Finding) =>
    html`<li class=${severity}><b>${words[severity]}.</b> ${message}</li>`;

  override render() {
    const merged = mergedFindings(this.findings, this.size);
    if (merged.length === 0) return nothing;
    const pressing = merged.filter(({ severity }) => severity !== 'note');
    const sorted = pressing.sort((a, b) => order.indexOf(a.severity) - order.indexOf(b.severity));
    const notes = merged.filter(({ severity }) => severity === 'note');
    return html`${sorted.length > 0 ? html`<ul aria-label="Findings">${sorted.map(this.item)}</ul>` : nothing}
      ${
        notes.length > 0
          ? html`<details ?open=${sorted.length + notes.length <= foldedFrom}>
            <summary>${notes.length === 1 ? 'One note' : `${notes.length} notes`}</summary>
            <ul aria-label="Notes">${notes.map(this.item)}</ul></details>`
          : nothing
      }`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'finding-list': FindingList;
  }
}
