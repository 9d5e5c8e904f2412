import { elementByZ, type Material } from '../../materials/index.js';
import type { Case, Detail, Layer } from '../case/schema.js';
import { numberText } from '../number-text.js';
import type { Finding } from '../results.js';
import { type DetailMatter, detailMatter } from './detail-matter.js';
import { type DetailPaths, detailPaths, detailVolume_mL } from './detail-paths.js';
import type { Unplaceable } from './place-stack.js';
import { resolveMaterial } from './resolve-material.js';
import type { Stack } from './stack.js';

/** The attenuating element in the detail along its central path and in all. */
export interface DetailAgent {
  readonly name: string;
  readonly z: number;
  readonly element: string;
  readonly isInvestigational: boolean;
  readonly elementConcentration_mg_per_mL: number;
  /** Concentration × central path. */
  readonly arealDensity_mg_per_cm2: number;
  readonly elementMass_g: number;
}

/** The detail of the task in the patient at one size. */
export interface PlacedDetail extends DetailPaths {
  readonly shape: Detail['shape'];
  readonly layerIndex: number;
  /** Depth of the detail's centre below the skin. */
  readonly centreDepth_mm: number;
  /** Source–detector over source–centre distance; 1 in a parallel beam. */
  readonly magnification: number;
  /** What the layer is made of, what the detail is, and what stands in its place for comparison. */
  readonly layer: Material;
  readonly matter: Material;
  readonly reference: Material;
  readonly agent: DetailAgent | null;
  readonly findings: readonly Finding[];
}

const refused = (code: string, message: string, more: Partial<Finding> = {}): Unplaceable => ({
  findings: [{ code, severity: 'limit', message, path: 'task.detail', ...more }],
});

const agentOf = (matter: DetailMatter, shape: DetailPaths): DetailAgent | null => {
  const { mixture } = matter;
  if (!mixture) return null;
  const concentration = mixture.elementConcentration_mg_per_mL;
  return {
    name: mixture.agent.name,
    z: mixture.z,
    element: elementByZ(mixture.z).symbol,
    isInvestigational: mixture.agent.investigational,
    elementConcentration_mg_per_mL: concentration,
    arealDensity_mg_per_cm2: (concentration * shape.central.detail_mm) / 10,
    elementMass_g: (concentration * detailVolume_mL(shape)) / 1000,
  };
};

/**
 * Depth of the detail's centre below its layer's entrance face. It keeps its share of the layer's
 * depth as the layer grows, and is moved inward where the detail would stick out of the layer.
 */
const centreInLayer_mm = (
  detail: Detail,
  drawn: Layer,
  thickness_mm: number,
  height_mm: number,
): number => {
  const wanted_mm =
    ((detail.depthInLayer_mm ?? drawn.thickness_mm / 2) / drawn.thickness_mm) * thickness_mm;
  return Math.min(Math.max(wanted_mm, height_mm / 2), thickness_mm - height_mm / 2);
};

/**
 * The detail at its depth in the stack. It displaces its own thickness of its layer; along each
 * path the image shows the detail and the comparison image its reference: the layer, or a material
 * such as unopacified blood.
 *
 * @returns the placed detail (with notes, where it had to be moved), or findings when it cannot be
 * placed: its layer is unknown, thinner than the detail or without the agent a defect is the
 * absence of, or nothing says what it is made of.
 */
export const placeDetail = (c: Case, stack: Stack): PlacedDetail | Unplaceable => {
  const { detail } = c.task;
  const layerIndex = c.patient.layers.findIndex((layer) => layer.name === detail.inLayer);
  if (layerIndex < 0) {
    return refused('detailLayer', `There is no layer ${detail.inLayer} for the detail to lie in.`, {
      path: 'task.detail.inLayer',
      value: detail.inLayer,
    });
  }
  const drawn = c.patient.layers[layerIndex];
  const { thickness_mm, material: layer } = stack.layers[layerIndex];
  const shape = detailPaths(detail);
  const height_mm = shape.central.displaced_mm;
  if (height_mm > thickness_mm * (1 + 1e-9)) {
    return refused(
      'detailThickerThanLayer',
      `The detail is ${numberText(height_mm)} mm thick and its layer ${drawn.name} only ${numberText(thickness_mm)} mm in a patient of ${numberText(stack.thickness_mm)} mm (${stack.sizeName}).`,
      { path: 'task.detail.size_mm', value: height_mm, bound: thickness_mm },
    );
  }
  const matter = detailMatter(c, drawn);
  if ('code' in matter) return { findings: [matter] };
  const findings: Finding[] = [];
  if ((detail.depthInLayer_mm ?? 0) > drawn.thickness_mm) {
    findings.push({
      code: 'detailDepth',
      severity: 'caution',
      message: `The detail's depth of ${numberText(detail.depthInLayer_mm ?? 0)} mm lies beyond its layer ${drawn.name} of ${numberText(drawn.thickness_mm)} mm; it is taken at the layer's exit face.`,
      path: 'task.detail.depthInLayer_mm',
      value: detail.depthInLayer_mm,
      bound: drawn.thickness_mm,
    });
  }
  const above_mm = stack.layers
    .slice(0, layerIndex)
    .reduce((sum, slab) => sum + slab.thickness_mm, 0);
  const centreDepth_mm = above_mm + centreInLayer_mm(detail, drawn, thickness_mm, height_mm);
  return {
    ...shape,
    shape: detail.shape,
    layerIndex,
    centreDepth_mm,
    magnification:
      stack.beam === 'parallel'
        ? 1
        : stack.sourceToDetector_mm / (stack.sourceToSkin_mm + centreDepth_mm),
    layer,
    matter: matter.material,
    reference: detail.reference === 'layer' ? layer : resolveMaterial(c)(detail.reference),
    agent: agentOf(matter, shape),
    findings,
  };
};
