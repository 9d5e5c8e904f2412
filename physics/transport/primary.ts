import { type Material, massAttenuation, massEnergyAbsorption } from '../../materials/index.js';
import type { TransportGeometry } from './geometry.js';
import type { Insert } from './insert.js';
import {
  type DetectorFunctions,
  type GridFunction,
  quantityCount,
  respondExactly,
} from './response-table.js';
import { type EnergySampler, type Source, solidAngle_sr } from './source.js';

/** What unscattered photons score, exactly: it divides the scatter scores. */
export interface Primary {
  /** On the axis at the detector per emitted photon (per cm² where the field has an area). */
  readonly atDetector: Float64Array;
  /** E·(μen/ρ)air on the axis at the skin per emitted photon (and cm²), without backscatter. */
  readonly kermaAtSkin: number;
  /** Mean emitted energy, keV. */
  readonly energy_keV: number;
}

/** Narrow-beam scores along the axis, Σ shares · e^−τ · score (Beer–Lambert). */
export function primaryScores(
  spectrum: EnergySampler,
  source: Source,
  geometry: TransportGeometry,
  materials: readonly Material[],
  read: { detector: DetectorFunctions; grid: GridFunction | null; air: Material },
): Primary {
  const atDetector = new Float64Array(quantityCount);
  const densityAtDetector = photonsPerArea(source, geometry.detector_cm);
  const densityAtSkin = photonsPerArea(source, 0);
  let kermaAtSkin = 0;
  let mean_keV = 0;
  spectrum.energies_keV.forEach((energy_keV, i) => {
    const share = spectrum.shares[i];
    const slabs = geometry.slabMatter.length;
    const toSkin = depthBetween(0, geometry.skinPlane, energy_keV, geometry, materials);
    const behind = depthBetween(geometry.skinPlane, slabs, energy_keV, geometry, materials);
    const absorption = massEnergyAbsorption(read.air, energy_keV) ?? 0;
    kermaAtSkin += share * densityAtSkin * energy_keV * absorption * Math.exp(-toSkin);
    mean_keV += share * energy_keV;
    const arriving = share * densityAtDetector * Math.exp(-toSkin - behind);
    respondExactly(read.detector, read.grid, read.air, energy_keV, 1).forEach((score, q) => {
      atDetector[q] += arriving * score;
    });
  });
  return { atDetector, kermaAtSkin, energy_keV: mean_keV };
}

/** Unattenuated photons per cm² on the axis for one emitted photon; 1 for a pencil. */
function photonsPerArea(source: Source, z_cm: number): number {
  if (source.kind === 'pencil') return 1;
  const [halfX, halfY] = source.halfField_cm;
  if (source.kind === 'parallel') return 1 / (4 * halfX * halfY);
  return 1 / (solidAngle_sr(halfX, halfY, source.distance_cm) * (z_cm - source.z_cm) ** 2);
}

function depthBetween(
  from: number,
  to: number,
  energy_keV: number,
  geometry: TransportGeometry,
  materials: readonly Material[],
): number {
  const { planes_cm, slabMatter, bounds } = geometry;
  const attenuation = (matter: number): number =>
    materials[matter].density_g_per_cm3 * massAttenuation(materials[matter], energy_keV);
  let depth = 0;
  for (let slab = from; slab < to; slab++) {
    const insert = bounds?.insert?.slab === slab ? bounds.insert : null;
    const chord = insert ? axialChord_cm(insert) : 0;
    const thickness = planes_cm[slab + 1] - planes_cm[slab];
    depth += (thickness - chord) * attenuation(slabMatter[slab]);
    if (insert) depth += chord * attenuation(insert.matter);
  }
  return depth;
}

/** Length of the axis inside an insert. */
function axialChord_cm({ shape, centre_cm, half_cm }: Insert): number {
  const x = Math.abs(centre_cm[0]);
  if (x > half_cm[0] || Math.abs(centre_cm[1]) > half_cm[1]) return 0;
  return 2 * (shape === 'box' ? half_cm[2] : Math.sqrt(half_cm[0] ** 2 - x * x));
}
