import { css } from 'lit';

/** Setting of the layer view: a stage that takes the height there is, a quiet line of words below. */
export const stackViewSheet = css`
  :host {
    display: flex;
    flex-direction: column;
    position: relative;
    min-height: 18rem;
    color: var(--ink);
    font-size: var(--small, 0.75rem);
    line-height: 1.3;
  }
  .stage {
    position: relative;
    flex: 1 1 0;
    min-height: 0;
    overflow: hidden;
    cursor: grab;
    touch-action: pan-y;
    user-select: none;
  }
  .stage:active {
    cursor: grabbing;
  }
  .stage:focus-visible,
  button:focus-visible,
  select:focus-visible,
  summary:focus-visible {
    outline: 2px solid var(--soft);
    outline-offset: -2px;
  }
  .place,
  .stage > svg,
  canvas {
    position: absolute;
    inset: 0;
    width: 100%;
    height: 100%;
    display: block;
  }
  .leaders {
    pointer-events: none;
  }
  .leaders path {
    fill: none;
    stroke: var(--soft);
    stroke-width: 0.9;
  }
  .label {
    position: absolute;
    height: 17px;
    line-height: 17px;
    white-space: nowrap;
    pointer-events: none;
  }
  .label,
  .from {
    text-shadow:
      0 0 2px var(--paper),
      0 0 2px var(--paper),
      0 0 4px var(--paper),
      0 0 4px var(--paper),
      0 0 6px var(--paper);
  }
  .label.soft {
    color: var(--soft);
  }
  .from {
    position: absolute;
    inset: 2px auto auto 2px;
    margin: 0;
    color: var(--soft);
    pointer-events: none;
  }
  .foot {
    color: var(--soft);
    display: flex;
    flex-wrap: wrap;
    align-items: center;
    justify-content: space-between;
    gap: 0.15rem 1rem;
    padding-block-start: 0.35rem;
  }
  .legend {
    display: flex;
    flex: 1 1 100%;
    align-items: flex-start;
    gap: 0.7rem;
    min-height: 2.6em;
  }
  .scale {
    flex: 1 1 100%;
    white-space: nowrap;
  }
  .legend label {
    flex: 1;
    min-width: 0;
  }
  .legend svg {
    flex: none;
    margin-inline-start: -8px;
  }
  .legend path {
    stroke: var(--soft);
    stroke-width: 0.8;
  }
  .legend text {
    fill: var(--soft);
    font-size: 10px;
  }
  .views {
    display: flex;
    flex-wrap: wrap;
    gap: 0 0.8rem;
  }
  select {
    font: inherit;
    color: var(--ink);
    background: transparent;
    border: 0;
    border-block-end: 1px dotted var(--soft);
    padding: 0;
    margin: 0;
    width: 100%;
    text-overflow: ellipsis;
    cursor: pointer;
  }
  option {
    color: var(--ink);
    background: var(--paper);
  }
  button {
    font: inherit;
    color: inherit;
    background: none;
    border: 0;
    border-block-end: 1px solid transparent;
    padding: 0.3rem 0;
    min-height: 24px;
    min-width: 24px;
    cursor: pointer;
  }
  button[aria-pressed='true'] {
    color: var(--ink);
    border-block-end-color: var(--ink);
  }
  button:disabled {
    cursor: default;
    opacity: 0.6;
  }
  button:hover:enabled,
  summary:hover {
    color: var(--ink);
  }
  summary {
    cursor: pointer;
    padding: 0.3rem 0;
    list-style-position: inside;
  }
  .sheet {
    position: absolute;
    inset: 0 0 auto 0;
    z-index: 1;
    max-height: calc(100% - 4.5rem);
    overflow: auto;
    background: var(--paper);
    border-block-end: 1px solid var(--rule);
    padding: 0.4rem 0.2rem 0.8rem;
    color: var(--ink);
  }
  table {
    border-collapse: collapse;
    width: 100%;
    font-variant-numeric: tabular-nums;
  }
  caption,
  .sheet p {
    text-align: start;
    color: var(--soft);
    padding-block-end: 0.5rem;
    margin: 0.6rem 0 0;
  }
  th,
  td {
    font-weight: 400;
    text-align: end;
    padding: 0.25rem 0.35rem;
    border-block-end: 1px solid var(--rule);
    vertical-align: bottom;
    white-space: nowrap;
  }
  thead th {
    color: var(--soft);
  }
  thead th,
  td.words {
    white-space: normal;
  }
  thead th:nth-child(-n + 2),
  tbody th,
  td.words {
    text-align: start;
  }
  thead tr:nth-child(2) th {
    text-align: end;
  }
  .unseen {
    position: absolute;
    width: 1px;
    height: 1px;
    overflow: hidden;
    clip-path: inset(50%);
    white-space: nowrap;
  }
  .flat .place,
  .solid .section {
    display: none;
  }
  @media print {
    .views,
    details,
    .turned .label,
    .turned .leaders,
    .from,
    .place {
      display: none;
    }
    .solid .section {
      display: block;
    }
  }
`;
