import type { Case, Size, Technique } from '../case/schema.js';
import { limitsOf } from '../findings.js';
import { deliverable_mg_per_mL } from '../limits/agent-limits.js';
import { numberText } from '../number-text.js';
import { findRoot } from '../numeric/find-root.js';
import { type OperatingPoint, operatingPoint } from '../operating-point.js';
import { sdnrAt } from '../readout/index.js';
import type { Finding } from '../results.js';
import { resolveAgent } from '../stack/resolve-material.js';
import { settingAsSet } from '../sweep/sweep-setting.js';
import { type Answer, blockedBy, noAnswer } from './answer.js';
import { withAgentAmount } from './with-agent.js';

export interface LeastAgent {
  /** In the unit of the case's own amount. */
  readonly amount: number;
  readonly unit: string;
}

export const sdnrOf = ({ made, tubeLoad_mAs }: OperatingPoint): number =>
  sdnrAt(made.readout, tubeLoad_mAs);

/** Relative accuracy of an amount: far inside what any amount is known to. */
const tolerance = 1e-5;

/**
 * Smallest amount of the detail's agent at which a technique, as set, reaches a target SdNR.
 *
 * SdNR, taken negative while the detail is more transparent than its reference, grows with the
 * amount; the root is bracketed between none and the greatest amount. What stands against the
 * technique itself at the answer is in `findings`.
 *
 * @param greatest in the case's own unit; otherwise what can be delivered where the case states it,
 *   else ten times the case's amount or what the carrier's volume holds.
 */
export const leastAgentAmount = (
  c: Case,
  technique: Technique,
  size: Size,
  targetSdnr: number,
  greatest = greatestAmount(c),
): Answer<LeastAgent> => {
  const { agent } = c.task.detail;
  if (!agent) {
    return noAnswer(targetSdnr, [
      blockedBy('noAgent', 'The detail holds no agent whose amount could change.', {
        path: 'task.detail.agent',
      }),
    ]);
  }
  const { unit } = agent.amount;
  const as = pointsOf(c, technique, size);
  const without = as.point(0);
  if (!('made' in without)) return noAnswer(targetSdnr, without.findings);
  if (as.signedSdnr(0) >= targetSdnr) {
    const note = notNeeded(agent.name, as.signedSdnr(0), targetSdnr);
    const findings = [note, ...limitsOf(settingAsSet(withAgentAmount(c, 0), without).findings)];
    const value = { amount: 0, unit };
    return { value, target: targetSdnr, forward: as.signedSdnr(0), findings };
  }
  const most = Math.min(greatest, greatestHeld(c));
  const reached = as.signedSdnr(most);
  if (!(reached >= targetSdnr)) {
    const message = `SdNR ${numberText(targetSdnr)} is not reached with ${numberText(most)} ${unit} of ${agent.name}, the most that ${most < greatest ? 'the volume holds' : 'is allowed here'}; that gives ${numberText(reached)}.`;
    const path = 'task.detail.agent.amount.value';
    return noAnswer(targetSdnr, [
      blockedBy('agentAmount', message, { path, value: reached, bound: most }),
    ]);
  }
  const amount = findRoot((x) => as.signedSdnr(x) - targetSdnr, 0, most, tolerance);
  if (amount === null) return noAnswer(targetSdnr, [notBracketed(agent.name)]);
  const found = as.point(amount);
  return {
    value: { amount, unit },
    target: targetSdnr,
    forward: as.signedSdnr(amount),
    findings:
      'made' in found
        ? limitsOf(settingAsSet(withAgentAmount(c, amount), found).findings)
        : found.findings,
  };
};

/** What is delivered at most, in the case's own unit: every unit is in proportion to the element. */
const greatestAmount = (c: Case): number => {
  const { agent } = c.task.detail;
  if (!agent) return 0;
  const { value } = agent.amount;
  const deliverable = deliverable_mg_per_mL(c);
  const element = resolveAgent(c, agent).elementConcentration_mg_per_mL;
  return deliverable !== null && element > 0
    ? (value * deliverable) / element
    : 10 * Math.max(value, 1);
};

/** The most the volume holds, in the case's own unit: the solute's volume is in proportion to it. */
const greatestHeld = (c: Case): number => {
  const { agent } = c.task.detail;
  if (!agent) return 0;
  const value = agent.amount.value > 0 ? agent.amount.value : least;
  const { soluteVolumeFraction } = resolveAgent(c, {
    ...agent,
    amount: { ...agent.amount, value },
  });
  return value / soluteVolumeFraction;
};

/** An amount any carrier holds, to ask its volume of where the case's own is nothing. */
const least = 1e-3;

const notBracketed = (name: string): Finding =>
  blockedBy(
    'agentAmount',
    `Between none and the greatest amount of ${name} some cannot be computed, so no smallest one is found.`,
    { path: 'task.detail.agent.amount.value' },
  );

const notNeeded = (name: string, value: number, bound: number): Finding => ({
  code: 'agentNotNeeded',
  severity: 'note',
  message: `Without any ${name} the detail already reaches SdNR ${numberText(value)} against its reference: its carrier differs from it.`,
  value,
  bound,
});

/** The technique as set with other amounts of agent. */
const pointsOf = (c: Case, technique: Technique, size: Size) => {
  const point = (amount: number): ReturnType<typeof operatingPoint> =>
    operatingPoint(withAgentAmount(c, amount), technique, size);
  const signedSdnr = (amount: number): number => {
    const made = point(amount);
    return 'made' in made
      ? sdnrOf(made) * Math.sign(made.made.readout.contrast.subject)
      : Number.NaN;
  };
  return { point, signedSdnr };
};
