import { css } from 'lit';

/** Setting of the check: what is flown above, its chart beside the tables. */
export const transportSheet = css`
  .results {
    display: grid;
    grid-template-columns: minmax(0, 1fr) 22.5rem;
    gap: 1.2rem 2rem;
    align-items: start;
  }
  .tables > * {
    margin-block-end: 1.1rem;
  }
  .tables table {
    width: 100%;
  }
  .tables :is(th, td) {
    padding-inline: 0 0.9rem;
  }
  .tables :is(th, td):last-child {
    padding-inline-end: 0;
  }
  caption {
    white-space: normal;
    line-height: 1.4;
    max-width: 46rem;
  }
  .difference {
    overflow: visible;
    vertical-align: -2px;
  }
  .against {
    display: inline-block;
    min-width: 3.4rem;
  }
  .stated {
    fill: var(--ink);
    opacity: 0.1;
  }
  .difference .none,
  .estimate {
    stroke: var(--ink);
    stroke-width: 1;
  }
  .whisker {
    stroke: currentColor;
    stroke-linecap: butt;
  }
  .error {
    opacity: 0.16;
  }
  .line {
    stroke-width: 1.4;
  }
  .verdict {
    white-space: normal;
    min-width: 8.5rem;
  }
  .verdict.differs {
    font-weight: 700;
  }
  .share {
    display: block;
    height: 5px;
    min-width: 1px;
    background: var(--soft);
  }
  .balance,
  .fates {
    width: 100%;
    margin-block-start: 1rem;
  }
  h3 select {
    font-weight: 700;
  }
  .check {
    display: flex;
    align-items: baseline;
    gap: 0.5em;
    margin-block-start: 1rem;
    font-size: var(--small);
  }
  @media (max-width: 1199px) {
    .results {
      grid-template-columns: minmax(0, 1fr);
    }
    .beside {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(min(21rem, 100%), 1fr));
      gap: 0 2rem;
      align-items: start;
    }
  }
`;
