import { type Material, namedMaterial } from '../../../materials/index.js';
import { airKermaAt, airKermaTable } from '../../transport/air-kerma.js';
import {
  crossing,
  crossingLength,
  drain,
  eventBuffer,
  face,
  history,
} from '../../transport/events.js';
import { escapeCount, flyPhotons } from '../../transport/kernel.js';
import { type MatterTables, matterTables } from '../../transport/matter-tables.js';
import { randomStream } from '../../transport/random.js';
import { fluenceWeight } from '../../transport/response-table.js';
import { energySampler } from '../../transport/source.js';

/** What one pencil beam on a water slab gives, per field; the last field is infinite. */
export interface PencilScores {
  /** Photons scattered more than once, per gap and field: their energy, and their air kerma. */
  readonly energy: Float64Array[];
  readonly airKerma: Float64Array[];
  /** Air kerma of photons leaving backwards through the skin, per field. */
  readonly backscatter: Float64Array;
  /** Multiply scattered photons that reached the detector. */
  readonly count: number;
  readonly photons: number;
}

/** When a run ends: enough photons have come through, or too many have been fired. */
export interface Effort {
  readonly enough: number;
  readonly most: number;
  readonly perBatch: number;
}

/** A named material that must be there. */
export function named(name: string): Material {
  const found = namedMaterial(name);
  if (!found) throw new Error(`${name}: must be a named material`);
  return found;
}

const matter: MatterTables = matterTables([named('water')], false);
const airKerma = airKermaTable(named('air'));

/**
 * A pencil of one energy on water: by translation invariance its exit displacements are what a
 * parallel field of any size sends to its centre, at any gap.
 */
export function firePencil(
  energy_keV: number,
  thickness_cm: number,
  gaps_cm: readonly number[],
  halfSides_cm: readonly number[],
  seed: number,
  effort: Effort,
): PencilScores {
  const fields = halfSides_cm.length + 1;
  const energies = gaps_cm.map(() => new Float64Array(fields));
  const kermas = gaps_cm.map(() => new Float64Array(fields));
  const backscatter = new Float64Array(fields);
  let count = 0;
  const smallest = (x: number, y: number) => {
    const reach = Math.max(Math.abs(x), Math.abs(y));
    let field = 0;
    while (field < halfSides_cm.length && reach >= halfSides_cm[field]) field++;
    return field;
  };
  const crossings = eventBuffer(crossingLength, (values, end) => {
    for (let at = 0; at < end; at += crossingLength) {
      const x = values[at + crossing.x];
      const y = values[at + crossing.y];
      const w = values[at + crossing.w];
      const energy = values[at + crossing.energy];
      if (values[at + crossing.face] === face.skin) {
        backscatter[smallest(x, y)] += airKermaAt(airKerma, energy) * fluenceWeight(-w);
      } else if (
        values[at + crossing.face] === face.detector &&
        values[at + crossing.history] === history.multiple
      ) {
        count++;
        const kerma = airKermaAt(airKerma, energy) * fluenceWeight(w);
        const acrossX = values[at + crossing.u] / w;
        const acrossY = values[at + crossing.v] / w;
        gaps_cm.forEach((gap, g) => {
          const field = smallest(x + gap * acrossX, y + gap * acrossY);
          energies[g][field] += energy;
          kermas[g][field] += kerma;
        });
      }
    }
  });
  const world = {
    source: { kind: 'pencil' } as const,
    spectrum: energySampler(Float64Array.of(energy_keV), Float64Array.of(1)),
    geometry: {
      planes_cm: Float64Array.of(0, thickness_cm),
      slabMatter: Int32Array.of(0),
      skinPlane: 0,
      detector_cm: thickness_cm,
      bounds: null,
    },
    matter,
  };
  const output = {
    absorbed_keV: new Float64Array(1),
    escaped_keV: new Float64Array(escapeCount),
    crossings,
    everyEnd: false,
    collisions: null,
  };
  let photons = 0;
  for (let batch = 0; photons < effort.most && count < effort.enough; batch++) {
    flyPhotons(world, randomStream(seed, batch), effort.perBatch, output);
    drain(crossings);
    photons += effort.perBatch;
  }
  for (const scores of [...energies, ...kermas, backscatter]) {
    for (let field = 1; field < fields; field++) scores[field] += scores[field - 1];
  }
  return { energy: energies, airKerma: kermas, backscatter, count, photons };
}
