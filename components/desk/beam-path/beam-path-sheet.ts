import { css } from 'lit';

/** Setting of the beam path: three columns, rows placed by script at the height where they act. */
export const beamPathSheet = css`
  :host {
    display: block;
    position: relative;
  }
  .columns {
    display: grid;
    grid-template-columns: minmax(11rem, 1fr) minmax(24rem, 29rem) minmax(14rem, 1fr);
    column-gap: 0.75rem;
    position: relative;
    height: max(var(--path-least, 0px), clamp(38rem, 100vh - 10rem, 48rem));
  }
  .side {
    position: relative;
  }
  .side.left {
    text-align: end;
    color: var(--graphite);
    --field-ink: var(--graphite);
  }
  .side.right {
    color: var(--madder);
    --field-ink: var(--madder);
  }
  .row {
    position: absolute;
    inset-inline: 0;
    padding-block: 0.2rem;
    line-height: 1.25;
  }
  .row:not(.placed) {
    visibility: hidden;
  }
  .name {
    display: block;
    color: var(--soft);
    font-size: var(--small);
    line-height: 1.35;
  }
  .pair {
    display: inline-flex;
    align-items: baseline;
    gap: 0.35em;
    flex-wrap: wrap;
  }
  .side.left .pair {
    justify-content: flex-end;
  }
  .dot {
    color: var(--soft);
  }
  .also,
  .sentence {
    display: block;
    font-size: var(--small);
    line-height: 24px;
    color: var(--soft);
  }
  .sentence choice-field,
  .sentence number-field {
    color: var(--field-ink);
  }
  .technique {
    margin: 0;
    font-size: var(--heading);
    font-weight: 700;
    --field-size: var(--heading);
  }
  .switch {
    font-size: var(--small);
    color: var(--soft);
  }
  .switch select {
    font: inherit;
    color: var(--field-ink);
    background: var(--paper);
    border: 0;
    border-block-end: 1px dotted var(--entry-rule);
    border-radius: 0;
    padding: 0;
    appearance: none;
    field-sizing: content;
    cursor: pointer;
  }
  .forbidden {
    margin: 0.1rem 0 0;
    font-size: var(--small);
    color: var(--ink);
  }
  .leaders {
    position: absolute;
    inset: 0;
    width: 100%;
    height: 100%;
    pointer-events: none;
  }
  .leaders path {
    fill: none;
    stroke: var(--entry-rule);
    stroke-width: 1;
    opacity: 0.7;
  }
  .spine {
    position: relative;
  }
  stack-view {
    position: absolute;
    inset: 0;
  }
  .labels {
    position: absolute;
    inset: 0;
    pointer-events: none;
  }
  .labels > * {
    pointer-events: auto;
  }
  .labels > .soft {
    pointer-events: none;
  }
  .labels[inert] {
    visibility: hidden;
  }
  .label {
    position: absolute;
    font-size: var(--small);
    line-height: 1.25;
    white-space: nowrap;
  }
  .label.soft {
    color: var(--soft);
  }
  .label.soft {
    padding-inline: 0.2rem;
    background: color-mix(in srgb, var(--paper) 78%, transparent);
  }
  .label.foot {
    margin-inline-start: -0.2rem;
  }
  @media (max-width: 719px) {
    .label.foot {
      white-space: normal;
    }
  }
  :focus-visible {
    outline: 2px solid var(--ink);
    outline-offset: 2px;
  }
  .caption {
    margin: 0;
    padding: 0.4rem 0 0.3rem;
    text-align: center;
    color: var(--soft);
    font-size: var(--small);
  }
  .unplaced {
    margin: 2rem 1rem;
    color: var(--limit);
  }
  @media (max-width: 719px) {
    .columns {
      grid-template-columns: minmax(0, 1fr) minmax(0, 1fr);
      height: auto;
      column-gap: 1.25rem;
    }
    .spine {
      grid-column: 1 / -1;
      grid-row: 1;
      height: 34rem;
    }
    .row {
      position: static;
      border-block-start: 1px solid var(--rule);
      padding-block: 0.45rem;
    }
    .row:not(.placed) {
      visibility: visible;
    }
    .side.left {
      text-align: start;
    }
    .side.left .pair {
      justify-content: flex-start;
    }
    .leaders {
      display: none;
    }
  }
`;
