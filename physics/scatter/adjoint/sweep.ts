import { cosines, rows } from './directions.js';
import type { Kernel } from './kernel.js';
import type { Mesh } from './mesh.js';

/** What one energy does to ψ across each cell, `[cell · rows + direction]`. */
export interface SweepFactors {
  /** 1/μt of each slab, cm. */
  readonly inverseAttenuation: Float64Array;
  /** 1/Δ, Δ = μt Δz/|μ|. */
  readonly inverseDepth: Float64Array;
  /** 1 − e^{−Δ}. */
  readonly lost: Float64Array;
  /** 1 − (1 − e^{−Δ})/Δ − (1 − e^{−Δ})/2, the weight of the source's change across the cell. */
  readonly tilt: Float64Array;
}

/** Below this depth the closed form of `tilt` cancels; its series is Δ²/12 − Δ³/24. */
const thinCell = 1e-3;

export function sweepFactors(mesh: Mesh, kernels: readonly Kernel[], i: number): SweepFactors {
  const inverseAttenuation = Float64Array.from(kernels, ({ attenuation }) => 1 / attenuation[i]);
  const inverseDepth = new Float64Array(mesh.cellCount * rows);
  const lost = new Float64Array(mesh.cellCount * rows);
  const tilt = new Float64Array(mesh.cellCount * rows);
  mesh.slabs.forEach(({ from, to }, k) => {
    for (let at = from * rows; at < to * rows; at++) {
      const width_cm = mesh.width_cm[(at / rows) | 0];
      const depth = (kernels[k].attenuation[i] * width_cm) / cosines[at % rows];
      const gone = -Math.expm1(-depth);
      inverseDepth[at] = 1 / depth;
      lost[at] = gone;
      tilt[at] =
        depth < thinCell ? (depth * depth) / 12 - depth ** 3 / 24 : 1 - gone / depth - gone / 2;
    }
  });
  return { inverseAttenuation, inverseDepth, lost, tilt };
}

/**
 * Carries ψ of photons travelling towards the exit from the exit face to the entrance, all directions
 * from `firstDirection` on, through a source linear in each cell; those that pass the skin score `skin`.
 *
 * @param source Q/μt, `[(cell · width + response) · rows + direction]`.
 * @param skin score on passing the skin, laid out as `face`; null where it does not count.
 * @param face ψ at the exit face on entry, at the entrance on return, `[response · rows + direction]`.
 * @param mean receives ψ averaged over each cell, in the layout of `source`.
 */
export function sweepDown(
  mesh: Mesh,
  factors: SweepFactors,
  width: number,
  source: Float64Array,
  skin: Float64Array | null,
  face: Float64Array,
  mean: Float64Array,
  firstDirection = 0,
): void {
  for (let c = mesh.cellCount - 1; c >= 0; c--) {
    if (skin !== null && c === mesh.skinCell - 1) addTo(face, skin);
    crossCell(mesh, factors, c, width, -mesh.slopeFactor[c], source, face, mean, firstDirection);
  }
}

/** The same for photons travelling towards the entrance; likewise. */
export function sweepUp(
  mesh: Mesh,
  factors: SweepFactors,
  width: number,
  source: Float64Array,
  skin: Float64Array,
  mean: Float64Array,
): void {
  const face = new Float64Array(width * rows);
  for (let c = 0; c < mesh.cellCount; c++) {
    if (c === mesh.skinCell) addTo(face, skin);
    crossCell(mesh, factors, c, width, mesh.slopeFactor[c], source, face, mean, 0);
  }
}

function addTo(face: Float64Array, score: Float64Array): void {
  for (let f = 0; f < face.length; f++) face[f] += score[f];
}

// With s the mean of Q/μt and S₁ its change from where the photon goes to where it comes from:
// ψ_up = s + (ψ_dn − s)e + S₁·tilt and ψ̄ = s − (ψ_up − ψ_dn)/Δ, |S₁| ≤ 2s.
function crossCell(
  mesh: Mesh,
  { inverseDepth, lost, tilt }: SweepFactors,
  c: number,
  width: number,
  slopeFactor: number,
  source: Float64Array,
  face: Float64Array,
  mean: Float64Array,
  firstDirection: number,
): void {
  const here = c * width * rows;
  const toBefore = (mesh.before[c] - c) * width * rows;
  const toAfter = (mesh.after[c] - c) * width * rows;
  for (let d = firstDirection; d < rows; d++) {
    const share = lost[c * rows + d];
    const slope = slopeFactor * tilt[c * rows + d];
    const steepest = 2 * tilt[c * rows + d];
    const inverse = inverseDepth[c * rows + d];
    for (let r = 0, at = here + d, f = d; r < width; r++, at += rows, f += rows) {
      const s = source[at];
      const bound = steepest * s;
      const tilted = slope * (source[at + toAfter] - source[at + toBefore]);
      const limited = Math.max(-bound, Math.min(bound, tilted));
      const downstream = face[f];
      const step = (s - downstream) * share + limited;
      mean[at] = s - step * inverse;
      face[f] = downstream + step;
    }
  }
}
