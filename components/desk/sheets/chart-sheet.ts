import { css } from 'lit';

/** Plots and the tables beside them. */
export const chartSheet = css`
  :host {
    display: block;
  }
  *,
  *::before {
    box-sizing: border-box;
  }
  svg.chart {
    display: block;
    max-width: 100%;
    height: auto;
    overflow: visible;
    font: 11px var(--face);
    font-variant-numeric: tabular-nums;
  }
  .gridline {
    stroke: var(--rule);
  }
  .tick,
  .axis-name {
    fill: var(--soft);
  }
  .line {
    fill: none;
    stroke-width: 1.8;
  }
  .line.forbidden {
    stroke-width: 0.8;
    opacity: 0.7;
  }
  .rose {
    stroke: var(--ink);
    stroke-dasharray: 1 3;
  }
  .name {
    paint-order: stroke;
    stroke: var(--paper);
    stroke-width: 3px;
  }
  .warning {
    fill: var(--ink);
    font-weight: 700;
  }
  .cursor {
    fill: var(--ink);
    stroke: var(--paper);
  }
  .stale {
    color: var(--soft);
    transition: color 0s 0.12s;
  }
  .stale svg {
    opacity: 0.45;
    transition: opacity 0s 0.12s;
  }
  .waiting {
    margin: 0;
    display: grid;
    place-items: center;
    color: var(--soft);
  }
  table {
    border-collapse: collapse;
    width: 100%;
    font-size: var(--small);
  }
  caption {
    text-align: start;
    color: var(--soft);
    padding-block: 0.3rem;
  }
  th,
  td {
    font-weight: 400;
    text-align: end;
    padding: 0.2rem 0 0.2rem 0.7rem;
    border-block-end: 1px solid var(--rule);
    vertical-align: bottom;
  }
  thead th {
    color: var(--soft);
    line-height: 1.3;
  }
  tr > :first-child {
    text-align: start;
    padding-inline-start: 0;
  }
  .scroll {
    max-height: 18rem;
    overflow: auto;
  }
  details {
    font-size: var(--small);
  }
  summary {
    cursor: pointer;
    color: var(--soft);
  }
  .unseen {
    position: absolute;
    width: 1px;
    height: 1px;
    overflow: hidden;
    clip-path: inset(50%);
    white-space: nowrap;
  }
  select {
    font: inherit;
    color: var(--ink);
    background: transparent;
    border: 0;
    border-block-end: 1px dotted var(--entry-rule);
    padding: 0;
    appearance: none;
    field-sizing: content;
    cursor: pointer;
  }
  option {
    background: var(--paper);
    color: var(--ink);
  }
  :focus-visible {
    outline: 2px solid var(--ink);
    outline-offset: 2px;
  }
`;
