import type { Material } from '../../materials/index.js';
import { referenceMaterial } from '../beam/reference-materials.js';
import type { Stack, StackLayer } from '../stack/stack.js';
import type { Bounds, TransportGeometry } from './geometry.js';
import type { Insert } from './insert.js';

/** A detail to be put into a layer; lengths in mm, depth from the skin to its centre. */
export interface InsertRequest {
  readonly shape: 'cylinder' | 'box';
  readonly layerIndex: number;
  readonly material: Material;
  readonly centreDepth_mm: number;
  /** Box: width, height, thickness along the beam. Cylinder across the beam: diameter, length. */
  readonly size_mm: readonly number[];
}

/** How the slabs of a stack are surrounded. */
export interface Surroundings {
  /** Air with scattering from the source to the detector, and beside the patient. */
  readonly air: boolean;
  /** Width and height of the patient; null for layers without sides. */
  readonly lateral_mm: readonly [number, number] | null;
  readonly insert: InsertRequest | null;
}

/** Geometry, and the materials its numbers stand for; vacuum is the number after the last. */
export interface BuiltGeometry {
  readonly geometry: TransportGeometry;
  readonly materials: readonly Material[];
  /** Slab of `stack.layers[0]`. */
  readonly firstLayer: number;
}

const worldHalfWidth_cm = 300;

/** Lays out support, patient and, where asked for, the air before, behind and beside them. */
export function buildGeometry(stack: Stack, surroundings: Surroundings): BuiltGeometry {
  const air = surroundings.air ? referenceMaterial('air') : null;
  const before_mm = stack.sourceToSkin_mm - total_mm(stack.supportEntrance);
  const behind_mm = stack.exitToDetector_mm - total_mm(stack.supportExit);
  const gap = (thickness_mm: number): StackLayer[] =>
    air && thickness_mm > 0 ? [{ name: 'air', material: air, thickness_mm }] : [];
  const front = [...gap(stack.beam === 'point' ? before_mm : 0), ...stack.supportEntrance];
  const slabs = [...front, ...stack.layers, ...stack.supportExit, ...gap(behind_mm)];
  const materials = distinct([
    ...slabs.map(({ material }) => material),
    ...(surroundings.insert ? [surroundings.insert.material] : []),
    ...(air ? [air] : []),
  ]);
  const number = (material: Material): number => materials.indexOf(material);
  const planes_cm = facesOf(slabs, -total_mm(front));
  const patient = { from: front.length, to: front.length + stack.layers.length };
  return {
    materials,
    firstLayer: front.length,
    geometry: {
      planes_cm,
      slabMatter: Int32Array.from(slabs, ({ material }) => number(material)),
      skinPlane: front.length,
      detector_cm: (stack.thickness_mm + stack.exitToDetector_mm) / 10,
      bounds: boundsOf(surroundings, planes_cm, patient, {
        outside: air ? number(air) : materials.length,
        insert: surroundings.insert ? number(surroundings.insert.material) : -1,
      }),
    },
  };
}

function boundsOf(
  { lateral_mm, insert }: Surroundings,
  planes_cm: Float64Array,
  patient: { from: number; to: number },
  matter: { outside: number; insert: number },
): Bounds | null {
  if (lateral_mm === null && insert === null) return null;
  const slabs = planes_cm.length - 1;
  return {
    halfWidth_cm: lateral_mm ? [lateral_mm[0] / 20, lateral_mm[1] / 20] : [1e6, 1e6],
    slabBounded: Uint8Array.from({ length: slabs }, (_, k) =>
      lateral_mm && k >= patient.from && k < patient.to ? 1 : 0,
    ),
    outsideMatter: matter.outside,
    worldHalfWidth_cm: lateral_mm ? worldHalfWidth_cm : 2e6,
    insert: insert && placeInsert(insert, patient.from, planes_cm, matter.insert),
  };
}

function placeInsert(
  { shape, layerIndex, centreDepth_mm, size_mm }: InsertRequest,
  firstLayer: number,
  planes_cm: Float64Array,
  matter: number,
): Insert {
  const half = size_mm.map((size) => size / 20);
  const half_cm: [number, number, number] =
    shape === 'cylinder' ? [half[0], half[1], half[0]] : [half[0], half[1], half[2]];
  const slab = firstLayer + layerIndex;
  const centre = centreDepth_mm / 10;
  const slack = 1e-9;
  if (
    centre - half_cm[2] < planes_cm[slab] - slack ||
    centre + half_cm[2] > planes_cm[slab + 1] + slack
  ) {
    throw new Error('insert: must lie inside its layer; move it or make it thinner');
  }
  return { shape, slab, matter, centre_cm: [0, 0, centre], half_cm };
}

const total_mm = (slabs: readonly StackLayer[]): number =>
  slabs.reduce((sum, { thickness_mm }) => sum + thickness_mm, 0);

function facesOf(slabs: readonly StackLayer[], first_mm: number): Float64Array {
  const faces_cm = new Float64Array(slabs.length + 1);
  faces_cm[0] = first_mm / 10;
  slabs.forEach(({ thickness_mm }, k) => {
    faces_cm[k + 1] = faces_cm[k] + thickness_mm / 10;
  });
  return faces_cm;
}

const distinct = (materials: readonly Material[]): Material[] => [...new Set(materials)];
