import { linearCoefficients, type Slab } from '../slabs.js';

/** Slabs cut into cells, entrance to exit. */
export interface Mesh {
  readonly slabs: readonly MeshSlab[];
  readonly cellCount: number;
  readonly width_cm: Float64Array;
  /** Cells whose difference gives the slope of a cell's source: neighbours within the slab. */
  readonly before: Int32Array;
  readonly after: Int32Array;
  /** Cell width over the distance between the middles of those two cells. */
  readonly slopeFactor: Float64Array;
  /** The plane of the skin: photons cross it upward between cells `skinCell − 1` and `skinCell`. */
  readonly skinCell: number;
}

export interface MeshSlab {
  readonly slab: Slab;
  readonly from: number;
  readonly to: number;
}

/** Cells are sized by mean free paths at this energy. */
const referenceEnergy_keV = Float64Array.of(45);
const finest_mfp = 0.06;
const coarsest_mfp = 0.4;
const growth = 1.6;
/** Beyond this nothing comes through a slab; its cells grow coarser. */
const mostCellsPerSlab = 64;

/** Cells graded from 0.06 mean free paths at each interface to 0.4 inside, at 45 keV. */
export function meshOf(slabs: readonly Slab[]): Mesh {
  const widths: number[] = [];
  const meshSlabs = slabs.map((slab): MeshSlab => {
    const from = widths.length;
    const mu = linearCoefficients(slab.material, referenceEnergy_keV).attenuation[0];
    widths.push(...gradedParts(mu * slab.thickness_cm).map((part) => part * slab.thickness_cm));
    return { slab, from, to: widths.length };
  });
  const width_cm = Float64Array.from(widths);
  const before = new Int32Array(widths.length);
  const after = new Int32Array(widths.length);
  const slopeFactor = new Float64Array(widths.length);
  for (const { from, to } of meshSlabs) {
    for (let c = from; c < to; c++) {
      before[c] = Math.max(from, c - 1);
      after[c] = Math.min(to - 1, c + 1);
      let distance = (width_cm[before[c]] + width_cm[after[c]]) / 2;
      if (after[c] - before[c] === 2) distance += width_cm[c];
      slopeFactor[c] = after[c] === before[c] ? 0 : width_cm[c] / distance;
    }
  }
  const skin = meshSlabs.find(({ slab }) => slab.layerIndex !== null);
  return {
    slabs: meshSlabs,
    cellCount: widths.length,
    width_cm,
    before,
    after,
    slopeFactor,
    skinCell: skin?.from ?? 0,
  };
}

/** Parts of 1, symmetric, growing from either end. */
function gradedParts(thickness_mfp: number): number[] {
  const half: number[] = [];
  let covered = 0;
  let size = finest_mfp;
  while (covered < thickness_mfp / 2 && half.length < mostCellsPerSlab / 2) {
    half.push(size);
    covered += size;
    size = Math.min(coarsest_mfp, size * growth);
  }
  const parts = [...half, ...half.toReversed()];
  const total = parts.reduce((sum, part) => sum + part, 0);
  return parts.map((part) => part / total);
}
