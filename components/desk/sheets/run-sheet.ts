import { css } from 'lit';

/** What a run is asked for in one line of fields, and how far it has come. */
export const runSheet = css`
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
  select {
    appearance: none;
    field-sizing: content;
    cursor: pointer;
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
  .soft {
    color: var(--soft);
  }
`;
