import { findRoot } from '../beam/find-root.js';
import type { Case, Size, Technique } from '../case/schema.js';
import { numberText } from '../number-text.js';
import { type OperatingPoint, operatingPoint } from '../operating-point.js';
import { sdnrAt } from '../readout/index.js';
import type { Finding } from '../results.js';
import { type Answer, blockedBy, noAnswer } from './answer.js';
import { withAgentAmount } from './with-agent.js';

export interface LeastAgent {
  /** In the unit of the case's own amount. */
  readonly amount: number;
  readonly unit: string;
}

export const sdnrOf = ({ made, tubeLoad_mAs }: OperatingPoint): number =>
  sdnrAt(made.readout, tubeLoad_mAs);

/**
 * Smallest amount of the detail's agent at which a technique, as set, reaches a target SdNR.
 *
 * |SdNR| grows with the amount from where agent and reference cancel; the root is bracketed between
 * no agent and the greatest amount the volume holds, or `greatest` when given.
 */
export const leastAgentAmount = (
  c: Case,
  technique: Technique,
  size: Size,
  targetSdnr: number,
  greatest = c.task.detail.agent ? 10 * Math.max(c.task.detail.agent.amount.value, 1) : 0,
): Answer<LeastAgent> => {
  const { agent } = c.task.detail;
  if (!agent) {
    return noAnswer(targetSdnr, [
      blockedBy('noAgent', 'The detail holds no agent whose amount could change.', {
        path: 'task.detail.agent',
      }),
    ]);
  }
  const signedSdnr = (amount: number): number => {
    const point = pointWith(c, technique, size, amount);
    return point ? sdnrOf(point) * Math.sign(point.made.readout.contrast.subject) : Number.NaN;
  };
  const most = greatestPlaceable(c, technique, size, greatest);
  const reached = most === null ? Number.NaN : signedSdnr(most);
  if (!(reached >= targetSdnr)) {
    return noAnswer(targetSdnr, [
      blockedBy(
        'agentAmount',
        `SdNR ${numberText(targetSdnr)} is not reached with up to ${numberText(most ?? 0)} ${agent.amount.unit} of ${agent.name}; that gives ${Number.isNaN(reached) ? 'no result' : numberText(reached)}.`,
        { path: 'task.detail.agent.amount.value', value: reached, bound: most },
      ),
    ]);
  }
  const without = signedSdnr(0);
  if (without >= targetSdnr) {
    const note: Finding = {
      code: 'agentNotNeeded',
      severity: 'note',
      message: `Without any ${agent.name} the detail already reaches SdNR ${numberText(without)} against its reference: its carrier differs from it.`,
      value: without,
      bound: targetSdnr,
    };
    return {
      value: { amount: 0, unit: agent.amount.unit },
      target: targetSdnr,
      forward: without,
      findings: [note],
    };
  }
  const amount = findRoot((x) => signedSdnr(x) - targetSdnr, 0, most as number, 1e-6);
  if (amount === null) return noAnswer(targetSdnr, []);
  return {
    value: { amount, unit: agent.amount.unit },
    target: targetSdnr,
    forward: signedSdnr(amount),
    findings: [],
  };
};

const pointWith = (
  c: Case,
  technique: Technique,
  size: Size,
  amount: number,
): OperatingPoint | null => {
  try {
    const point = operatingPoint(withAgentAmount(c, amount), technique, size);
    return 'made' in point ? point : null;
  } catch {
    // The volume cannot hold this amount.
    return null;
  }
};

/** Halves the amount until the carrier's volume holds it. */
const greatestPlaceable = (
  c: Case,
  technique: Technique,
  size: Size,
  greatest: number,
): number | null => {
  for (let amount = greatest; amount > greatest / 1e6; amount /= 2) {
    if (pointWith(c, technique, size, amount)) return amount;
  }
  return null;
};
