import { css } from 'lit';

/** Line weights and hatches of section drawings. */
export const drawingSheet = css`
  .hatch path,
  .hatch circle {
    stroke: var(--ink);
    stroke-width: 0.5;
    fill: none;
    opacity: 0.42;
  }
  .hatch .dot {
    fill: var(--ink);
    stroke: none;
    opacity: 0.5;
  }
  .hatch .heavy {
    stroke-width: 1.6;
    opacity: 0.6;
  }
  .face {
    fill: var(--paper);
    stroke: var(--entry-rule);
    stroke-width: 0.8;
  }
  .face.side {
    fill: var(--paper-shade);
  }
  .edge {
    stroke: var(--entry-rule);
    stroke-width: 0.8;
  }
  .body {
    fill: var(--paper);
    stroke: none;
  }
  .outline,
  .support {
    stroke: var(--soft);
    stroke-width: 0.9;
    fill: none;
  }
  .support {
    fill: var(--paper-shade);
  }
  .ray {
    fill: none;
    stroke-width: 0.9;
    opacity: 0.55;
  }
  .axis {
    stroke: var(--paper);
    stroke-width: 1.4;
  }
  .gap {
    fill: none;
    stroke: var(--paper);
    stroke-width: 6;
  }
  .break {
    fill: none;
    stroke: var(--soft);
    stroke-width: 0.9;
  }
  .slip {
    stroke-width: 1;
  }
  .detail {
    fill: var(--ink);
    stroke: var(--paper);
    stroke-width: 1.5;
  }
  .strips {
    stroke: var(--ink);
    stroke-width: 1.3;
    fill: none;
    opacity: 0.75;
  }
  .detector,
  .focus {
    fill: var(--ink);
  }
`;
