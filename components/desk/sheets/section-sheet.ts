import { css } from 'lit';

/** A section of the working paper: its name in the margin, its fields and tables beside it. */
export const sectionSheet = css`
  :host {
    display: block;
    border-block-start: 1px solid var(--rule);
    padding: 1.4rem 0 1.8rem;
  }
  *,
  *::before {
    box-sizing: border-box;
  }
  section {
    display: grid;
    grid-template-columns: 9rem minmax(0, 1fr);
    gap: 0 1.75rem;
  }
  h2 {
    margin: 0;
    font-size: var(--heading);
    font-weight: 700;
  }
  h3 {
    margin: 0 0 0.5rem;
    font-size: var(--text);
    font-weight: 700;
  }
  .groups {
    display: grid;
    grid-template-columns: repeat(auto-fill, minmax(21rem, 1fr));
    gap: 1.6rem 2.5rem;
    align-items: start;
  }
  .wide {
    grid-column: 1 / -1;
  }
  .two {
    grid-column: span 2;
  }
  h3.next {
    margin-block-start: 1.4rem;
  }
  .fields {
    display: grid;
    grid-template-columns: repeat(auto-fill, minmax(9.5rem, 1fr));
    gap: 0.55rem 1.2rem;
    --field-size: var(--text);
  }
  .note {
    margin: 0 0 0.6rem;
    color: var(--soft);
    font-size: var(--small);
    line-height: 1.5;
    max-width: 46rem;
  }
  .scroll {
    overflow-x: auto;
    /* Names for screen readers alone are placed within it, and do not widen the page. */
    position: relative;
  }
  table {
    border-collapse: collapse;
    font-size: var(--small);
  }
  caption {
    text-align: start;
    padding-block-end: 0.3rem;
    color: var(--soft);
  }
  th,
  td {
    font-weight: 400;
    text-align: start;
    vertical-align: baseline;
    padding: 0.28rem 1.05rem 0.28rem 0;
    border-block-end: 1px solid var(--rule);
    white-space: nowrap;
  }
  thead th {
    color: var(--soft);
    vertical-align: bottom;
  }
  tbody th {
    color: var(--soft);
  }
  .number {
    text-align: end;
  }
  button.plain,
  select.plain {
    appearance: none;
    font: inherit;
    font-size: var(--small);
    color: var(--ink);
    background: none;
    border: 0;
    border-block-end: 1px dotted var(--entry-rule);
    padding: 0;
    min-width: 24px;
    min-height: 24px;
    margin-inline-end: 0.9rem;
    cursor: pointer;
  }
  select.plain {
    field-sizing: content;
    max-width: 100%;
  }
  button.plain:hover:not(:disabled) {
    border-block-end: 1px solid currentColor;
  }
  button.plain:disabled {
    color: var(--soft);
    border-color: transparent;
    cursor: default;
  }
  .after {
    margin-block-start: 0.5rem;
  }
  .file {
    font-size: var(--small);
    position: relative;
    border-block-end: 1px dotted var(--entry-rule);
    cursor: pointer;
  }
  .file:hover {
    border-block-end: 1px solid currentColor;
  }
  .file:focus-within {
    outline: 2px solid var(--ink);
    outline-offset: 2px;
  }
  .file input {
    position: absolute;
    inset: 0;
    width: 100%;
    opacity: 0;
    cursor: pointer;
  }
  .fault {
    color: var(--limit);
    font-size: var(--small);
    margin: 0.3rem 0;
  }
  :focus-visible {
    outline: 2px solid var(--ink);
    outline-offset: 2px;
    border-radius: 1px;
  }
  @media (max-width: 899px) {
    section {
      grid-template-columns: minmax(0, 1fr);
      gap: 0.8rem;
    }
    .groups {
      grid-template-columns: minmax(0, 1fr);
    }
    .two {
      grid-column: auto;
    }
  }
`;
