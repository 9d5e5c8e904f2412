import type { Fault } from '../../../physics/case/index.js';

/** Faults of something handed in, under a heading that says what it was. */
export interface FaultReport {
  readonly heading: string;
  readonly faults: readonly Fault[];
}

/** Asks the desk to list faults at the head of the page. */
export const reportFaults = (
  from: EventTarget,
  heading: string,
  faults: readonly Fault[],
): boolean =>
  from.dispatchEvent(
    new CustomEvent<FaultReport>('fault-report', {
      detail: { heading, faults },
      bubbles: true,
      composed: true,
    }),
  );

declare global {
  interface HTMLElementEventMap {
    'fault-report': CustomEvent<FaultReport>;
  }
}
