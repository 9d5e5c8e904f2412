import { css } from 'lit';

/** How every field is set: a figure on a dotted rule, its unit beside it, its fault beneath. */
export const fieldSheet = css`
  :host {
    display: block;
    min-width: 0;
  }
  :host([inline]) {
    display: inline-block;
    position: relative;
    vertical-align: baseline;
  }
  *,
  *::before {
    box-sizing: border-box;
  }
  label {
    display: inline-block;
    max-width: 100%;
  }
  .name {
    display: block;
    color: var(--soft);
    font-size: var(--small);
    line-height: 1.3;
  }
  :host([inline]) .name {
    position: absolute;
    width: 1px;
    height: 1px;
    overflow: hidden;
    clip-path: inset(50%);
    white-space: nowrap;
  }
  .entry {
    display: inline-flex;
    align-items: baseline;
    gap: 0.3em;
    max-width: 100%;
  }
  input,
  select,
  textarea {
    font: inherit;
    font-size: var(--field-size, var(--value));
    font-variant-numeric: inherit;
    line-height: 1.25;
    color: var(--field-ink, inherit);
    /* The rule lies close under the words, not at the edge of what can be hit. */
    --rule-drawn: repeating-linear-gradient(to right, var(--entry-rule) 0 1px, transparent 1px 3px);
    background: var(--rule-drawn) 50% calc(50% + 0.66em) / var(--natural, 100%) 1px no-repeat;
    border: 0;
    border-radius: 0;
    padding: 0 1px;
    margin: 0;
    /* What can be hit is 24 px at least, also in a sentence. */
    min-width: 24px;
    min-height: 24px;
    max-width: 100%;
    text-align: inherit;
  }
  :host([inline]) input,
  :host([inline]) select {
    font-size: var(--field-size, inherit);
  }
  select {
    appearance: none;
    field-sizing: content;
    cursor: pointer;
    padding-inline-end: 0.85em;
    text-overflow: ellipsis;
  }
  .choice {
    position: relative;
    display: inline-block;
    max-width: 100%;
  }
  .choice::after {
    content: "";
    position: absolute;
    inset-inline-end: 2px;
    top: calc(50% - 2px);
    border: 3.5px solid transparent;
    border-block-start-color: var(--soft);
    border-block-end: 0;
    pointer-events: none;
  }
  option {
    color: var(--ink);
    background: var(--paper);
    font-size: var(--text);
  }
  input:hover,
  select:hover,
  textarea:hover {
    --rule-drawn: linear-gradient(currentColor 0 0);
  }
  :focus-visible {
    outline: 2px solid var(--field-ink, var(--ink));
    outline-offset: 2px;
    border-radius: 1px;
  }
  .unit {
    color: var(--soft);
    font-size: var(--text);
    white-space: nowrap;
  }
  :host([inline]) .unit {
    font-size: inherit;
  }
  .assumed :is(input, select) {
    font-style: italic;
  }
  .faulty :is(input, select, textarea) {
    --rule-drawn: linear-gradient(var(--limit) 0 0);
    background-size: var(--natural, 100%) 2px;
    color: var(--limit);
  }
  .fault {
    margin: 0.15rem 0 0.25rem;
    color: var(--limit);
    font-size: var(--small);
    line-height: 1.3;
    max-width: 24rem;
    overflow-wrap: anywhere;
    white-space: normal;
    text-align: start;
  }
`;
