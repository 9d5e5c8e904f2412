import { css } from 'lit';

/** Ratio bars about 1, wherever they stand. */
export const ratioSheet = css`
  .ratio {
    display: inline-flex;
    align-items: center;
    gap: 0.4em;
    margin-inline-start: 0.5em;
    font-size: var(--small);
    color: var(--soft);
    white-space: nowrap;
  }
  .ratio svg {
    overflow: visible;
  }
  .ratio .bar {
    fill: currentColor;
  }
  .ratio .scale {
    stroke: var(--rule);
  }
  .ratio .one {
    stroke: var(--ink);
  }
`;
