import { css } from 'lit';

/** Outcomes and percentiles beside the chart along thickness, the table below. */
export const sizesSheet = css`
  .halves {
    display: grid;
    grid-template-columns: minmax(0, 1fr) 26rem;
    gap: 1.2rem 2.5rem;
    align-items: start;
  }
  .halves > * {
    min-width: 0;
  }
  .lead {
    margin: 0 0 0.5rem;
    max-width: 46rem;
  }
  td {
    vertical-align: baseline;
  }
  .halves th,
  .halves td {
    padding-inline: 0 0.75rem;
  }
  .note.forbids {
    margin: 0.4rem 0 0;
  }
  .note.caution {
    margin-block: 0.9rem 1rem;
  }
  td .ratio {
    margin: 0;
  }
  .technique-table {
    max-height: none;
  }
  .technique-table tr.first > * {
    border-block-start: 1px solid var(--rule);
  }
  .technique-table tbody tr > * {
    border-block-end: 0;
    padding-block: 0.18rem;
  }
  .technique-table th,
  .technique-table td {
    padding-inline: 0 1rem;
  }
  .number {
    text-align: end;
  }
  td:not(.number),
  th:not(.number) {
    text-align: start;
  }
  .jump {
    stroke-width: 1.2;
    stroke-dasharray: 1 2;
  }
  .forbidden-sign {
    fill: none;
    stroke: var(--ink);
    stroke-width: 1.4;
  }
  .share {
    fill: var(--soft);
    opacity: 0.5;
  }
  .actions {
    display: flex;
    flex-wrap: wrap;
    align-items: baseline;
    gap: 0.5rem 1.4rem;
    margin-block: 0.6rem 0;
    font-size: var(--small);
  }
  .actions button.plain {
    margin: 0;
    font-size: var(--small);
  }
  @media (max-width: 1199px) {
    .halves {
      grid-template-columns: minmax(0, 1fr);
    }
  }
`;
