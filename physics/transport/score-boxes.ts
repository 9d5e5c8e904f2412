import { collision, collisionLength, type EventBuffer } from './events.js';

/** A box in which absorbed energy is tallied, wherever it lies. Lengths in cm. */
export interface TallyBox {
  readonly name: string;
  readonly centre_cm: readonly [number, number, number];
  readonly half_cm: readonly [number, number, number];
}

/** Adds the energy left by every collision to the boxes that hold it. */
export function boxScorer(
  boxes: readonly TallyBox[],
  first: number,
  scores: Float64Array,
): EventBuffer['take'] {
  return (values, end) => {
    for (let at = 0; at < end; at += collisionLength) {
      const left = values[at + collision.energy] - values[at + collision.energyAfter];
      if (left === 0) continue;
      boxes.forEach(({ centre_cm, half_cm }, box) => {
        for (let axis = 0; axis < 3; axis++) {
          const away = Math.abs(values[at + collision.x + axis] - centre_cm[axis]);
          if (away > half_cm[axis]) return;
        }
        scores[first + box] += left;
      });
    }
  };
}
