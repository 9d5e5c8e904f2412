import { css } from 'lit';

/** The map with its reading, the frontier beside it, rules of thumb below. */
export const sweepSheet = css`
  .results {
    display: grid;
    grid-template-columns: minmax(0, 1fr) 24rem;
    gap: 1.2rem 2.5rem;
    align-items: start;
  }
  .results > * {
    min-width: 0;
  }
  .map-box {
    touch-action: pan-y;
    cursor: crosshair;
  }
  .map-box:focus-visible {
    outline-offset: 4px;
  }
  .hatch-line {
    stroke: var(--ink);
    stroke-width: 1;
    opacity: 0.5;
  }
  .missing {
    fill: var(--paper);
  }
  .forbidden,
  .missing,
  .uncomputed {
    shape-rendering: crispEdges;
  }
  .uncomputed {
    fill: var(--paper-shade);
  }
  .plate {
    fill: var(--paper);
    opacity: 0.86;
  }
  .window,
  .best {
    fill: none;
    stroke: var(--ink);
    stroke-width: 1.6;
  }
  .best {
    stroke-width: 2;
    paint-order: stroke;
  }
  .reading {
    fill: none;
    stroke: var(--ink);
    stroke-width: 1.4;
  }
  .legend {
    display: flex;
    flex-wrap: wrap;
    align-items: start;
    gap: 0.2rem 1.4rem;
    color: var(--soft);
    font-size: var(--small);
    line-height: 1;
  }
  .legend svg {
    font: 11px var(--face);
    font-variant-numeric: tabular-nums;
    overflow: visible;
  }
  output {
    display: block;
    min-height: 5.6em;
    margin-block: 0.6rem 0.4rem;
    font-size: var(--small);
    line-height: 1.45;
    max-width: 52rem;
  }
  output b {
    font-weight: 700;
  }
  .also {
    display: flex;
    flex-wrap: wrap;
    align-items: baseline;
    gap: 0.4rem 1.2rem;
    font-size: var(--small);
  }
  .also label {
    display: inline-flex;
    align-items: baseline;
    gap: 0.45em;
  }
  .also input {
    margin: 0;
    translate: 0 1px;
    accent-color: var(--ink);
  }
  .by {
    margin: 0 0 0.4rem;
    font-size: var(--small);
    color: var(--soft);
  }
  .by select {
    color: var(--ink);
  }
  .dust {
    fill: var(--ink);
    opacity: 0.2;
  }
  .member {
    fill: var(--ink);
  }
  .front {
    stroke: var(--ink);
    stroke-width: 0.9;
    opacity: 0.6;
  }
  .ring {
    fill: none;
    stroke: var(--ink);
    stroke-width: 1.4;
  }
  .members {
    max-height: 15rem;
    margin-block-start: 0.6rem;
  }
  .members thead th {
    position: sticky;
    top: 0;
    background: var(--paper);
  }
  .members table {
    width: 100%;
  }
  .members th,
  .members td {
    padding-inline: 0.8rem 0;
    text-align: end;
    white-space: nowrap;
  }
  .members tr > :first-child {
    text-align: start;
    padding-inline-start: 0;
  }
  .members thead th {
    white-space: normal;
  }
  .members button.plain {
    font-size: var(--small);
    margin: 0;
    min-height: 0;
  }
  .members tbody tr:hover {
    background: var(--paper-shade);
  }
  .rule {
    stroke: var(--ink);
    stroke-width: 1.2;
  }
  .band {
    fill: var(--ink);
    opacity: 0.08;
  }
  .off {
    fill: var(--ink);
  }
  @media (max-width: 1199px) {
    .results {
      grid-template-columns: minmax(0, 1fr);
    }
  }
`;
