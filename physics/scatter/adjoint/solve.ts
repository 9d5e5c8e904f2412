import { ordinates, ordinateWeights, ray, rows } from './directions.js';
import type { Kernel } from './kernel.js';
import type { Mesh } from './mesh.js';
import {
  addDeposition,
  addFluorescence,
  addScattering,
  firstRaySource,
  type GroupMeans,
  type ParitySource,
} from './scattering-source.js';
import type { AdjointSources } from './sources.js';
import { type SweepFactors, sweepDown, sweepFactors, sweepUp } from './sweep.js';

/** Expected scores of a photon entering along the axis, `[i · width + response]`. */
export interface AdjointSolution {
  readonly total: Float64Array;
  /** Without any interaction. */
  readonly uncollided: Float64Array;
  /** By exactly one Compton or Rayleigh scattering, in the same discretisation. */
  readonly first: Float64Array;
  /** Sweeps needed at each energy. */
  readonly sweeps: Int32Array;
}

const tolerance = 5e-5;
const mostSweeps = 15;
/** Scores below this share of the photon's energy, except at the exit, settle against this floor. */
const floorShare = 0.01;

/**
 * Adjoint discrete ordinates in a laterally infinite stack: ψ(z,μ,E), the expected score of a photon
 * at z travelling along μ, from −μ ∂ψ/∂z + μt ψ = Kψ + R (Lewis & Miller, Computational Methods of
 * Neutron Transport, 1984). Energies ascend, for a photon can only lose energy; within a node the
 * scattering source is iterated. One solve serves every incident energy.
 */
export function solveAdjoint(
  mesh: Mesh,
  kernels: readonly Kernel[],
  energies_keV: Float64Array,
  sources: AdjointSources,
): AdjointSolution {
  const count = energies_keV.length;
  const { width } = sources;
  const solution = {
    total: new Float64Array(count * width),
    uncollided: new Float64Array(count * width),
    first: new Float64Array(count * width),
    sweeps: new Int32Array(count),
  };
  const span = mesh.cellCount * width;
  const paritySource = (): ParitySource => ({
    even: new Float64Array(span * rows),
    odd: new Float64Array(span * rows),
  });
  const fixed = paritySource();
  const source = paritySource();
  const meanUp = new Float64Array(span * rows);
  const groups: GroupMeans[] = [];

  for (let i = 0; i < count; i++) {
    const factors = sweepFactors(mesh, kernels, i);
    const exit = sources.exit.subarray(i * width * rows, (i + 1) * width * rows);
    const skin = sources.skin.subarray(i * width * rows, (i + 1) * width * rows);
    const group = groupMeans(span);
    groups.push(group);

    source.even.fill(0);
    const direct = exit.slice();
    sweepDown(mesh, factors, width, source.even, null, direct, group.uncollided);
    takeRay(direct, solution.uncollided, i * width);
    // The neighbour's answer is a better start than the uncollided one: a sweep or two less.
    group.even.set(i > 0 ? groups[i - 1].even : group.uncollided);
    group.odd.set(i > 0 ? groups[i - 1].odd : group.uncollided);

    fixed.even.fill(0);
    fixed.odd.fill(0);
    for (let j = lowestOf(kernels, i); j < i; j++) {
      addScattering(mesh, kernels, width, i, j, groups[j], fixed);
    }
    addFluorescence(mesh, kernels, width, i, groups, fixed);
    addDeposition(mesh, kernels, i, energies_keV, sources, fixed);

    for (let sweep = 1; sweep <= mostSweeps; sweep++) {
      solution.sweeps[i] = sweep;
      source.even.set(fixed.even);
      source.odd.set(fixed.odd);
      addScattering(mesh, kernels, width, i, i, group, source);
      splitHemispheres(mesh, factors, width, source);
      const face = exit.slice();
      // ψ towards the exit lands in `even`, then both hemispheres are combined in place.
      sweepDown(mesh, factors, width, source.even, skin, face, group.even);
      sweepUp(mesh, factors, width, source.odd, skin, meanUp);
      combineHemispheres(group, meanUp);
      if (settle(solution.total, i * width, face, sources, energies_keV[i])) break;
    }
    sumIsotropic(group);
    const q = firstRaySource(mesh, kernels, width, i, groups);
    firstAlongRay(mesh, factors, width, q, source, solution.first, i * width);
  }
  return solution;
}

const groupMeans = (span: number): GroupMeans => ({
  even: new Float64Array(span * rows),
  odd: new Float64Array(span * rows),
  uncollided: new Float64Array(span * rows),
  isotropic: new Float64Array(span),
});

const lowestOf = (kernels: readonly Kernel[], i: number): number =>
  kernels.reduce((least, { lowest }) => Math.min(least, lowest[i]), i);

function takeRay(face: Float64Array, into: Float64Array, at: number): void {
  for (let r = 0; r * rows < face.length; r++) into[at + r] = face[r * rows + ray];
}

/** Takes over the new answer; true when no response changed by more than the tolerance. */
function settle(
  total: Float64Array,
  at: number,
  face: Float64Array,
  { exit, slab, width }: AdjointSources,
  energy_keV: number,
): boolean {
  let settled = true;
  for (let r = 0; r < width; r++) {
    const value = face[r * rows + ray];
    const isAtExit = exit[(at + r) * rows + ray] !== 0 && slab[r] < 0;
    const scale = isAtExit ? Math.abs(value) : Math.max(Math.abs(value), floorShare * energy_keV);
    if (Math.abs(value - total[at + r]) > tolerance * scale) settled = false;
    total[at + r] = value;
  }
  return settled;
}

/** From Q by parity to Q/μt of photons travelling down (in `even`) and up (in `odd`). */
function splitHemispheres(
  mesh: Mesh,
  { inverseAttenuation }: SweepFactors,
  width: number,
  { even, odd }: ParitySource,
): void {
  mesh.slabs.forEach(({ from, to }, k) => {
    const inverse = inverseAttenuation[k];
    for (let at = from * width * rows; at < to * width * rows; at++) {
      const sum = even[at];
      const difference = odd[at];
      even[at] = inverse * (sum + difference);
      odd[at] = inverse * (sum - difference);
    }
  });
}

/** From ψ down (in `even`) and ψ up to their sum and difference. */
function combineHemispheres({ even, odd }: GroupMeans, up: Float64Array): void {
  for (let at = 0; at < up.length; at++) {
    odd[at] = even[at] - up[at];
    even[at] += up[at];
  }
}

function sumIsotropic({ even, isotropic }: GroupMeans): void {
  for (let x = 0; x < isotropic.length; x++) {
    let sum = 0;
    for (let d = 0; d < ordinates; d++) sum += ordinateWeights[d] * even[x * rows + d];
    isotropic[x] = sum / 2;
  }
}

/** One sweep of the ray with Q from the uncollided ψ alone. */
function firstAlongRay(
  mesh: Mesh,
  factors: SweepFactors,
  width: number,
  q: Float64Array,
  scratch: ParitySource,
  into: Float64Array,
  at: number,
): void {
  mesh.slabs.forEach(({ from, to }, k) => {
    for (let x = from * width; x < to * width; x++) {
      scratch.even[x * rows + ray] = q[x] * factors.inverseAttenuation[k];
    }
  });
  const face = new Float64Array(width * rows);
  sweepDown(mesh, factors, width, scratch.even, null, face, scratch.odd, ray);
  takeRay(face, into, at);
}
