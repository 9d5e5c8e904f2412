import { findRoot } from '../beam/find-root.js';
import type { Case, Size, Technique } from '../case/schema.js';
import { heldLoad } from '../compare.js';
import { nearestPotential_kV } from '../limits/tube-limits.js';
import { numberText } from '../number-text.js';
import { operatingPoint } from '../operating-point.js';
import { sdnrAt } from '../readout/index.js';
import type { HoldConstant } from '../results.js';
import { roomPotentials_kV } from '../scan.js';
import { type Answer, blockedBy, noAnswer } from './answer.js';
import { sdnrOf } from './least-agent.js';
import { withAgentAmount } from './with-agent.js';

export interface EqualPotential {
  readonly potential_kV: number;
  /** The nearest step the room offers, and the SdNR it gives. */
  readonly roomPotential_kV: number;
  readonly roomSdnr: number;
}

/**
 * The potential at which a technique with a share of its agent shows the detail as well as with all
 * of it, at an equal dose or detector quantity (`incidentAirKerma` unless said).
 *
 * Searched downward from the technique's potential, where agents above their K edge gain contrast;
 * the highest potential that reaches the target is the answer. `forward` is the SdNR there.
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
  const sdnrAtPotential = (potential_kV: number): number => {
    const point = operatingPoint(less, { ...technique, potential_kV }, size);
    if (!('made' in point)) return Number.NaN;
    const load = heldLoad(full, point, holdConstant);
    return load.tubeLoad_mAs === null ? 0 : sdnrAt(point.made.readout, load.tubeLoad_mAs);
  };
  const downward = roomPotentials_kV(c)
    .filter((potential) => potential <= technique.potential_kV)
    .reverse();
  let above = technique.potential_kV;
  for (const potential_kV of downward) {
    if (sdnrAtPotential(potential_kV) >= target) {
      const found =
        findRoot((x) => sdnrAtPotential(x) - target, potential_kV, above, 1e-7) ?? potential_kV;
      const roomPotential_kV = nearestPotential_kV(c.room.tube.potential_kV, found);
      return {
        value: {
          potential_kV: found,
          roomPotential_kV,
          roomSdnr: sdnrAtPotential(roomPotential_kV),
        },
        target,
        forward: sdnrAtPotential(found),
        findings: [],
      };
    }
    above = potential_kV;
  }
  const { min } = c.room.tube.potential_kV;
  return noAnswer(target, [
    blockedBy(
      'potentialRange',
      `With ${numberText(100 * agentShare)} % of the agent no potential from ${technique.potential_kV} kV down to the room's ${min} kV reaches SdNR ${numberText(target)}.`,
      { path: 'room.tube.potential_kV.min', value: agentShare, bound: min },
    ),
  ]);
};
