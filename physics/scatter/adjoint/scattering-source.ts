import { ordinates, ray, rows } from './directions.js';
import { blockLength, type Kernel } from './kernel.js';
import type { Mesh } from './mesh.js';
import type { AdjointSources } from './sources.js';

/**
 * Cell means of one energy, `[(cell · width + response) · rows + direction]`: sums and differences
 * of the two hemispheres, the uncollided part (downward only), and ½Σ w ψ per cell and response.
 */
export interface GroupMeans {
  readonly even: Float64Array;
  readonly odd: Float64Array;
  readonly uncollided: Float64Array;
  readonly isotropic: Float64Array;
}

/** Q by parity, `[(cell · width + response) · rows + direction]`. */
export interface ParitySource {
  readonly even: Float64Array;
  readonly odd: Float64Array;
}

/** Adds what scattering from node i into node j contributes. */
export function addScattering(
  mesh: Mesh,
  kernels: readonly Kernel[],
  width: number,
  i: number,
  j: number,
  means: GroupMeans,
  into: ParitySource,
): void {
  mesh.slabs.forEach(({ from, to }, k) => {
    const { lowest, blocks } = kernels[k];
    if (j < lowest[i]) return;
    const at = (j - lowest[i]) * 2 * blockLength;
    multiplyAdd(blocks[i], at, means.even, into.even, from * width, to * width);
    multiplyAdd(blocks[i], at + blockLength, means.odd, into.odd, from * width, to * width);
  });
}

/** into[x, row] += Σ block[row, to] ψ[x, to], three rows at a time: most of the solver's time. */
function multiplyAdd(
  block: Float64Array,
  at: number,
  psi: Float64Array,
  into: Float64Array,
  from: number,
  to: number,
): void {
  for (let row = 0; row < rows; row += 3) {
    const a = at + row * ordinates;
    const a0 = block[a];
    const a1 = block[a + 1];
    const a2 = block[a + 2];
    const a3 = block[a + 3];
    const a4 = block[a + 4];
    const a5 = block[a + 5];
    const a6 = block[a + 6];
    const a7 = block[a + 7];
    const b0 = block[a + 8];
    const b1 = block[a + 9];
    const b2 = block[a + 10];
    const b3 = block[a + 11];
    const b4 = block[a + 12];
    const b5 = block[a + 13];
    const b6 = block[a + 14];
    const b7 = block[a + 15];
    const c0 = block[a + 16];
    const c1 = block[a + 17];
    const c2 = block[a + 18];
    const c3 = block[a + 19];
    const c4 = block[a + 20];
    const c5 = block[a + 21];
    const c6 = block[a + 22];
    const c7 = block[a + 23];
    for (let x = from; x < to; x++) {
      const p = x * rows;
      const out = x * rows + row;
      const p0 = psi[p];
      const p1 = psi[p + 1];
      const p2 = psi[p + 2];
      const p3 = psi[p + 3];
      const p4 = psi[p + 4];
      const p5 = psi[p + 5];
      const p6 = psi[p + 6];
      const p7 = psi[p + 7];
      into[out] += a0 * p0 + a1 * p1 + a2 * p2 + a3 * p3 + (a4 * p4 + a5 * p5 + a6 * p6 + a7 * p7);
      into[out + 1] +=
        b0 * p0 + b1 * p1 + b2 * p2 + b3 * p3 + (b4 * p4 + b5 * p5 + b6 * p6 + b7 * p7);
      into[out + 2] +=
        c0 * p0 + c1 * p1 + c2 * p2 + c3 * p3 + (c4 * p4 + c5 * p5 + c6 * p6 + c7 * p7);
    }
  }
}

/** K lines are isotropic: the same source for every direction. */
export function addFluorescence(
  mesh: Mesh,
  kernels: readonly Kernel[],
  width: number,
  i: number,
  groups: readonly GroupMeans[],
  into: ParitySource,
): void {
  mesh.slabs.forEach(({ from, to }, k) => {
    for (const { node, per_cm } of kernels[k].fluorescence[i]) {
      const { isotropic } = groups[node];
      for (let at = from * width * rows; at < to * width * rows; at++) {
        into.even[at] += per_cm * isotropic[(at / rows) | 0];
      }
    }
  });
}

/** R = μt E − energy scattered on − fluorescence, from the discrete kernel, so that energy closes. */
export function addDeposition(
  mesh: Mesh,
  kernels: readonly Kernel[],
  i: number,
  energies_keV: Float64Array,
  { slab, width }: AdjointSources,
  into: ParitySource,
): void {
  slab.forEach((k, r) => {
    if (k < 0) return;
    const { attenuation, scatteredEnergy, fluorescence } = kernels[k];
    const removed = fluorescence[i].reduce(
      (sum, { node, per_cm }) => sum + per_cm * energies_keV[node],
      0,
    );
    for (let c = mesh.slabs[k].from; c < mesh.slabs[k].to; c++) {
      for (let d = 0; d < rows; d++) {
        into.even[(c * width + r) * rows + d] +=
          attenuation[i] * energies_keV[i] - scatteredEnergy[i * rows + d] - removed;
      }
    }
  });
}

/** Q along the ray from the uncollided ψ, which travels downward only; `[cell · width + response]`. */
export function firstRaySource(
  mesh: Mesh,
  kernels: readonly Kernel[],
  width: number,
  i: number,
  groups: readonly GroupMeans[],
): Float64Array {
  const source = new Float64Array(mesh.cellCount * width);
  mesh.slabs.forEach(({ from, to }, k) => {
    const { lowest, blocks } = kernels[k];
    for (let j = lowest[i]; j <= i; j++) {
      const at = (j - lowest[i]) * 2 * blockLength + ray * ordinates;
      const row = blocks[i].subarray(at, at + ordinates);
      const odd = blocks[i].subarray(at + blockLength, at + blockLength + ordinates);
      const { uncollided } = groups[j];
      for (let x = from * width; x < to * width; x++) {
        let sum = 0;
        for (let d = 0; d < ordinates; d++) sum += (row[d] + odd[d]) * uncollided[x * rows + d];
        source[x] += sum;
      }
    }
  });
  return source;
}
