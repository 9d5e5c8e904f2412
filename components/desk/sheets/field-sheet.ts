import { css } from 'lit';

/** How every field is set: a figure on a dotted rule, its unit beside it, its fault beneath. */
export const fieldSheet = css`
  :host {
    display: block;
    min-width: 0;
  }
  :host([inline]) {
    display: inline-block;
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
    background: transparent;
    border: 0;
    border-block-end: 1px dotted var(--entry-rule);
    border-radius: 0;
    padding: 0 1px;
    margin: 0;
    min-width: 0;
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
    background: linear-gradient(var(--entry-rule) 0 0) right 0.32em top 58% / 0 0 no-repeat;
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
    border-block-end-color: currentColor;
    border-block-end-style: solid;
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
    border-block-end: 2px solid var(--limit);
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
