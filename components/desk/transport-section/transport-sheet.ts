import { css } from 'lit';

/** Setting of the check: what is flown above, its chart beside the tables. */
export const transportSheet = css`
  .setting {
    display: flex;
    flex-wrap: wrap;
    align-items: end;
    gap: 0.5rem 1.6rem;
  }
  .setting label > span {
    display: block;
    color: var(--soft);
    font-size: var(--small);
    line-height: 1.3;
  }
  select,
  input[type='text'] {
    font: inherit;
    color: var(--ink);
    background: transparent;
    border: 0;
    border-block-end: 1px dotted var(--entry-rule);
    padding: 0;
  }
  input[type='text'] {
    width: 5ch;
  }
  select:disabled,
  input:disabled {
    color: var(--soft);
    opacity: 1;
  }
  button.plain {
    font-size: var(--text);
    min-height: 24px;
  }
  .run {
    display: flex;
    flex-wrap: wrap;
    align-items: center;
    gap: 0.3rem 1.2rem;
    min-height: 2rem;
    margin-block: 0.7rem 1rem;
    font-size: var(--small);
  }
  progress {
    appearance: none;
    width: 11rem;
    height: 5px;
    border: 0;
    background: var(--rule);
  }
  progress::-webkit-progress-bar {
    background: var(--rule);
  }
  progress::-webkit-progress-value {
    background: var(--ink);
  }
  progress::-moz-progress-bar {
    background: var(--ink);
  }
  .incomplete {
    font-weight: 700;
  }
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
  .soft {
    color: var(--soft);
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
  .against {
    display: flex;
    justify-content: end;
    align-items: center;
    gap: 0.5em;
  }
  .against span {
    min-width: 3.4rem;
    text-align: end;
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
  }
`;
