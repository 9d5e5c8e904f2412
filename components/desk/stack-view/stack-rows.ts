import { valueAt } from '../../../scenes/ink-scale.js';
import {
  faceDepths_mm,
  patientThickness_mm,
  type SceneSlab,
  type Shading,
  type StackScene,
} from '../../../scenes/stack-scene-data.js';

/** What one thing in the beam is, where it is, and what each technique has there. */
export interface StackRow {
  readonly name: string;
  readonly material: string;
  readonly thickness_mm: number | null;
  /** Depth of its entrance face below the skin; of its centre for the detail. */
  readonly depth_mm: number | null;
  /** Primary reaching it, as many as techniques. */
  readonly primary: readonly (number | null)[];
  /** The chosen quantity in its middle; empty when none is chosen. */
  readonly chosen: readonly (number | null)[];
}

function valuesAt(scene: StackScene, shading: Shading | null | undefined, depth_mm: number) {
  if (!shading) return [];
  return scene.techniques.map((_, i) => {
    const profile = shading.perTechnique[i];
    return profile ? valueAt(profile, depth_mm) : null;
  });
}

/** Slabs one after another from a depth on. */
function slabRows(scene: StackScene, slabs: readonly SceneSlab[], from_mm: number): StackRow[] {
  let depth_mm = from_mm;
  return slabs.map((slab) => {
    const at = depth_mm;
    depth_mm += slab.thickness_mm;
    return {
      name: slab.name,
      material: slab.material,
      thickness_mm: slab.thickness_mm,
      depth_mm: at,
      primary: valuesAt(scene, scene.primary, at),
      chosen: valuesAt(scene, scene.shading, at + slab.thickness_mm / 2),
    };
  });
}

/** The stack as a table, in the order the beam meets it: what the drawing shows, in numbers. */
export function stackRows(scene: StackScene): StackRow[] {
  const support_mm = scene.supportEntrance.reduce((sum, slab) => sum + slab.thickness_mm, 0);
  const point = (
    name: string,
    material: string,
    thickness_mm: number | null,
    depth_mm: number,
  ): StackRow => ({
    name,
    material,
    thickness_mm,
    depth_mm,
    primary: valuesAt(scene, scene.primary, depth_mm),
    chosen: valuesAt(scene, scene.shading, depth_mm),
  });
  const { detail } = scene;
  const layers = slabRows(scene, scene.layers, 0);
  const faces = faceDepths_mm(scene);
  const inLayer = detail ? faces.filter((face) => face <= detail.centreDepth_mm).length : 0;
  const detailRow = detail
    ? [point('detail', detail.label, detail.height_mm, detail.centreDepth_mm)]
    : [];
  return [
    ...slabRows(scene, scene.supportEntrance, -support_mm),
    ...layers.slice(0, inLayer),
    ...detailRow,
    ...layers.slice(inLayer),
    ...slabRows(scene, scene.supportExit, patientThickness_mm(scene)),
    point(
      'detector',
      scene.detector.label,
      null,
      scene.sourceToDetector_mm - scene.sourceToSkin_mm,
    ),
  ];
}
