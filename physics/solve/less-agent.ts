import type { Case, Size, Technique } from '../case/schema.js';
import { limitsOf } from '../findings.js';
import { isAllowed } from '../limits.js';
import { numberText } from '../number-text.js';
import { findRoot } from '../numeric/find-root.js';
import { operatingPoint } from '../operating-point.js';
import type { Finding, HoldConstant } from '../results.js';
import { roomPotentials_kV } from '../room-potentials.js';
import { type SweepSetting, sweepSetting } from '../sweep/sweep-setting.js';
import { type Answer, blockedBy, noAnswer } from './answer.js';
import { sdnrOf } from './least-agent.js';
import { withAgentAmount } from './with-agent.js';

export interface EqualPotential {
  /** Where SdNR is exactly that of all the agent. */
  readonly potential_kV: number;
  /** The nearest step of the room that gives at least that SdNR and is allowed, and what it gives. */
  readonly roomPotential_kV: number;
  readonly roomSdnr: number;
  /** What the room's control must hold there. */
  readonly detectorAirKerma_uGy: number;
}

/**
 * The potential at which a technique with a share of its agent shows the detail as well as with all
 * of it, at an equal dose or detector quantity (`incidentAirKerma` unless said).
 *
 * Every potential of the room is tried, nearest to the technique's own first; between the nearest
 * allowed one that reaches the SdNR and its neighbour that does not, the exact potential is found.
 * `forward` is the SdNR there. Without an allowed one, the findings name the limits of the nearest
 * that reaches it.
 */
export const potentialForLessAgent = (
  c: Case,
  technique: Technique,
  size: Size,
  agentShare: number,
  holdConstant: Exclude<HoldConstant, 'asSet' | 'sdnr'> = 'incidentAirKerma',
): Answer<EqualPotential> => {
  const { agent } = c.task.detail;
  const full = operatingPoint(c, technique, size);
  if (!('made' in full)) return noAnswer(null, full.findings);
  const target = sdnrOf(full);
  if (!agent) {
    return noAnswer(target, [
      blockedBy('noAgent', 'The detail holds no agent whose amount could change.'),
    ]);
  }
  const less = withAgentAmount(c, agent.amount.value * agentShare);
  const reference = operatingPoint(less, technique, size);
  if (!('made' in reference)) return noAnswer(target, reference.findings);
  // Held to what the technique delivers with all of its agent.
  const held = { ...reference, tubeLoad_mAs: full.tubeLoad_mAs };
  const { setting } = full.made;
  const run = (potential_kV: number): SweepSetting =>
    sweepSetting(less, held, { ...setting, potential_kV }, holdConstant);
  const sdnrAtPotential = (potential_kV: number): number => run(potential_kV).values?.sdnr ?? 0;

  const tried = roomPotentials_kV(c)
    .map((potential_kV) => run(potential_kV))
    .sort((a, b) => far(a, setting.potential_kV) - far(b, setting.potential_kV));
  const reaching = tried.filter(({ values }) => values !== null && values.sdnr >= target);
  const chosen = reaching.find(({ findings }) => isAllowed(findings));
  if (!chosen?.values) {
    const limits = limitsOf(reaching[0]?.findings ?? []);
    return noAnswer(
      target,
      limits.length > 0 ? limits : [outOfReach(c, agentShare, target, tried)],
    );
  }
  const { potential_kV, values } = chosen;
  const exact_kV =
    findRoot((x) => sdnrAtPotential(x) - target, potential_kV, setting.potential_kV, 1e-6) ??
    potential_kV;
  return {
    value: {
      potential_kV: exact_kV,
      roomPotential_kV: potential_kV,
      roomSdnr: values.sdnr,
      detectorAirKerma_uGy: values.detectorAirKerma_uGy,
    },
    target,
    forward: sdnrAtPotential(exact_kV),
    findings: chosen.findings,
  };
};

const far = ({ potential_kV }: SweepSetting, from_kV: number): number =>
  Math.abs(potential_kV - from_kV);

const outOfReach = (
  c: Case,
  agentShare: number,
  target: number,
  tried: readonly SweepSetting[],
): Finding => {
  const { min, max } = c.room.tube.potential_kV;
  const most = tried.reduce((a, b) => ((b.values?.sdnr ?? 0) > (a.values?.sdnr ?? 0) ? b : a));
  const value = most.values?.sdnr ?? 0;
  return blockedBy(
    'potentialRange',
    `With ${numberText(100 * agentShare)} % of the agent no potential of the room, ${min} to ${max} kV, reaches SdNR ${numberText(target, 4)}; the most is ${numberText(value, 4)} at ${most.potential_kV} kV.`,
    { path: 'room.tube.potential_kV', value, bound: target },
  );
};
