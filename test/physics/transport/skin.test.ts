import { describe, expect, it } from 'vitest';
import { runTransport } from '../../../physics/jobs/index.js';
import {
  backscatterFactor,
  buildTransportInput,
  type Estimated,
} from '../../../physics/transport/index.js';
import { accuracyBeam } from '../scatter/accuracy-stacks.js';
import { idealDetector, material, stackOf } from '../scatter/stacks.js';

const table = (thickness_mm: number) => [
  { name: 'table', material: material('carbon fibre'), thickness_mm },
];

/** Backscatter factor of 15 cm of water in a 20 × 20 cm parallel field, scored over the field's middle. */
function factorOf(supports: ReturnType<typeof table>, lateral_mm: [number, number]): Estimated {
  const stack = stackOf([[material('water'), 15]], {
    supportEntrance: supports,
    field_mm: [200, 200],
  });
  const run = { photons: 150_000, seed: 11 };
  const input = buildTransportInput(stack, accuracyBeam(80, []), idealDetector(), null, run, {
    lateral_mm,
  });
  return backscatterFactor(input, runTransport(input));
}

/** The same from one pencil on layers without sides. */
function factorOfPencil(supports: ReturnType<typeof table>): Estimated {
  const stack = stackOf([[material('water'), 15]], {
    supportEntrance: supports,
    field_mm: [200, 200],
  });
  const run = { photons: 150_000, seed: 12 };
  const input = buildTransportInput(stack, accuracyBeam(80, []), idealDetector(), null, run);
  return backscatterFactor(input, runTransport(input));
}

const apart = (a: Estimated, b: Estimated): number =>
  Math.abs(a.value - b.value) / Math.hypot(a.standardError ?? 0, b.standardError ?? 0);

describe('scatter at the skin', () => {
  it('behind a support is the same in a body with far sides as in layers without', () => {
    const wide = factorOf(table(4), [3000, 3000]);
    const pencil = factorOfPencil(table(4));
    expect(apart(wide, pencil)).toBeLessThan(4);
    expect(wide.standardError).toBeLessThan(0.03 * wide.value);
  });

  it('grows by what a support scatters forward, and not for one of next to no thickness', () => {
    const [none, hair, thick] = [0, 1e-6, 4].map((thickness_mm) =>
      factorOfPencil(thickness_mm > 0 ? table(thickness_mm) : []),
    );
    expect(apart(hair, none)).toBeLessThan(3);
    // First-order forward scatter of 4 mm of carbon fibre alone is 15 % of the primary's air kerma.
    expect(thick.value).toBeGreaterThan(none.value + 0.15);
  });
});
