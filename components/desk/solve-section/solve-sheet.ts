import { css } from 'lit';

/** Four questions, each a sentence with its answer below. */
export const solveSheet = css`
  .note {
    margin-block-end: 1.1rem;
  }
  .questions {
    display: grid;
    grid-template-columns: repeat(auto-fit, minmax(min(30rem, 100%), 1fr));
    gap: 1.8rem 2.5rem;
    align-items: start;
  }
  .questions > * {
    min-width: 0;
  }
  .ask {
    margin: 0 0 0.2rem;
    line-height: 1.9;
    max-width: 34rem;
  }
  .ask select,
  .ask input {
    color: var(--ink);
  }
  .ask input[type='text'] {
    width: calc(var(--chars, 5) * 1ch + 2px);
  }
  .go {
    margin: 0 0 0.6rem;
  }
  .answer {
    border-inline-start: 2px solid var(--rule);
    padding-inline-start: 0.9rem;
    max-width: 34rem;
  }
  .answer p {
    margin: 0 0 0.25rem;
    line-height: 1.45;
  }
  .answer .found {
    font-size: var(--value);
  }
  .answer .forward {
    font-size: var(--small);
    color: var(--soft);
  }
  .answer button.plain {
    font-size: var(--small);
  }
`;
