import { nodesPerKeV, tableStride } from './energy-nodes.js';
import { collision, collisionLength, type EventBuffer } from './events.js';

/** A box in which absorbed energy is tallied, wherever it lies. Lengths in cm. */
export interface TallyBox {
  readonly name: string;
  readonly centre_cm: readonly [number, number, number];
  readonly half_cm: readonly [number, number, number];
}

/**
 * Adds to the boxes, for every collision inside, the energy such a collision leaves on average: a
 * third of the variance of what this one happened to leave.
 */
export function boxScorer(
  boxes: readonly TallyBox[],
  meanDeposits_keV: Float32Array,
  first: number,
  scores: Float64Array,
): EventBuffer['take'] {
  return (values, end) => {
    for (let at = 0; at < end; at += collisionLength) {
      for (let box = 0; box < boxes.length; box++) {
        if (!holds(boxes[box], values, at + collision.x)) continue;
        const node = values[at + collision.energy] * nodesPerKeV;
        const entry = values[at + collision.matter] * tableStride + (node | 0);
        const below = meanDeposits_keV[entry];
        scores[first + box] += below + (node - (node | 0)) * (meanDeposits_keV[entry + 1] - below);
      }
    }
  };
}

function holds({ centre_cm, half_cm }: TallyBox, values: Float64Array, at: number): boolean {
  for (let axis = 0; axis < 3; axis++) {
    if (Math.abs(values[at + axis] - centre_cm[axis]) > half_cm[axis]) return false;
  }
  return true;
}
