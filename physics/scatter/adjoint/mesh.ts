import { linearCoefficients, type Slab } from '../slabs.js';

/** Slabs cut into cells, entrance to exit. */
export interface Mesh {
  readonly slabs: readonly MeshSlab[];
  readonly cellCount: number;
  readonly width_cm: Float64Array;
  /** Cells whose difference gives the slope of a cell's source: neighbours of the same material. */
  readonly before: Int32Array;
  readonly after: Int32Array;
  /** Cell width over the distance between the middles of those two cells. */
  readonly slopeFactor: Float64Array;
  /** The plane of the skin lies between cells `skinCell − 1` and `skinCell`. */
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

/**
 * Cells graded from 0.06 mean free paths at each face between materials to 0.4 inside, at 45 keV. A face
 * between slabs of one material is none to radiation: cells there are as inside.
 */
export function meshOf(slabs: readonly Slab[]): Mesh {
  const widths: number[] = [];
  /** First cell of the run of equal materials each cell belongs to. */
  const runStart: number[] = [];
  const meshSlabs = slabs.map((slab, k): MeshSlab => {
    const continues = slabs[k - 1]?.material === slab.material;
    const isContinued = slabs[k + 1]?.material === slab.material;
    const from = widths.length;
    const start = continues ? runStart[from - 1] : from;
    const mu = linearCoefficients(slab.material, referenceEnergy_keV).attenuation[0];
    for (const part of gradedParts(mu * slab.thickness_cm, !continues, !isContinued)) {
      widths.push(part * slab.thickness_cm);
      runStart.push(start);
    }
    return { slab, from, to: widths.length };
  });
  const width_cm = Float64Array.from(widths);
  const before = new Int32Array(widths.length);
  const after = new Int32Array(widths.length);
  const slopeFactor = new Float64Array(widths.length);
  for (let c = 0; c < widths.length; c++) {
    before[c] = Math.max(runStart[c], c - 1);
    after[c] = runStart[c + 1] === runStart[c] ? c + 1 : c;
    let distance = (width_cm[before[c]] + width_cm[after[c]]) / 2;
    if (after[c] - before[c] === 2) distance += width_cm[c];
    slopeFactor[c] = after[c] === before[c] ? 0 : width_cm[c] / distance;
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

/** Parts of 1 that grow from either end where it is a face between materials. */
function gradedParts(thickness_mfp: number, startsAtFace: boolean, endsAtFace: boolean): number[] {
  return [
    ...halfGraded(thickness_mfp / 2, startsAtFace),
    ...halfGraded(thickness_mfp / 2, endsAtFace).toReversed(),
  ];
}

/** Parts of one half, outermost first, that sum to 1/2. */
function halfGraded(half_mfp: number, isGraded: boolean): number[] {
  const parts: number[] = [];
  let covered = 0;
  let size = isGraded ? finest_mfp : coarsest_mfp;
  while (covered < half_mfp && parts.length < mostCellsPerSlab / 2) {
    parts.push(size);
    covered += size;
    size = Math.min(coarsest_mfp, size * growth);
  }
  return parts.map((part) => part / (2 * covered));
}
