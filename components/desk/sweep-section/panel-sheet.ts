import { css } from 'lit';

/** A panel within a section: no rule above it, no margin of its own. */
export const panelSheet = css`
  :host {
    border: 0;
    padding: 0;
  }
`;
